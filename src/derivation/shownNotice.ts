import type { Dossier } from "../dossier/Dossier.ts";
import { shownConformers } from "./shownConformers.ts";

/** A sentence for places that do not write out every conformer, else nothing. */
export function shownNotice(dossier: Dossier): string {
  const total = dossier.conformers.length;
  const count = shownConformers(dossier).length;
  return count === total ? "" : `Of ${total} conformers the ${count} most stable are written out.`;
}
