import type { Box, Point, SceneText } from "./Scene.ts";

/** One way to set the letters of a group or of a ring atom. */
export interface LabelChoice {
  readonly texts: readonly SceneText[];
  /** Room the letters need, apart from the attached atom's own letter where bonds end. */
  readonly boxes: readonly Box[];
  /** Letter of the attached atom, or of the ring atom; bonds of its own vertex end at it. */
  readonly core: Box;
  /** The bond to the group, from the ring atom to the middle of the attached atom's letter. */
  readonly bond: { readonly from: Point; readonly to: Point } | null;
  /** How far this choice departs from the plain one, apart from collisions. */
  readonly cost: number;
}

/** Something to be labelled, with every way of doing it. */
export interface LabelSlot {
  /** Index of the ring atom concerned. */
  readonly vertex: number;
  /** Index of the branch; null for the letters of the ring atom itself. */
  readonly branch: number | null;
  readonly choices: readonly LabelChoice[];
}
