import type { ContentPath } from "../parseFrontMatter.ts";

/** What stands at a path of plain data, or undefined. */
export function valueAt(data: unknown, path: ContentPath): unknown {
  let here = data;
  for (const segment of path) {
    if (typeof here !== "object" || here === null || !Object.hasOwn(here, segment)) return undefined;
    here = (here as Record<string | number, unknown>)[segment];
  }
  return here;
}
