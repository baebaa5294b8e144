import { toDecimals } from "../../quantity/toDecimals.ts";
import type { Cell } from "../TableModel.ts";
import { numberCell } from "./numberCell.ts";

/**
 * A temperature in a column that names its unit; empty when none is stated.
 *
 * @param temperature - K.
 */
export function temperatureCell(temperature: number | undefined): Cell {
  if (temperature === undefined) return { text: "" };
  return numberCell(temperature, String(Number(toDecimals(temperature, 2))));
}
