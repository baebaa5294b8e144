/**
 * A number with a fixed count of decimals, in plain ASCII: `-7.28`, `120` for −1 decimals of 118.
 *
 * Halves are rounded away from zero on the decimal form a reader sees (twelve digits of the value), so that
 * 2.675 becomes 2.68 although its binary neighbour lies just below. Never gives a negative zero.
 *
 * @param value - finite number.
 * @param decimals - places after the point; negative for tens, hundreds and so on.
 */
export function toDecimals(value: number, decimals: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`only finite numbers can be printed, got ${value}`);
  const scaled = shift(Number(Math.abs(value).toPrecision(12)), decimals);
  const rounded = shift(Math.round(scaled), -decimals);
  const text = rounded.toFixed(Math.max(0, decimals));
  return value < 0 && Number(text) !== 0 ? `-${text}` : text;
}

/** Moves the decimal point in the decimal form, where multiplying would bring the binary error back. */
function shift(value: number, places: number): number {
  const [mantissa = "0", exponent = "0"] = String(value).split("e");
  return Number(`${mantissa}e${Number(exponent) + places}`);
}
