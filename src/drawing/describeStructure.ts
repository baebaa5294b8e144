import type { Dossier } from "../dossier/Dossier.ts";

/** What the flat diagram says, in words: the structure as SMILES and every centre with its descriptor. */
export function describeStructure(dossier: Dossier): string {
  const { smiles, formula, stereocentres } = dossier.identity;
  const centres = stereocentres.map(({ atom, descriptor, locant }) => {
    const place = locant === null ? `atom ${atom + 1} of the SMILES` : `position ${locant}`;
    return descriptor === "unspecified" ? `${place} without stated configuration` : `${place} ${descriptor}`;
  });
  const wedges = dossier.structure.bonds.some((bond) => bond.wedge !== null)
    ? " Solid wedges point towards the viewer, hashed wedges away."
    : "";
  const words = centres.length === 0 ? "No stereocentres." : `Stereocentres: ${centres.join(", ")}.`;
  return `Flat diagram of ${dossier.name}, ${formula}, SMILES ${smiles}. ${words}${wedges}`;
}
