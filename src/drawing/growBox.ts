import type { Box } from "./Scene.ts";

/** The box with the same free margin on all four sides. */
export function growBox(box: Box, margin: number): Box {
  return {
    left: box.left - margin,
    top: box.top - margin,
    right: box.right + margin,
    bottom: box.bottom + margin,
  };
}
