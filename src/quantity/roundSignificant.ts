import { toDecimals } from "./toDecimals.ts";

/** A positive number rounded to significant digits: `mantissa` × 10^`exponent`, exponent 0 for plain ones. */
export interface RoundedSignificant {
  readonly mantissa: string;
  readonly exponent: number;
}

/**
 * Rounds to significant digits, and to a power of ten where plain digits would need counting:
 * below 0.01 and from 1000 on.
 *
 * @param value - positive and finite, dimensionless (an equilibrium constant); zero is allowed and stays 0.
 * @param digits - significant digits to keep.
 */
export function roundSignificant(value: number, digits: number): RoundedSignificant {
  if (!(value >= 0) || !Number.isFinite(value)) {
    throw new RangeError(`only finite numbers from 0 can be rounded to significant digits, got ${value}`);
  }
  if (value === 0) return { mantissa: "0", exponent: 0 };
  const [mantissa = "0", power = "0"] = roundHalfUp(value, digits)
    .toExponential(digits - 1)
    .split("e");
  const exponent = Number(power);
  if (exponent < -2 || exponent > 2) return { mantissa, exponent };
  const decimals = Math.max(0, digits - 1 - exponent);
  return { mantissa: Number(`${mantissa}e${exponent}`).toFixed(decimals), exponent: 0 };
}

/** Smallest power of ten that decimals can reach; no constant of a conformer comes near. */
const MOST_DECIMALS = 100;

/** Rounds on the decimal form a reader sees, as `toDecimals` does, so that 0.00245 becomes 0.0025. */
function roundHalfUp(value: number, digits: number): number {
  const exponent = Number(value.toExponential(11).split("e")[1]);
  const decimals = digits - 1 - exponent;
  return decimals > MOST_DECIMALS ? value : Number(toDecimals(value, decimals));
}
