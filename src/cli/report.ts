import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { printDiagnostic } from "../diagnostics/printDiagnostic.ts";
import type { Io } from "./Io.ts";

/** Prints every problem to the error stream, then how many there are. */
export function report(
  diagnostics: readonly Diagnostic[],
  io: Io,
): { readonly errors: number; readonly cautions: number } {
  const errors = diagnostics.filter(({ severity }) => severity === "error").length;
  const cautions = diagnostics.length - errors;
  for (const diagnostic of diagnostics) io.errors.write(`${printDiagnostic(diagnostic)}\n\n`);
  if (diagnostics.length > 0) io.errors.write(`${count(errors, "error")}, ${count(cautions, "caution")}\n`);
  return { errors, cautions };
}

/** `1 error`, `2 errors`. */
export function count(n: number, word: string): string {
  return `${n} ${word}${n === 1 ? "" : "s"}`;
}
