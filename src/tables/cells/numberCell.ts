import { plainNumber } from "../../quantity/plainNumber.ts";
import type { Cell } from "../TableModel.ts";

/** A single number, printed as given or with all its digits. */
export function numberCell(value: number, text = plainNumber(String(value))): Cell {
  return { text, sortValue: value, numbers: [value] };
}
