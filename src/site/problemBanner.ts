import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { printDiagnostic } from "../diagnostics/printDiagnostic.ts";
import { escapeHtml } from "../quantity/escapeHtml.ts";

/** Stands in the page itself, so that the problems are seen even where the site's own styles are not. */
const STYLE =
  "margin:0;padding:1rem 1.25rem;border-bottom:3px solid #a40000;background:#fff4f2;color:#2b0a08;" +
  "font:0.9rem/1.45 system-ui,sans-serif";
const PRE =
  "margin:0.5rem 0 0;white-space:pre-wrap;overflow-wrap:anywhere;font:0.85rem/1.45 ui-monospace,monospace";

/**
 * A page as the live server shows it while the content has errors: all of them on top, the page below.
 * The page is otherwise unchanged, so that the last good state stays readable.
 */
export function withProblemBanner(text: string, problems: readonly Diagnostic[]): string {
  const errors = problems.filter(({ severity }) => severity === "error");
  if (errors.length === 0) return text;
  return insertBanner(
    text,
    `${errors.length} ${errors.length === 1 ? "error" : "errors"} in the content`,
    errors.map(printDiagnostic).join("\n\n"),
  );
}

/** A page of its own for what has no other page to stand on. */
export function problemPage(heading: string, details: string): string {
  return insertBanner(
    '<!DOCTYPE html>\n<html lang="en"><head><meta charset="utf-8"><title>Ringfolio: problems</title></head><body></body></html>\n',
    heading,
    details,
  );
}

function insertBanner(text: string, heading: string, details: string): string {
  const banner =
    `<section role="alert" class="serve-problems" aria-label="Problems" style="${STYLE}">` +
    `<strong>${escapeHtml(heading)}</strong><pre style="${PRE}">${escapeHtml(details)}</pre></section>`;
  return text.replace(/<body[^>]*>/, (body) => `${body}${banner}`);
}
