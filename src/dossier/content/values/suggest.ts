import { nearestWord } from "../../../diagnostics/nearestWord.ts";

/** Beyond this a word is not a slip of another one, and comparing it would only cost time. */
const LONGEST_WORD = 60;
/** A shared beginning of this many letters makes one word stand for another: `temp`, `energy`. */
const SHARED_BEGINNING = 4;

/** The `suggestion` of a diagnostic: the nearest allowed word, else the only one that begins alike, or nothing. */
export function suggest(found: string, allowed: readonly string[]): { readonly suggestion?: string } {
  if (found.length > LONGEST_WORD) return {};
  const beginning = found.slice(0, SHARED_BEGINNING).toLowerCase();
  const alike = allowed.filter(
    (word) => beginning.length === SHARED_BEGINNING && word.toLowerCase().startsWith(beginning),
  );
  const nearest = nearestWord(found, allowed) ?? (alike.length === 1 ? alike[0] : undefined);
  return nearest === undefined ? {} : { suggestion: nearest };
}
