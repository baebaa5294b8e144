import type { Box } from "./Scene.ts";

/** Shortest distance between two boxes; zero when they touch or overlap. */
export function boxGap(a: Box, b: Box): number {
  const across = Math.max(0, a.left - b.right, b.left - a.right);
  const down = Math.max(0, a.top - b.bottom, b.top - a.bottom);
  return Math.hypot(across, down);
}
