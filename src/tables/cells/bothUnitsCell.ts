import { toKilocalorie } from "../../quantity/units.ts";
import type { Cell } from "../TableModel.ts";

/**
 * A cell of a column that prints an energy in kJ/mol with kcal/mol in brackets.
 *
 * @param value - kJ/mol, unrounded.
 * @param kilojoules - as printed.
 * @param kilocalories - as printed.
 */
export function bothUnitsCell(value: number, kilojoules: string, kilocalories: string): Cell {
  const text = value === 0 ? "0" : `${kilojoules} (${kilocalories})`;
  return { text, sortValue: value, numbers: [value, toKilocalorie(value)] };
}
