/** A formula in prose that cannot be set, placed in the Markdown text that was given to the parser. */
export interface MathProblem {
  readonly message: string;
  /** Counts from 1 in that text; the caller adds the lines that stand before it in the file. */
  readonly line: number;
  /** Counts from 1, in UTF-16 units. */
  readonly column: number;
}
