import type * as z from "zod";
import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import { describeFound } from "./describeFound.ts";
import type { ContentPath, FrontMatter } from "./parseFrontMatter.ts";
import { quote } from "./quote.ts";
import type { ValueProblem } from "./Reading.ts";
import { suggest } from "./suggest.ts";

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

/** A union fails with the issues of every branch; the branch whose kind of value stands there is meant. */
function chooseBranch(issue: Issue, data: unknown): readonly Issue[] {
  if (issue.code !== "invalid_union") return [issue];
  const found = valueAt(data, pathOf(issue));
  const isMap = typeof found === "object" && found !== null && !Array.isArray(found);
  const branch =
    issue.errors.find((errors) => errors.some((error) => isMap !== isWholeValue(error))) ??
    issue.errors[0] ??
    [];
  return branch.flatMap((inner) =>
    chooseBranch({ ...inner, path: [...issue.path, ...inner.path] } as Issue, data),
  );
}

const isWholeValue = (issue: Issue) => issue.path.length === 0 && issue.code !== "unrecognized_keys";

const pathOf = (issue: Issue): (string | number)[] =>
  issue.path.map((segment) => (typeof segment === "number" ? segment : String(segment)));

function valueAt(data: unknown, path: ContentPath): unknown {
  let here = data;
  for (const segment of path) {
    if (typeof here !== "object" || here === null || !Object.hasOwn(here, segment)) return undefined;
    here = (here as Record<string | number, unknown>)[segment];
  }
  return here;
}

function explainKey(path: ContentPath, key: string, allowed: readonly string[]) {
  const list = allowed.map((word) => `\`${word}\``).join(", ");
  if (path.at(-1) === "groups") {
    return {
      code: "wrong-locant",
      message: `${quote(key)} is not a locant of a six-membered ring; locants are 1 to 6.`,
      candidates: /^\d+$/.test(key) ? [] : allowed,
    };
  }
  if (path.at(-2) === "groups") {
    return {
      code: "wrong-face",
      message: `${quote(key)} is not a face of the ring; a group stands \`up\` or \`down\`.`,
      candidates: allowed,
    };
  }
  const colon = key.includes(":") ? " A colon must be followed by a space." : "";
  return {
    code: "unknown-key",
    message: `The key ${quote(key)} is not known${whereIs(path)}. Allowed: ${list}.${colon}`,
    candidates: allowed,
  };
}

function explainValue(
  issue: Issue,
  path: ContentPath,
  found: unknown,
  keys: readonly string[],
): ValueProblem {
  if (issue.code === "custom") {
    const problem = issue.params?.["problem"] as ValueProblem | undefined;
    if (problem !== undefined) return problem;
  }
  const key = keyName(path);
  if (issue.code === "invalid_value") {
    const words = issue.values.map(String);
    return {
      code: "unknown-word",
      message: `Here stands ${describeFound(found)}; ${key} is one of ${words.join(", ")}.`,
      ...(typeof found === "string" ? suggest(found, words) : {}),
    };
  }
  if (path.at(-2) === "groups" && typeof found !== "object") {
    return {
      code: "wrong-face",
      message: `The group ${quote(String(found))} has no face; write { up: ${String(found).slice(0, 20)} } or { down: ${String(found).slice(0, 20)} }.`,
    };
  }
  const expected =
    issue.code === "invalid_type" ? (EXPECTED[issue.expected] ?? "another kind of value") : null;
  if (expected !== null) {
    const named = keys.length === 0 ? "" : `: ${keys.map((word) => `\`${word}\``).join(", ")}`;
    return {
      code: "wrong-type",
      message: `Here stands ${describeFound(found)}; ${key} takes ${expected}${named}.`,
    };
  }
  if (issue.code === "too_small" || issue.code === "too_big") {
    const limit = issue.code === "too_small" ? issue.minimum : issue.maximum;
    return {
      code: "wrong-type",
      message: `${key} takes ${limit} items; here stand ${(found as unknown[]).length}.`,
    };
  }
  return { code: "wrong-type", message: `Here stands ${describeFound(found)}, which ${key} does not take.` };
}

const EXPECTED: Readonly<Record<string, string>> = {
  object: "a set of keys with values",
  array: "a list",
  tuple: "a list of two",
  string: "a text",
};

const keyName = (path: ContentPath): string => {
  const last = path.at(-1);
  if (last === undefined) return "the front matter";
  return typeof last === "number" ? `item ${last + 1} of \`${path.at(-2)}\`` : `\`${last}\``;
};

const whereIs = (owner: ContentPath): string => (owner.length === 0 ? "" : ` in ${keyName(owner)}`);

/** The description of what stands at a path; of a union its own, not that of a branch. */
function describeAt(schema: z.ZodType, path: ContentPath): string | undefined {
  let here: z.ZodType | undefined = innermost(schemasAt(schema, path.slice(0, -1)), path.at(-1));
  while (here !== undefined && here.description === undefined) here = inside(here);
  return here?.description;
}

function innermost(owners: readonly z.ZodType[], key: string | number | undefined): z.ZodType | undefined {
  return owners
    .map((owner) => (owner as { shape?: Record<string, z.ZodType> }).shape?.[String(key)])
    .find((found) => found !== undefined);
}

const inside = (schema: z.ZodType): z.ZodType | undefined => {
  const { def } = schema as unknown as { def: { innerType?: z.ZodType; in?: z.ZodType } };
  return def.innerType ?? def.in;
};

/** Keys that the map at a path may have. */
function keysAt(schema: z.ZodType, path: ContentPath): readonly string[] {
  return schemasAt(schema, path).flatMap((found) =>
    "shape" in found ? Object.keys(found.shape as object) : [],
  );
}

/** The schemas that may apply at a path, wrappers taken off. */
function schemasAt(schema: z.ZodType, path: ContentPath): readonly z.ZodType[] {
  const here = unwrap(schema);
  const [segment, ...rest] = path;
  if (segment === undefined) return here;
  return here.flatMap((found) => {
    const inner = found as unknown as {
      shape?: Record<string, z.ZodType>;
      element?: z.ZodType;
      def: { items?: readonly z.ZodType[] };
    };
    const next = inner.shape?.[String(segment)] ?? inner.element ?? inner.def.items?.[Number(segment)];
    return next === undefined ? [] : schemasAt(next, rest);
  });
}

function unwrap(schema: z.ZodType): readonly z.ZodType[] {
  const { def } = schema as unknown as {
    def: { innerType?: z.ZodType; options?: readonly z.ZodType[]; in?: z.ZodType };
  };
  if (def.innerType !== undefined) return unwrap(def.innerType);
  if (def.options !== undefined) return def.options.flatMap(unwrap);
  return [schema];
}
