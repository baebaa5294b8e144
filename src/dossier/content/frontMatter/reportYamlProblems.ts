import { type Document, isCollection, isScalar, visit } from "yaml";
import { explainYamlError } from "./explainYamlError.ts";

/** Aliases may repeat a value, but not multiply it (a few lines can otherwise stand for gigabytes). */
export const MOST_ALIASES = 20;
export const TOO_MANY_ALIASES = `Aliases repeat values more than ${MOST_ALIASES} times; write the values out.`;

/** Takes one problem with its offset in the YAML text. */
export type ReportAt = (
  code: string,
  offset: number,
  length: number,
  message: string,
  suggestion?: string,
) => void;

/**
 * Reports what the parser found; true when the data cannot be trusted. Of the errors that disturb what
 * follows only the first is told, because the others are mostly its echoes.
 */
export function reportYamlProblems(document: Document.Parsed, yaml: string, report: ReportAt): boolean {
  let untrusted = false;
  for (const problem of [...document.errors, ...document.warnings]) {
    let offset = Math.min(problem.pos[0], yaml.length);
    const found = (/^[^\s:,}\]]+/.exec(yaml.slice(offset, offset + 80)) ?? [""])[0];
    const { code, message, suggestion, local } = explainYamlError(
      problem.code,
      problem.message,
      lineAround(yaml, offset),
      found,
    );
    if (!local && untrusted) continue;
    if (!local) {
      untrusted = true;
      // An unclosed quotation mark or bracket is noticed far below; its opening is what the author must see.
      offset = unclosedBefore(document, offset, problem.code) ?? offset;
      // How deep the parser gets depends on the machine, so the place must not.
      if (problem.code === "RESOURCE_EXHAUSTION") offset = 0;
    }
    report(code, offset, Math.max(1, found.length), message, suggestion);
  }
  return untrusted || reportAliases(document, report);
}

/** Reports aliases of nothing, of themselves, and beyond number; looking each one up costs a walk through the document. */
function reportAliases(document: Document.Parsed, report: ReportAt): boolean {
  let untrusted = false;
  let count = 0;
  visit(document, {
    Alias: (_key, alias, ancestors) => {
      count += 1;
      if (count > MOST_ALIASES) {
        report("too-many-aliases", alias.range![0], alias.range![1] - alias.range![0], TOO_MANY_ALIASES);
        untrusted = true;
        return visit.BREAK;
      }
      const named = alias.resolve(document);
      if (named !== undefined && !ancestors.includes(named)) return undefined;
      const [from, to] = alias.range!;
      report(
        "broken-yaml",
        from,
        to - from,
        named === undefined
          ? "A value that begins with * is read as an alias, and none of this name exists; put the text in quotation marks."
          : "This alias stands within the value that it names.",
      );
      untrusted = true;
      return undefined;
    },
  });
  return untrusted;
}

function lineAround(yaml: string, offset: number): string {
  const start = yaml.lastIndexOf("\n", offset - 1) + 1;
  return (/^.*/.exec(yaml.slice(start)) ?? [""])[0];
}

/** Offset of the quotation mark or bracket that is still open at `offset`, if that is the complaint. */
function unclosedBefore(document: Document.Parsed, offset: number, code: string): number | undefined {
  if (code !== "MISSING_CHAR" && code !== "BAD_INDENT") return undefined;
  let opening: number | undefined;
  visit(document, {
    Node: (_key, node) => {
      const quoted = isScalar(node) && (node.type === "QUOTE_SINGLE" || node.type === "QUOTE_DOUBLE");
      const bracketed = isCollection(node) && node.flow === true;
      const range = node.range;
      if ((quoted || bracketed) && range != null && range[0] < offset && range[1] >= offset)
        opening = range[0];
    },
  });
  return opening;
}
