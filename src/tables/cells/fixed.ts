/** A number with a fixed count of decimals and a true minus. */
export function fixed(value: number, decimals: number): string {
  return (value + 0)
    .toFixed(decimals)
    .replace(/^-(?=0(\.0+)?$)/, "")
    .replace("-", "−");
}
