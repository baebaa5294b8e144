import type { Span } from "./cutStroke.ts";
import { CROSSING_GAP } from "./measures.ts";
import type { Stroke } from "./Stroke.ts";

/** Depths closer than this, px, do not say which of two bonds is nearer. */
const SAME_DEPTH = 0.5;

/** The span to take out of a stroke where another passes in front of it; null when none does. */
export function crossingGap(far: Stroke, near: Stroke): Span | null {
  if (far.vertices.some((vertex) => near.vertices.includes(vertex))) return null;
  const [ax, ay] = [far.to.x - far.from.x, far.to.y - far.from.y];
  const [bx, by] = [near.to.x - near.from.x, near.to.y - near.from.y];
  const cross = ax * by - ay * bx;
  if (Math.abs(cross) < 1e-9) return null;
  const [ox, oy] = [near.from.x - far.from.x, near.from.y - far.from.y];
  const share = (ox * by - oy * bx) / cross;
  const otherShare = (ox * ay - oy * ax) / cross;
  if (share < 0 || share > 1 || otherShare < 0 || otherShare > 1) return null;
  const depth = far.from.depth + share * (far.to.depth - far.from.depth);
  const otherDepth = near.from.depth + otherShare * (near.to.depth - near.from.depth);
  if (otherDepth < depth + SAME_DEPTH) return null;
  const width = near.width + otherShare * (near.endWidth - near.width);
  const ownWidth = far.width + share * (far.endWidth - far.width);
  const length = Math.hypot(ax, ay);
  const sine = Math.abs(cross) / (length * Math.hypot(bx, by));
  // Round ends reach half a width beyond the cut.
  const half = ((width / 2 + CROSSING_GAP) / sine + ownWidth / 2) / length;
  return [share - half, share + half];
}
