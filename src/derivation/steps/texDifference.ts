import type { Dossier } from "../../dossier/Dossier.ts";
import { texConformer } from "../texNumbers.ts";

/** The symbol of a conformer's ΔG°: bare when there are two conformers, indexed when there are more. */
export function texDifference(dossier: Dossier, to: string): string {
  return dossier.conformers.length === 2 ? "\\Delta G^\\circ" : `\\Delta G^\\circ_{${texConformer(to)}}`;
}

/** The symbol of a conformer's K, likewise. */
export function texConstant(dossier: Dossier, to: string): string {
  return dossier.conformers.length === 2 ? "K" : `K_{${texConformer(to)}}`;
}
