import type { Diagnostic } from "./Diagnostic.ts";

/** The printed form of one problem: place, code, the source line with a pointer, message, suggestion. */
export function printDiagnostic(diagnostic: Diagnostic): string {
  const { place } = diagnostic;
  const head = `${place.file}:${place.line}:${place.column}: ${diagnostic.severity}[${diagnostic.code}]`;
  const lines = [head];
  if (place.sourceLine !== undefined) {
    const margin = String(place.line).padStart(5);
    const indent = place.sourceLine.slice(0, place.column - 1).replace(/[^\t]/g, " ");
    lines.push(`${margin} | ${place.sourceLine}`);
    lines.push(`${" ".repeat(margin.length)} | ${indent}${"^".repeat(Math.max(1, place.length ?? 1))}`);
  }
  lines.push(`  ${diagnostic.message}`);
  if (diagnostic.suggestion !== undefined) lines.push(`  Did you mean "${diagnostic.suggestion}"?`);
  return lines.join("\n");
}

/** Orders problems by file, line, column and code, so that a report never depends on reading order. */
export function compareDiagnostics(a: Diagnostic, b: Diagnostic): number {
  const byText = (x: string, y: string) => (x < y ? -1 : x > y ? 1 : 0);
  return (
    byText(a.place.file, b.place.file) ||
    a.place.line - b.place.line ||
    a.place.column - b.place.column ||
    byText(a.code, b.code)
  );
}
