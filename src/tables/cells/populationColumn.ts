import type { Column } from "../TableModel.ts";

/** A column of populations with their 95 % intervals. */
export function populationColumn(key: string, title: string, description?: string): Column {
  return {
    key,
    title,
    align: "right",
    numbers: [`${title} / %`, `${title}, lower 95 % / %`, `${title}, upper 95 % / %`],
    ...(description === undefined ? {} : { description }),
  };
}
