import type { Box, Point } from "./Scene.ts";

/** What already stands in a drawing when small letters look for a free place. */
export interface Ground {
  readonly lines: readonly { readonly from: Point; readonly to: Point; readonly width: number }[];
  readonly boxes: readonly Box[];
  /** Other small letters, from which more distance is kept. */
  readonly small: readonly Box[];
}
