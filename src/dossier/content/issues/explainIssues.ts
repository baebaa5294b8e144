import type * as z from "zod";
import type { Diagnostic } from "../../../diagnostics/Diagnostic.ts";
import type { ContentPath, FrontMatter } from "../parseFrontMatter.ts";
import { suggest } from "../values/suggest.ts";
import { chooseBranch } from "./chooseBranch.ts";
import { describeAt } from "./describeAt.ts";
import { explainKey } from "./explainKey.ts";
import { explainValue } from "./explainValue.ts";
import { keyName } from "./keyName.ts";
import { keysAt } from "./keysAt.ts";
import { valueAt } from "./valueAt.ts";

type Issue = z.core.$ZodIssue;

/**
 * Turns the schema's issues into diagnostics with places and words an author understands. A missing key
 * is not reported where a misspelt one of the same map already points to it.
 */
export function explainIssues(
  issues: readonly Issue[],
  schema: z.ZodType,
  matter: FrontMatter,
): readonly Diagnostic[] {
  const flat = issues.flatMap((issue) => chooseBranch(issue, matter.data));
  const diagnostics: Diagnostic[] = [];
  const explained = new Set<string>();
  const report = (
    code: string,
    place: Diagnostic["place"],
    message: string,
    suggestion?: { suggestion?: string },
  ) => diagnostics.push({ code, severity: "error", place, message, ...suggestion });

  for (const issue of flat) {
    if (issue.code !== "unrecognized_keys") continue;
    const path = pathOf(issue);
    const allowed = keysAt(schema, path);
    const present = Object.keys((valueAt(matter.data, path) as object | null) ?? {});
    for (const key of issue.keys) {
      const place = matter.placeOfKey([...path, key]);
      const { code, message, candidates } = explainKey(path, key, allowed);
      const suggestion = suggest(
        key,
        candidates.filter((candidate) => !present.includes(candidate)),
      );
      if (suggestion.suggestion !== undefined)
        explained.add(JSON.stringify([...path, suggestion.suggestion]));
      report(code, place, message, suggestion);
    }
  }
  for (const issue of flat) {
    if (issue.code === "unrecognized_keys") continue;
    const path = pathOf(issue);
    const found = valueAt(matter.data, path);
    if (found === undefined) {
      if (explained.has(JSON.stringify(path.map(String))) || explained.has(JSON.stringify(path))) continue;
      const about = describeAt(schema, path);
      const message = `The key \`${path.at(-1)}\` is missing${whereIs(path.slice(0, -1))}${about === undefined ? "" : `. It holds: ${about}`}.`;
      report("missing-key", matter.placeOfKey(path.slice(0, -1)), message);
      continue;
    }
    const { code, message, suggestion } = explainValue(issue, path, found, keysAt(schema, path));
    report(code, matter.place(path), message, suggestion === undefined ? {} : { suggestion });
  }
  return diagnostics;
}

const pathOf = (issue: Issue): (string | number)[] =>
  issue.path.map((segment) => (typeof segment === "number" ? segment : String(segment)));

const whereIs = (owner: ContentPath): string => (owner.length === 0 ? "" : ` in ${keyName(owner)}`);
