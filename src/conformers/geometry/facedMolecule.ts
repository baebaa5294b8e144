import { type Molecule, type TetrahedralSense, withSenses } from "../../structure/Molecule.ts";
import { facesBySense } from "../../structure/ringFaces.ts";
import type { Arrangement } from "../enumerateConformers.ts";

/**
 * The molecule of a conformer with a sense at every ring atom whose two groups have been given faces. Where the groups
 * are alike (two methyls on one carbon, the like branches of a spiro atom) the choice is free for the substance, but
 * not for the record: coordinates must put the atom that is called axial in the axial place.
 */
export function facedMolecule({
  molecule,
  chairs,
}: {
  readonly molecule: Molecule;
  readonly chairs: Arrangement["chairs"];
}): Molecule {
  const senses = new Map<number, TetrahedralSense>();
  for (const { ring, faces } of chairs) {
    ring.sites.forEach(({ ringAtom, faces: standing }, position) => {
      const atom = molecule.atoms[ringAtom]!;
      if (standing !== "arbitrary" || atom.stereo !== null || senses.has(ringAtom)) return;
      const [up, down] = facesBySense(atom, ring.atoms, position, "cw");
      const [known, face] = up === null ? [down, "down"] : [up, "up"];
      if (known === null || !faces.has(known)) return;
      senses.set(ringAtom, faces.get(known) === face ? "cw" : "ccw");
    });
  }
  return senses.size === 0 ? molecule : withSenses(molecule, senses);
}
