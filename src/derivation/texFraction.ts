import { toDecimals } from "../quantity/toDecimals.ts";
import { texSignificant } from "./texSignificant.ts";

/** A fraction between 0 and 1 with enough digits that it never reads as 0 or 1 unless it is. */
export function texFraction(fraction: number): string {
  if (fraction === 0 || fraction === 1 || fraction === 0.5) return String(fraction);
  if (fraction < 0.01) return texSignificant(fraction);
  const fromOne = -Math.floor(Math.log10(Math.max(1 - fraction, 1e-12)));
  return toDecimals(fraction, Math.max(4, fromOne + 1));
}
