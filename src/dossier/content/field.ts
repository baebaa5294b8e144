import * as z from "zod";
import type { Reading } from "./values/Reading.ts";

/** What an editor is told about a value. */
export interface FieldDescription {
  readonly description: string;
  readonly type?: "string";
  readonly pattern?: string;
  readonly enum?: readonly string[];
  readonly examples?: readonly string[];
}

/**
 * A schema for one value that has its own reader. The editor's schema takes `about`; the reader decides,
 * and its problem travels in the issue's `params`.
 */
export function field<T>(read: (found: unknown) => Reading<T>, about: FieldDescription) {
  return z
    .unknown()
    .meta({ type: "string", ...about })
    .transform((found, context): T => {
      const reading = read(found);
      if ("value" in reading) return reading.value;
      context.addIssue({ code: "custom", input: found, params: { problem: reading.problem } });
      return z.NEVER;
    });
}
