import type { Point } from "./Scene.ts";

/** Shortest distance between a point and a straight line between two points. */
export function pointSegmentGap(point: Point, from: Point, to: Point): number {
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  const length = dx * dx + dy * dy;
  const along = length === 0 ? 0 : ((point.x - from.x) * dx + (point.y - from.y) * dy) / length;
  const t = Math.min(1, Math.max(0, along));
  return Math.hypot(point.x - from.x - t * dx, point.y - from.y - t * dy);
}
