import { roundSignificant } from "../quantity/roundSignificant.ts";

/** A positive number with three significant digits or as many as asked: `0.0529`, `2.45\times10^{-3}`. */
export function texSignificant(value: number, digits = 3): string {
  const { mantissa, exponent } = roundSignificant(value, digits);
  return exponent === 0 ? mantissa : `${mantissa}\\times10^{${exponent}}`;
}
