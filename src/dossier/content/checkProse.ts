import type { Diagnostic, Place } from "../../diagnostics/Diagnostic.ts";
import type { ContentFile } from "./CompoundInput.ts";
import {
  DIRECTIVE_OPTIONS,
  DIRECTIVES,
  type Directive,
  type DirectiveKind,
  type PageKind,
} from "./Directive.ts";
import { findDirectives } from "./findDirectives.ts";
import { sourceText } from "./frontMatter/SourceText.ts";
import { maskCode } from "./maskCode.ts";
import { quote } from "./values/quote.ts";
import { suggest } from "./values/suggest.ts";

const KINDS: readonly DirectiveKind[] = ["figure", "table", "derivation", "value"];
/** A tag or comment as Markdown would take it: `<b>`, `</b>`, `<img src=x>`, `<!-- -->`; not `<https://…>`. */
const HTML = /<(?:\/?[A-Za-z][A-Za-z0-9-]*(?:\s[^<>]*)?\/?>|!--|![A-Z]|\?)/g;
/** Problems of the prose of one file: unknown directives and raw HTML, code left aside. */
export function checkProse(
  file: ContentFile,
  prose: { readonly markdown: string; readonly firstLine: number },
  page: PageKind,
): readonly Diagnostic[] {
  const source = sourceText(file);
  const lineStarts = startsOf(source.text);
  const place = (line: number, column: number, length: number): Place =>
    source.placeAt((lineStarts[line - 1] ?? source.text.length) + column - 1, length);
  const directives = findDirectives(prose.markdown, prose.firstLine);
  const diagnostics: Diagnostic[] = directives.flatMap((directive) =>
    checkDirective(directive, page, place(directive.line, directive.column, directive.length)),
  );
  for (const [index, line] of maskCode(prose.markdown).split("\n").entries()) {
    const at = prose.firstLine + index;
    const begins = line.search(/\S/) + 1;
    if (
      /^ {0,3}::[A-Za-z]/.test(line) &&
      !directives.some(({ line: l, column }) => l === at && column === begins)
    ) {
      diagnostics.push({
        code: "broken-directive",
        severity: "error",
        place: place(at, begins, line.trim().length),
        message: "A directive names what it shows in square brackets, such as ::figure[chair].",
      });
    }
    const html = line.match(HTML);
    if (html !== null) {
      diagnostics.push({
        code: "raw-html",
        severity: "caution",
        place: place(at, line.indexOf(html[0]) + 1, html[0].length),
        message:
          "Raw HTML is not run; readers will see it as text. Use Markdown, or put it in backticks if it is meant as text.",
      });
    }
  }
  return diagnostics;
}

function startsOf(text: string): readonly number[] {
  const starts = [0];
  for (let at = text.indexOf("\n"); at !== -1; at = text.indexOf("\n", at + 1)) starts.push(at + 1);
  return starts;
}

function checkDirective(directive: Directive, page: PageKind, place: Place): readonly Diagnostic[] {
  const report = (
    code: string,
    message: string,
    suggestion: { suggestion?: string } = {},
  ): readonly Diagnostic[] => [{ code, severity: "error", place, message, ...suggestion }];
  const { kind, name, form } = directive;
  const colons = form === "block" ? "::" : ":";
  if (!KINDS.includes(kind as DirectiveKind)) {
    const near = suggest(kind, KINDS).suggestion;
    return report(
      "unknown-directive",
      `${quote(`${colons}${kind}`)} is not a directive. Allowed: ::figure[…], ::table[…] and ::derivation[…] on a line of their own, :value[…] within text.`,
      near === undefined ? {} : { suggestion: `${near === "value" ? ":" : "::"}${near}[${name}]` },
    );
  }
  const known = kind as DirectiveKind;
  const allowed = DIRECTIVES[page][known];
  if (!allowed.includes(name)) {
    const message =
      allowed.length === 0
        ? `A ${page} page has no ${known} to place.`
        : `${quote(name)} is not a ${known} of a ${page} page. Allowed: ${allowed.join(", ")}.`;
    return report(`unknown-${known}`, message, suggest(name, allowed));
  }
  if ((known === "value") !== (form === "inline")) {
    const right = `${known === "value" ? ":" : "::"}${known}[${name}]`;
    return report(
      "misplaced-directive",
      known === "value"
        ? "A value stands within text and begins with one colon."
        : `A ${known} stands on a line of its own and begins with two colons.`,
      { suggestion: right },
    );
  }
  if (form === "block" && !directive.alone) {
    return report("misplaced-directive", `A ${known} must stand on a line of its own.`);
  }
  if (directive.unread !== "") {
    return report(
      "broken-directive",
      `${quote(directive.unread)} is not an option; options are written {key=value}.`,
    );
  }
  const options = DIRECTIVE_OPTIONS[`${known}/${name}`] ?? [];
  return Object.keys(directive.options)
    .filter((option) => !options.includes(option))
    .flatMap((option) =>
      report(
        "unknown-option",
        `${quote(option)} is not an option of ${known} ${name}. ${options.length === 0 ? "It has none." : `Allowed: ${options.join(", ")}.`}`,
        suggest(option, options),
      ),
    );
}
