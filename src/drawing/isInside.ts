import type { Point } from "./Scene.ts";

/** Whether a point lies inside a closed outline: whether a ray from it crosses the outline an odd number of times. */
export function isInside(point: Point, outline: readonly Point[]): boolean {
  const crossings = outline.filter((a, index) => {
    const b = outline[(index + 1) % outline.length]!;
    if (a.y > point.y === b.y > point.y) return false;
    return point.x < a.x + ((point.y - a.y) / (b.y - a.y)) * (b.x - a.x);
  });
  return crossings.length % 2 === 1;
}
