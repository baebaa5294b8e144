import type { Directive } from "./Directive.ts";
import { maskCode } from "./maskCode.ts";

/** `::figure[chair]{conformer=B}` or `:value[population.major]`; a word, digit, colon or backslash before it hides it. */
const DIRECTIVE = /(?<![\w:\\])(::?)([A-Za-z][A-Za-z-]*)\[([^[\]\n]*)\](?:\{([^{}\n]*)\})?/g;
const OPTION = /([A-Za-z][\w-]*)=(?:"([^"]*)"|([^\s"]+))/g;

/**
 * The directives in Markdown prose, outside code, in order. Lines count from `firstLine`, the line of
 * the file on which the prose begins.
 */
export function findDirectives(markdown: string, firstLine = 1): readonly Directive[] {
  return maskCode(markdown)
    .split("\n")
    .flatMap((line, index) =>
      [...line.matchAll(DIRECTIVE)].map((match): Directive => {
        const [whole, colons, kind, name, options] = match;
        return {
          kind: kind!,
          name: name!.trim(),
          options: readOptions(options ?? ""),
          unread: (options ?? "").replace(OPTION, "").trim(),
          form: colons === "::" ? "block" : "inline",
          alone: line.trim() === whole && /^ {0,3}\S/.test(line),
          line: firstLine + index,
          column: match.index + 1,
          length: whole.length,
        };
      }),
    );
}

function readOptions(text: string): Readonly<Record<string, string>> {
  return Object.fromEntries(
    [...text.matchAll(OPTION)].map(([, key, quoted, bare]) => [key!, quoted ?? bare ?? ""]),
  );
}
