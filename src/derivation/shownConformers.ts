import type { Conformer, Dossier } from "../dossier/Dossier.ts";

/** Conformers written out in a derivation or a table; with several rings there may be many more. */
const MOST_SHOWN = 6;

/** The conformers that are written out, most stable first. */
export function shownConformers(dossier: Dossier): readonly Conformer[] {
  return dossier.conformers.slice(0, MOST_SHOWN);
}
