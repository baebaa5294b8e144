import { clipSegment } from "./clipSegment.ts";
import { pointSegmentGap } from "./pointSegmentGap.ts";
import type { Box, Point } from "./Scene.ts";

/** Shortest distance between a straight line and a box; zero when the line touches or crosses it. */
export function segmentBoxGap(from: Point, to: Point, box: Box): number {
  if (clipSegment(from, to, box) !== null) return 0;
  const corners = [
    { x: box.left, y: box.top },
    { x: box.right, y: box.top },
    { x: box.right, y: box.bottom },
    { x: box.left, y: box.bottom },
  ];
  return Math.min(
    ...corners.map((corner) => pointSegmentGap(corner, from, to)),
    pointBoxGap(from, box),
    pointBoxGap(to, box),
  );
}

function pointBoxGap(point: Point, box: Box): number {
  const across = Math.max(0, box.left - point.x, point.x - box.right);
  const down = Math.max(0, box.top - point.y, point.y - box.bottom);
  return Math.hypot(across, down);
}
