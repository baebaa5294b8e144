import { parseLabel } from "./parseLabel.ts";

/** The markup of a chemical label without its marks, for attributes, speech and CSV: `CO2Me`, `NH3+`, `t-Bu`. */
export function labelText(markup: string): string {
  return parseLabel(markup)
    .map((run) => run.text)
    .join("");
}
