import { type Document, isMap, isScalar, parseDocument } from "yaml";
import { findDeepNesting } from "./findDeepNesting.ts";
import { MOST_ALIASES, type ReportAt, reportYamlProblems, TOO_MANY_ALIASES } from "./reportYamlProblems.ts";

/**
 * Reads a set of keys from YAML text as plain data, or reports why not and gives null. The parser recurses, so
 * nesting is bounded before it begins; whatever it still throws is a refusal like any other.
 */
export function readYaml(
  yaml: string,
  report: ReportAt,
): { readonly document: Document.Parsed; readonly data: Readonly<Record<string, unknown>> } | null {
  const deep = findDeepNesting(yaml);
  if (deep !== null) {
    report("broken-yaml", deep, 1, "Lists or keys are nested too deeply.");
    return null;
  }
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
    if (reportYamlProblems(document, yaml, report)) return null;
  } catch {
    report("broken-yaml", 0, 1, "Lists or keys are nested too deeply.");
    return null;
  }
  const { contents } = document;
  if (contents === null || (isScalar(contents) && contents.value === null)) return { document, data: {} };
  if (!isMap(contents)) {
    const [from, to] = contents.range;
    const hint = /\w:\S/.test(yaml) ? " A colon must be followed by a space." : "";
    report("not-a-map", from, to - from, `The front matter must be a set of keys with values.${hint}`);
    return null;
  }
  try {
    return { document, data: document.toJS({ maxAliasCount: MOST_ALIASES }) as Record<string, unknown> };
  } catch {
    report("too-many-aliases", 0, 1, TOO_MANY_ALIASES);
    return null;
  }
}
