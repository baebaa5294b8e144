/** Where in a content file a problem stands. Lines and columns count from 1; columns count UTF-16 units. */
export interface Place {
  /** Path as shown to the author, with forward slashes, relative to the working folder where possible. */
  readonly file: string;
  readonly line: number;
  readonly column: number;
  /** Length of the offending text in UTF-16 units, at least 1. */
  readonly length?: number;
  /** The whole source line, so that the printed form can point into it. */
  readonly sourceLine?: string;
}

export type DiagnosticSeverity = "error" | "caution";

/** One problem in the content: a record, printed elsewhere. Errors fail the build, cautions do not. */
export interface Diagnostic {
  /** Stable kebab-case word, e.g. `unknown-group`. */
  readonly code: string;
  readonly severity: DiagnosticSeverity;
  readonly place: Place;
  /** Whole sentences: what was found and what is allowed. */
  readonly message: string;
  /** The nearest valid word, when there is one. */
  readonly suggestion?: string;
}
