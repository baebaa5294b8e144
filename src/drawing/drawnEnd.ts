import { combine, dot, unit, type Vector } from "./Vector.ts";

/** Coordinates that depart further than this from the textbook direction, degrees, are drawn as they are. */
const TOLERANCE = 8;

/** A chair as far as the directions of its bonds go. */
export interface ChairShape {
  /** The six ring atoms in order; coordinates in any unit of length. */
  readonly atoms: readonly Vector[];
  readonly axis: Vector;
}

/**
 * Where the far end of a bond outside a chair is drawn: at its true length, an axial one exactly along the axis, an
 * equatorial one exactly parallel to the two ring bonds one removed, as the definition has it (IUPAC Basic
 * Terminology of Stereochemistry 1996, axial, equatorial). Real rings are a little flatter than tetrahedral angles
 * would make them, so that coordinates miss this by two or three degrees, which the eye of a chemist notices.
 *
 * @param chair - the chair that the bond leaves.
 * @param index - its ring atom that carries the bond.
 */
export function drawnEnd({ atoms, axis }: ChairShape, index: number, end: Vector): Vector {
  const at = (step: number) => atoms[(index + step + atoms.length) % atoms.length]!;
  const own = at(0);
  const given = combine([1, end], [-1, own]);
  const length = Math.sqrt(dot(given, given));
  const equatorial = unit(combine([1, at(1)], [-1, at(2)], [1, at(-1)], [-1, at(-2)]));
  for (const textbook of [axis, combine([-1, axis]), equatorial]) {
    const cosine = dot(given, textbook) / length;
    if (cosine > Math.cos((TOLERANCE * Math.PI) / 180)) return combine([1, own], [length, textbook]);
  }
  return end;
}
