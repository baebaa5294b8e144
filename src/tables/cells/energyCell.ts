import { plainNumber } from "../../quantity/plainNumber.ts";
import { roundToUncertainty } from "../../quantity/roundToUncertainty.ts";
import { toKilocalorie } from "../../quantity/units.ts";
import type { Cell } from "../TableModel.ts";
import { bothUnitsCell } from "./bothUnitsCell.ts";

/**
 * An energy in both units, each rounded to its uncertainty: `7.28 (1.74)`.
 *
 * @param value - kJ/mol.
 * @param u - standard uncertainty, kJ/mol.
 */
export function energyCell(value: number, u: number): Cell {
  const text = (energy: number, uncertainty: number) =>
    plainNumber(roundToUncertainty(energy, uncertainty).value);
  return bothUnitsCell(value, text(value, u), text(toKilocalorie(value), toKilocalorie(u)));
}
