import type { Dossier } from "../../dossier/Dossier.ts";

/** Name of the file that holds a conformer's relaxed coordinates, beside the dossier's page. */
export function xyzFileName(dossier: Dossier, conformer: string): string {
  return `${dossier.slug}-${conformer.toLowerCase()}.xyz`;
}
