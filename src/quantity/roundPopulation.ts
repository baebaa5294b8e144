import { decimalsFor } from "./decimalsFor.ts";
import { toDecimals } from "./toDecimals.ts";

/** A population and its interval in per cent, rounded for print, in plain ASCII: `95.0`, `>99.9`, `<1`. */
export interface RoundedPopulation {
  readonly value: string;
  readonly low: string;
  readonly high: string;
  /** The interval has no width and the value is neither 0 nor 1: chairs that are equal by symmetry. */
  readonly exact: boolean;
}

/** More than one decimal of a percentage would claim what an additive model cannot give. */
const MOST_DECIMALS = 1;

/**
 * Rounds a population to what its interval supports: the half-width in per cent chooses the decimals,
 * at most one. A value that is not exact never becomes 0 or 100 but `<0.1` or `>99.9`.
 *
 * @param population - fraction, 0 to 1.
 * @param interval - its end points, fractions.
 */
export function roundPopulation(population: number, interval: readonly [number, number]): RoundedPopulation {
  const [low, high] = interval;
  // A share that no longer differs from 1 in floating point is beyond doubt, but it is not exact.
  if (low === high && population > 0 && population < 1) {
    const whole = Number.isInteger(Number((100 * population).toPrecision(9)));
    const value = toDecimals(100 * population, whole ? 0 : MOST_DECIMALS);
    return { value, low: value, high: value, exact: true };
  }
  const supported = decimalsFor(Math.max(0, 50 * (high - low))) ?? MOST_DECIMALS;
  const decimals = Math.min(MOST_DECIMALS, Math.max(0, supported));
  const set = (fraction: number) => openPercent(fraction, decimals);
  return { value: set(population), low: set(low), high: set(high), exact: false };
}

/** Per cent with an open end where rounding would print certainty. */
function openPercent(fraction: number, decimals: number): string {
  const text = toDecimals(100 * fraction, decimals);
  const step = 10 ** -decimals;
  if (Number(text) >= 100) return `>${toDecimals(100 - step, decimals)}`;
  if (Number(text) <= 0) return `<${toDecimals(step, decimals)}`;
  return text;
}
