import { decimalsFor } from "./decimalsFor.ts";
import { toDecimals } from "./toDecimals.ts";

/** A value and its uncertainty rounded for print, in plain ASCII, both with the same last place. */
export interface RoundedPair {
  readonly value: string;
  /** Null when the value is exact. */
  readonly u: string | null;
  readonly decimals: number;
}

/** Places kept for an exact value that is not a whole number. */
const EXACT_DECIMALS = 2;

/**
 * Rounds a value to its standard uncertainty, the one place where digits are chosen for such pairs:
 * plain text and formulae both start from this.
 *
 * The uncertainty keeps the digits that `decimalsFor` allows, the value the same last place
 * (JCGM 100:2008, 7.2.6). The inputs stay unrounded for further calculation.
 *
 * @param value - in any unit.
 * @param u - standard uncertainty in the same unit; zero for an exact value.
 */
export function roundToUncertainty(value: number, u: number): RoundedPair {
  const decimals = decimalsFor(u);
  if (decimals === null) {
    const places = Number.isInteger(value) ? 0 : EXACT_DECIMALS;
    return { value: toDecimals(value, places), u: null, decimals: places };
  }
  return { value: toDecimals(value, decimals), u: toDecimals(u, decimals), decimals };
}
