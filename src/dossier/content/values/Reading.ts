/** One mistake in one value: a diagnostic still without its place. */
export interface ValueProblem {
  readonly code: string;
  readonly message: string;
  readonly suggestion?: string;
}

/** What came of reading one value: the value, or what is wrong with it. */
export type Reading<T> = { readonly value: T } | { readonly problem: ValueProblem };

export function problem(
  code: string,
  message: string,
  suggestion?: { readonly suggestion?: string },
): {
  readonly problem: ValueProblem;
} {
  return { problem: { code, message, ...suggestion } };
}
