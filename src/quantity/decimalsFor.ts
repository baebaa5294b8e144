/** An uncertainty below this counts as none: it is the dust of floating-point sums. */
const DUST = 1e-9;

/**
 * Decimals that a standard uncertainty supports: two significant digits of `u` when its first digit is 1 or 2,
 * else one. Null when `u` is zero, that is, when the value is exact.
 *
 * The GUM allows at most two digits (JCGM 100:2008, 7.2.6). Two are kept only where one would change
 * `u` by more than a fifth; this choice within the rule is the house's own.
 *
 * @param u - standard uncertainty or half-width of an interval, not negative.
 */
export function decimalsFor(u: number): number | null {
  if (!(u >= 0) || u === Number.POSITIVE_INFINITY) {
    throw new RangeError(`an uncertainty must be finite and not negative, got ${u}`);
  }
  if (u < DUST) return null;
  const [digits = "0", exponent = "0"] = u.toExponential(5).split("e");
  const first = digits[0];
  return (first === "1" || first === "2" ? 1 : 0) - Number(exponent);
}
