import type { RingBond } from "./ChairView.ts";
import type { Point } from "./Scene.ts";

/**
 * The direction on the screen that leads away from the rings at a vertex, radians. In a single ring it is the one away
 * from the middle; in a system it halves the widest angle between two ring bonds.
 */
export function outwardDirection(
  vertex: number,
  points: readonly Point[],
  bonds: readonly Pick<RingBond, "from" | "to">[],
  rings: readonly (readonly number[])[],
): number {
  const at = points[vertex]!;
  if (rings.length === 1) return Math.atan2(at.y, at.x);
  const angles = bonds
    .flatMap(({ from, to }) => (from === vertex ? [to] : to === vertex ? [from] : []))
    .map((other) => Math.atan2(points[other]!.y - at.y, points[other]!.x - at.x))
    .sort((a, b) => a - b);
  let best = { width: -1, middle: 0 };
  for (const [index, angle] of angles.entries()) {
    const next = angles[index + 1] ?? angles[0]! + 2 * Math.PI;
    if (next - angle > best.width + 1e-6) best = { width: next - angle, middle: (angle + next) / 2 };
  }
  return best.middle;
}
