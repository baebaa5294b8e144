import { type Document, isCollection, isMap, isScalar, type Node, parseDocument, visit } from "yaml";
import type { Diagnostic, Place } from "../../diagnostics/Diagnostic.ts";
import type { ContentFile } from "./CompoundInput.ts";
import { explainYamlError } from "./explainYamlError.ts";
import { locateNode } from "./locateNode.ts";
import { sourceText } from "./SourceText.ts";
import { splitFrontMatter } from "./splitFrontMatter.ts";

export type ContentPath = readonly (string | number)[];

/** A content file taken apart: plain data with positions, and the prose. Nothing in it has been executed. */
export interface FrontMatter {
  /** Plain data, keys as text; null when the front matter could not be read at all. */
  readonly data: Readonly<Record<string, unknown>> | null;
  /** Why there is no data, for callers to whom absent front matter is no mistake. */
  readonly absent: boolean;
  /** Place of the value at a path, or of its nearest existing ancestor; `character` counts into a text value. */
  readonly place: (path: ContentPath, character?: number) => Place;
  /** Place of the key at the end of a path. */
  readonly placeOfKey: (path: ContentPath) => Place;
  readonly prose: { readonly markdown: string; readonly firstLine: number };
  readonly diagnostics: readonly Diagnostic[];
}

/** Aliases may repeat a value, but not multiply it (a few lines can otherwise stand for gigabytes). */
const MOST_ALIASES = 20;

/** Reads the front matter of one file with positions, by YAML 1.2's core schema and nothing beyond it. */
export function parseFrontMatter(file: ContentFile): FrontMatter {
  const source = sourceText(file);
  const parts = splitFrontMatter(source);
  const diagnostics: Diagnostic[] = [];
  const report = (code: string, place: Place, message: string, suggestion?: string) =>
    diagnostics.push({
      code,
      severity: "error",
      place,
      message,
      ...(suggestion === undefined ? {} : { suggestion }),
    });
  const prose = {
    markdown: source.text.slice(parts.proseStart).replace(/\r\n/g, "\n"),
    firstLine: source.lineAt(parts.proseStart),
  };
  const fence = source.placeAt(0, 3);
  const unread = (absent: boolean): FrontMatter => ({
    data: null,
    absent,
    place: () => fence,
    placeOfKey: () => fence,
    prose,
    diagnostics,
  });

  if (parts.problem !== null) {
    const { code, offset, length, message, suggestion } = parts.problem;
    report(code, source.placeAt(offset, length), message, suggestion);
    return unread(code === "missing-front-matter" || code === "empty-file");
  }
  const { start, end } = parts.yaml!;
  const yaml = source.text.slice(start, end);
  let document: Document.Parsed;
  try {
    document = parseDocument(yaml, {
      version: "1.2",
      schema: "core",
      strict: true,
      uniqueKeys: true,
      stringKeys: true,
      merge: false,
      prettyErrors: false,
      // At `silent` the parser would drop a second document without a word.
      logLevel: "error",
    });
  } catch {
    // The parser recurses: very deep nesting ends in a stack overflow rather than in an error of its own.
    report("broken-yaml", source.placeAt(start, 1), "Lists or keys are nested too deeply.");
    return unread(false);
  }
  if (
    reportYamlProblems(document, yaml, (code, offset, length, message, suggestion) =>
      report(code, source.placeAt(start + offset, length), message, suggestion),
    )
  )
    return unread(false);

  let data: unknown;
  try {
    data = document.toJS({ maxAliasCount: MOST_ALIASES });
  } catch {
    report(
      "too-many-aliases",
      fence,
      `Aliases repeat values more than ${MOST_ALIASES} times; write the values out.`,
    );
    return unread(false);
  }
  if (document.contents === null || (isScalar(document.contents) && document.contents.value === null)) {
    data = {};
  } else if (!isMap(document.contents)) {
    const hint = /\w:\S/.test(yaml) ? " A colon must be followed by a space." : "";
    report(
      "not-a-map",
      placeOfNode(document.contents),
      `The front matter must be a set of keys with values.${hint}`,
    );
    return unread(false);
  }

  function placeOfNode(node: Node): Place {
    const [from, valueEnd] = node.range!;
    return source.placeAt(start + from, valueEnd - from);
  }
  const place = (path: ContentPath, character = 0): Place => {
    const { key, value, complete } = locateNode(document, path);
    const isEmpty = value?.range == null || value.range[0] === value.range[1];
    const node = isEmpty ? key : value;
    if (node === null || node === document.contents) return fence;
    const whole = placeOfNode(node);
    if (!complete || isEmpty || character <= 0 || !isScalar(value)) return whole;
    const opening = value.type === "QUOTE_SINGLE" || value.type === "QUOTE_DOUBLE" ? 1 : 0;
    return source.placeAt(Math.min(start + value.range![0] + opening + character, start + value.range![1]));
  };
  const placeOfKey = (path: ContentPath): Place => {
    const { key, complete } = locateNode(document, path);
    return complete && key?.range != null ? placeOfNode(key) : place(path);
  };
  return { data: data as Record<string, unknown>, absent: false, place, placeOfKey, prose, diagnostics };
}

type ReportAt = (code: string, offset: number, length: number, message: string, suggestion?: string) => void;

/**
 * Reports what the parser found; true when the data cannot be trusted. Of the errors that disturb what
 * follows only the first is told, because the others are mostly its echoes.
 */
function reportYamlProblems(document: Document.Parsed, yaml: string, report: ReportAt): boolean {
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
    }
    report(code, offset, Math.max(1, found.length), message, suggestion);
  }
  if (untrusted) return true;
  visit(document, {
    Alias: (_key, alias) => {
      if (alias.resolve(document) !== undefined) return;
      const [from, to] = alias.range!;
      report(
        "broken-yaml",
        from,
        to - from,
        "A value that begins with * is read as an alias, and none of this name exists; put the text in quotation marks.",
      );
      untrusted = true;
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
