import type * as z from "zod";
import type { ContentPath } from "../parseFrontMatter.ts";
import { schemasAt } from "./schemasAt.ts";

/** Keys that the map at a path may have. */
export function keysAt(schema: z.ZodType, path: ContentPath): readonly string[] {
  return schemasAt(schema, path).flatMap((found) =>
    "shape" in found ? Object.keys(found.shape as object) : [],
  );
}
