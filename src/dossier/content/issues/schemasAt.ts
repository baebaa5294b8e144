import type * as z from "zod";
import type { ContentPath } from "../parseFrontMatter.ts";

/** The schemas that may apply at a path, wrappers taken off. */
export function schemasAt(schema: z.ZodType, path: ContentPath): readonly z.ZodType[] {
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
