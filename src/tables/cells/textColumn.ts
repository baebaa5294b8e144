import type { Column } from "../TableModel.ts";

/** A column of words. */
export function textColumn(key: string, title: string): Column {
  return { key, title, align: "left" };
}
