import { decimalsFor } from "./decimalsFor.ts";
import { joinInterval } from "./joinInterval.ts";
import { plainNumber } from "./plainNumber.ts";
import { toDecimals } from "./toDecimals.ts";

/**
 * An interval with its unit: `12.3–17.5 kJ/mol`, or with the word where an end point is negative.
 * The digits are those its half-width supports.
 *
 * @param interval - lower and upper end, in `unit`.
 * @param unit - printed after a no-break space; empty for a pure number.
 */
export function formatInterval(interval: readonly [number, number], unit = ""): string {
  const [low, high] = interval;
  const decimals = decimalsFor((high - low) / 2) ?? 2;
  const range = joinInterval(plainNumber(toDecimals(low, decimals)), plainNumber(toDecimals(high, decimals)));
  return unit === "" ? range : `${range}\u00a0${unit}`;
}
