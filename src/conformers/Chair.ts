import type { Face } from "../structure/ringFaces.ts";
import type { AnalysedRing, Substituent } from "../structure/StructureAnalysis.ts";

/**
 * One chair of one ring.
 *
 * `sign` is that of the height of the first listed ring atom seen from the up face: atom k of the list stands
 * above the mean plane when sign · (−1)^k is positive, and its axial bond then points up.
 */
export interface Chair {
  readonly ring: AnalysedRing;
  readonly sign: 1 | -1;
  /** Face of each group in this chair, by the group's first atom; inverting atoms may differ between chairs. */
  readonly faces: ReadonlyMap<number, Face>;
}

export type Orientation = "axial" | "equatorial";

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
