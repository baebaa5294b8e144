import { toDecimals } from "../quantity/toDecimals.ts";
import { texSignificant } from "./texSignificant.ts";

/** Nearer to 1 than this, what is missing is easier to read than nines. */
const NEAR_ONE = 1e-5;
/** What floating point can still tell from 1. */
const SMALLEST_REST = 1e-15;

/** A fraction between 0 and 1 with enough digits that it never reads as 1. */
export function texFraction(fraction: number): string {
  if (fraction === 0.5) return "0.5";
  if (fraction < 0.01) return texSignificant(fraction);
  const rest = 1 - fraction;
  if (rest < SMALLEST_REST) return "1 - {<}10^{-15}";
  if (rest < NEAR_ONE) return `1 - ${texSignificant(rest, 2)}`;
  const fromOne = -Math.floor(Math.log10(rest));
  return toDecimals(fraction, Math.max(4, fromOne + 1));
}
