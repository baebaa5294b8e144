import { roundSignificant } from "../quantity/roundSignificant.ts";

/** A positive number with three significant digits: `0.0529`, `2.45\times10^{-3}`. */
export function texSignificant(value: number): string {
  const { mantissa, exponent } = roundSignificant(value, 3);
  return exponent === 0 ? mantissa : `${mantissa}\\times10^{${exponent}}`;
}
