import { roundToUncertainty } from "../../quantity/roundToUncertainty.ts";
import { toKilocalorie } from "../../quantity/units.ts";
import type { Cell } from "../TableModel.ts";
import { bothUnitsCell } from "./bothUnitsCell.ts";

/**
 * A standard uncertainty in both units, each with the digits it deserves.
 *
 * @param u - kJ/mol.
 */
export function uncertaintyCell(u: number): Cell {
  const text = (uncertainty: number) => roundToUncertainty(0, uncertainty).u ?? "0";
  return bothUnitsCell(u, text(u), text(toKilocalorie(u)));
}
