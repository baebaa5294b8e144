import type { Face } from "../structure/ringFaces.ts";

/** Where a ring atom's outside bond points: up, down, or in the ring's plane at a trigonal atom. */
export type Outward = Face | "flat";

/**
 * Torsion angle x–a–b–y in degrees (−180 to 180) for neighbouring ring atoms a, b with outside atoms x, y.
 *
 * Seen along a → b with the up face on top and the ring running clockwise, the ring neighbour of a lies to the
 * right, an upper outside bond a third of a turn counter-clockwise from it, a lower one a third clockwise, and one at
 * a trigonal atom half a turn away; the same holds at b, turned by the endocyclic torsion.
 *
 * @param endocyclic - torsion about a–b inside the ring, degrees.
 */
export function exocyclicTorsion(endocyclic: number, x: Outward, y: Outward): number {
  const turn = endocyclic + angleOf(y) - angleOf(x);
  return ((((turn + 180) % 360) + 360) % 360) - 180;
}

function angleOf(outward: Outward): number {
  return outward === "flat" ? 180 : outward === "up" ? -120 : 120;
}
