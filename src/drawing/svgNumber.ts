/** A coordinate as SVG text: at most two decimals, never a negative zero, never an exponent. */
export function svgNumber(value: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`only finite coordinates can be drawn, got ${value}`);
  const rounded = Math.round(value * 100) / 100;
  return rounded === 0 ? "0" : String(rounded);
}
