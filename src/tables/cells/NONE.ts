import type { Cell } from "../TableModel.ts";

/** Nothing stands here, and that is meant: a dash in print, nothing in CSV. */
export const NONE: Cell = { text: "\u2013" };
