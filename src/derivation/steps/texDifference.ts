import type { Dossier } from "../../dossier/Dossier.ts";
import { texConformer } from "../texConformer.ts";

/** The symbol of a conformer's ΔG°: bare when there are two conformers, indexed when there are more. */
export function texDifference(dossier: Dossier, to: string): string {
  return dossier.conformers.length === 2 ? "\\Delta G^\\circ" : `\\Delta G^\\circ_{${texConformer(to)}}`;
}
