import type { Column } from "../TableModel.ts";

/** A column of plain numbers; the unit stands in its heading. */
export function numberColumn(key: string, title: string, unit?: string): Column {
  if (unit === undefined) return { key, title, align: "right", numbers: [title] };
  return { key, title, unit, align: "right", numbers: [`${title} / ${unit}`] };
}
