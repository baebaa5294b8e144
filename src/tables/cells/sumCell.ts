import { plainNumber } from "../../quantity/plainNumber.ts";
import { toDecimals } from "../../quantity/toDecimals.ts";
import { toKilocalorie } from "../../quantity/units.ts";
import type { Cell } from "../TableModel.ts";
import { bothUnitsCell } from "./bothUnitsCell.ts";

/**
 * An energy on the way to a difference, without an uncertainty of its own: two decimals, so that it can be followed.
 *
 * @param value - kJ/mol.
 */
export function sumCell(value: number): Cell {
  const text = (energy: number) => plainNumber(toDecimals(energy, 2));
  return bothUnitsCell(value, text(value), text(toKilocalorie(value)));
}
