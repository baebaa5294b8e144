import { plainNumber } from "./plainNumber.ts";
import { roundToUncertainty } from "./roundToUncertainty.ts";
import { toDecimals } from "./toDecimals.ts";
import { toKilocalorie } from "./units.ts";

/**
 * A molar energy for prose, kJ/mol first: `7.28 ± 0.25 kJ/mol (1.74 ± 0.06 kcal/mol)`.
 *
 * Each unit is rounded from the unrounded value by itself. Without `u` the value is given to
 * 0.1 kJ/mol and 0.01 kcal/mol; with a `u` of zero it is exact and stands alone.
 *
 * @param energy - kJ/mol.
 * @param u - standard uncertainty, kJ/mol.
 */
export function formatEnergy(energy: number, u?: number): string {
  if (u === undefined) {
    const kilojoules = plainNumber(toDecimals(energy, 1));
    return `${kilojoules}\u00a0kJ/mol (${plainNumber(toDecimals(toKilocalorie(energy), 2))}\u00a0kcal/mol)`;
  }
  return `${pair(energy, u)}\u00a0kJ/mol (${pair(toKilocalorie(energy), toKilocalorie(u))}\u00a0kcal/mol)`;
}

function pair(value: number, u: number): string {
  const rounded = roundToUncertainty(value, u);
  const text = plainNumber(rounded.value);
  return rounded.u === null ? text : `${text}\u00a0±\u00a0${rounded.u}`;
}
