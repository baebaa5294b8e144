import type { Dossier } from "../dossier/Dossier.ts";
import { type AtomLetters, atomLetters } from "./atomLetters.ts";

/** Letters of a ring atom; null for carbon without charge or mass number, which is a bare corner. */
export function cornerLetters(dossier: Dossier, index: number): AtomLetters | null {
  const atom = dossier.structure.atoms[index]!;
  if (atom.element === "C" && atom.charge === 0 && atom.isotope === 0) return null;
  return atomLetters(atom, atom.element !== "C");
}
