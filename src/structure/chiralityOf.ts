import { type Molecule, mirrorImage } from "./Molecule.ts";
import type { Toolkit } from "./Toolkit.ts";

/**
 * Whether a substance, its ring inversions averaged, is superimposable on its mirror image: `chiral` when not,
 * `meso` when it is although it has R or S centres, `achiral` otherwise. InChI decides, since its stereo layer is
 * canonical under symmetry; the canonical SMILES where there is no InChI.
 * @param centres - atoms that count as centres; senses that were filled in elsewhere make nothing meso.
 */
export function chiralityOf(
  molecule: Molecule,
  toolkit: Toolkit,
  centres?: ReadonlySet<number>,
): "achiral" | "meso" | "chiral" {
  const mirror = mirrorImage(molecule);
  const inchi = toolkit.inchi(molecule);
  const superimposable =
    inchi !== ""
      ? inchi === toolkit.inchi(mirror)
      : toolkit.canonicalSmiles(molecule) === toolkit.canonicalSmiles(mirror);
  if (!superimposable) return "chiral";
  const labels = [...toolkit.descriptors(molecule).atoms].filter(([atom]) => centres?.has(atom) ?? true);
  return labels.some(([, label]) => label === "R" || label === "S") ? "meso" : "achiral";
}
