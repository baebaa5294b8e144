import type * as z from "zod";
import type { ContentPath } from "../parseFrontMatter.ts";
import { describeFound } from "../values/describeFound.ts";
import { quote } from "../values/quote.ts";
import type { ValueProblem } from "../values/Reading.ts";
import { suggest } from "../values/suggest.ts";
import { keyName } from "./keyName.ts";

/** Why the value at a path is wrong; `keys` are those a set of keys would have there. */
export function explainValue(
  issue: z.core.$ZodIssue,
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
