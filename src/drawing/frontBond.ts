import type { Vertex } from "./ChairView.ts";

/** The bond of a ring nearest to the viewer: index, in the ring's list, of the atom it starts from. */
export function frontBond(vertices: readonly Vertex[], ring: readonly number[]): number {
  const depth = (index: number) =>
    vertices[ring[index]!]!.at.depth + vertices[ring[(index + 1) % ring.length]!]!.at.depth;
  let front = 0;
  for (let index = 1; index < ring.length; index++) if (depth(index) > depth(front) + 1e-6) front = index;
  return front;
}
