import type { Face } from "../structure/ringFaces.ts";
import type { AnalysedRing, Substituent } from "../structure/StructureAnalysis.ts";

export type RingForm = "chair" | "half-chair" | "boat" | "twist-boat";

/**
 * One state of one ring: a chair, a half-chair, or where the ring has no choice or no better one, a boat or
 * twist-boat.
 *
 * `sign` is that of the height of the first listed ring atom seen from the up face: in a chair atom k of the list
 * stands above the mean plane when sign · (−1)^k is positive, and its axial bond then points up. The endocyclic
 * torsion about bond k (atom k to atom k + 1) then has the sign −sign · (−1)^k.
 */
export interface Chair {
  readonly ring: AnalysedRing;
  readonly form: RingForm;
  readonly sign: 1 | -1;
  /** Endocyclic torsion angle about each ring bond, degrees, as expected of the form. */
  readonly torsions: readonly number[];
  /** Face of each group and branch in this state, by its first atom; inverting atoms may differ between states. */
  readonly faces: ReadonlyMap<number, Face>;
}

export type Orientation = "axial" | "equatorial";

/** True where axial and equatorial have a meaning: in chairs and, near a flat bond with a "pseudo", in half-chairs. */
export function hasOrientations(chair: Chair): boolean {
  return chair.form === "chair" || chair.form === "half-chair";
}

/** The face on which the axial bond of a ring atom points. */
export function axialFace(chair: Chair, ringAtom: number): Face {
  const position = chair.ring.atoms.indexOf(ringAtom);
  return chair.sign * (position % 2 === 0 ? 1 : -1) > 0 ? "up" : "down";
}

/** Whether a group is axial or equatorial in this chair. */
export function orientationOf(chair: Chair, substituent: Substituent): Orientation {
  const face = chair.faces.get(substituent.atom);
  return face === axialFace(chair, substituent.ringAtom) ? "axial" : "equatorial";
}

/** True at the atoms next to a flat bond (IUPAC 1996: pseudoaxial and pseudoequatorial at allylic positions). */
export function isPseudo(chair: Chair, ringAtom: number): boolean {
  const position = chair.ring.atoms.indexOf(ringAtom);
  return chair.ring.flatBonds.some((k) => position === (k + 5) % 6 || position === (k + 2) % 6);
}
