import { combine, cross, unit, type Vector } from "./Vector.ts";

/**
 * The normal of a ring's mean plane (Cremer and Pople, J. Am. Chem. Soc. 1975, 97, 1354), unit length. In a chair it is
 * the threefold axis.
 *
 * @param ring - ring atoms in order; the normal points to the side from which they run clockwise, the up face.
 */
export function ringAxis(ring: readonly Vector[]): Vector {
  const angle = (index: number) => (2 * Math.PI * index) / ring.length;
  const sines = combine(...ring.map((point, k): [number, Vector] => [Math.sin(angle(k)), point]));
  const cosines = combine(...ring.map((point, k): [number, Vector] => [Math.cos(angle(k)), point]));
  return unit(cross(sines, cosines));
}
