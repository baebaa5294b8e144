import * as z from "zod";
import type { Register } from "../../register/Register.ts";
import { contentSchema } from "./contentSchema.ts";

/** The front matter's JSON Schema (2020-12) for editors: a file is a compound, a series or the site's index. */
export function contentJsonSchema(register: Register): Record<string, unknown> {
  const { compound, series, site } = contentSchema(register);
  const definition = (schema: z.ZodType) => {
    const { $schema: _, ...rest } = z.toJSONSchema(schema, { target: "draft-2020-12", io: "input" });
    return rest;
  };
  return {
    $schema: "https://json-schema.org/draft/2020-12/schema",
    title: "Ringfolio front matter",
    anyOf: ["compound", "series", "site"].map((name) => ({ $ref: `#/$defs/${name}` })),
    $defs: { compound: definition(compound), series: definition(series), site: definition(site) },
  };
}
