import { type Molecule, mirrorImage } from "./Molecule.ts";
import type { Toolkit } from "./Toolkit.ts";

/**
 * Whether a substance, its ring inversions averaged, is superimposable on its mirror image: `chiral` when not,
 * `meso` when it is although it has R or S centres, `achiral` otherwise. InChI decides, since its stereo layer is
 * canonical under symmetry; the canonical SMILES where there is no InChI.
 */
export function chiralityOf(molecule: Molecule, toolkit: Toolkit): "achiral" | "meso" | "chiral" {
  const mirror = mirrorImage(molecule);
  const inchi = toolkit.inchi(molecule);
  const superimposable =
    inchi !== ""
      ? inchi === toolkit.inchi(mirror)
      : toolkit.canonicalSmiles(molecule) === toolkit.canonicalSmiles(mirror);
  if (!superimposable) return "chiral";
  const labels = [...toolkit.descriptors(molecule).atoms.values()];
  return labels.includes("R") || labels.includes("S") ? "meso" : "achiral";
}
