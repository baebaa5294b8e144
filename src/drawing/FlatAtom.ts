import type { Box, Point, SceneText } from "./Scene.ts";

/** An atom of the flat diagram on the page. */
export interface FlatAtom {
  readonly at: Point;
  /** Atoms bonded to it. */
  readonly neighbours: readonly number[];
  /** Its letters; none for a bare corner or end. */
  readonly texts: readonly SceneText[];
  /** Room of the letters, piece by piece. */
  readonly boxes: readonly Box[];
}
