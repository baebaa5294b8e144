import type { ContentPath } from "../parseFrontMatter.ts";

/** A value by its key, for a message: `observed`, or `item 2 of evidence`. */
export function keyName(path: ContentPath): string {
  const last = path.at(-1);
  if (last === undefined) return "the front matter";
  return typeof last === "number" ? `item ${last + 1} of \`${path.at(-2)}\`` : `\`${last}\``;
}
