/** A summand of a printed sum. */
export interface Summand {
  /** TeX without sign. */
  readonly tex: string;
  readonly negative: boolean;
}

/**
 * A sum as lines of an `aligned` block, broken before the sign as is the custom.
 * The first line stands after the `&=` of the caller, each further one begins with its own `&`.
 *
 * @param perLine - summands on one line; three short numbers fit a telephone held upright.
 */
export function texSum(summands: readonly Summand[], perLine = 3): readonly string[] {
  const signed = summands.map(({ tex, negative }, index) => {
    if (index === 0) return negative ? `-${tex}` : tex;
    return `${negative ? "-" : "+"} ${tex}`;
  });
  const lines: string[] = [];
  for (let start = 0; start < signed.length; start += perLine) {
    const line = signed.slice(start, start + perLine).join(" ");
    lines.push(start === 0 ? line : `&\\quad {}${line}`);
  }
  return lines;
}
