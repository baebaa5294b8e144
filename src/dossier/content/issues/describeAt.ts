import type * as z from "zod";
import type { ContentPath } from "../parseFrontMatter.ts";
import { schemasAt } from "./schemasAt.ts";

/** The description of what stands at a path; of a union its own, not that of a branch. */
export function describeAt(schema: z.ZodType, path: ContentPath): string | undefined {
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
