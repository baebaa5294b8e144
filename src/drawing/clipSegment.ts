import type { Box, Point } from "./Scene.ts";

/**
 * The part of a straight line that lies inside a box, as shares of its length from `from`; null when none does.
 * Liang–Barsky: each side of the box narrows the part that is left.
 */
export function clipSegment(from: Point, to: Point, box: Box): readonly [number, number] | null {
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  let [enter, leave] = [0, 1];
  const sides: readonly (readonly [number, number])[] = [
    [-dx, from.x - box.left],
    [dx, box.right - from.x],
    [-dy, from.y - box.top],
    [dy, box.bottom - from.y],
  ];
  for (const [speed, room] of sides) {
    if (speed === 0) {
      if (room < 0) return null;
    } else if (speed < 0) enter = Math.max(enter, room / speed);
    else leave = Math.min(leave, room / speed);
  }
  return enter <= leave ? [enter, leave] : null;
}
