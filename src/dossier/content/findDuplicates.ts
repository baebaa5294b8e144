import type { Diagnostic, Place } from "../../diagnostics/Diagnostic.ts";
import type { CompoundReading } from "./readCompound.ts";
import { quote } from "./values/quote.ts";
import { slugOf } from "./values/slugOf.ts";

/**
 * Codes given twice, also those that differ only in case or punctuation: their pages would have one
 * address, and file systems without case would hold one file. Reported at the later file, naming the earlier.
 */
export function findDuplicates(readings: readonly Pick<CompoundReading, "code">[]): readonly Diagnostic[] {
  const first = new Map<string, { text: string; place: Place }>();
  return readings.flatMap(({ code }): readonly Diagnostic[] => {
    if (code === null) return [];
    const address = slugOf(code.text);
    const earlier = first.get(address);
    if (earlier === undefined) {
      first.set(address, code);
      return [];
    }
    const where = `${earlier.place.file}:${earlier.place.line}`;
    const here = `${code.place.file}:${code.place.line}`;
    const message =
      earlier.text === code.text
        ? `The code ${quote(code.text)} stands in ${where} and again in ${here}; every compound needs a code of its own.`
        : `The code ${quote(code.text)} in ${here} differs from ${quote(earlier.text)} in ${where} only in case or punctuation, so both would have the same address.`;
    return [{ code: "duplicate-code", severity: "error", place: code.place, message }];
  });
}
