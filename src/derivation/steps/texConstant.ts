import type { Dossier } from "../../dossier/Dossier.ts";
import { texConformer } from "../texConformer.ts";

/** The symbol of a conformer's K: bare when there are two conformers, indexed when there are more. */
export function texConstant(dossier: Dossier, to: string): string {
  return dossier.conformers.length === 2 ? "K" : `K_{${texConformer(to)}}`;
}
