import { quote } from "./quote.ts";

/** What an author wrote, in words for a message: `the number 7`, `a list`, `nothing`. */
export function describeFound(found: unknown): string {
  if (found === null || found === undefined) return "nothing";
  if (Array.isArray(found)) return "a list";
  switch (typeof found) {
    case "string":
      return `the text ${quote(found)}`;
    case "number":
    case "bigint":
      return `the number ${found}`;
    case "boolean":
      return `the word ${found}, which YAML reads as a truth value`;
    default:
      return "a set of keys";
  }
}
