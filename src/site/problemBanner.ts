import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { printDiagnostic } from "../diagnostics/printDiagnostic.ts";
import { escapeHtml } from "../quantity/escapeHtml.ts";

/**
 * A page as the live server shows it while the content has errors: all of them on top, the page below.
 * The page is otherwise unchanged, so that the last good state stays readable.
 */
export function withProblemBanner(text: string, problems: readonly Diagnostic[]): string {
  const errors = problems.filter(({ severity }) => severity === "error");
  if (errors.length === 0) return text;
  const banner =
    `<section role="alert" class="serve-problems" aria-label="Problems in the content">` +
    `<h2>${errors.length} ${errors.length === 1 ? "error" : "errors"} in the content</h2>` +
    `<pre>${escapeHtml(errors.map(printDiagnostic).join("\n\n"))}</pre></section>`;
  return text.replace(/<body[^>]*>/, (body) => `${body}${banner}`);
}
