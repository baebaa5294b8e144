import { distance } from "fastest-levenshtein";

/**
 * The word of `allowed` nearest to `found`, or undefined when none is near enough
 * to be a plausible slip (more than a third of the letters, at least two, differ).
 * Ties go to the earlier word.
 */
export function nearestWord(found: string, allowed: readonly string[]): string | undefined {
  const limit = Math.max(2, Math.floor(found.length / 3));
  let best: string | undefined;
  let bestDistance = limit + 1;
  for (const word of allowed) {
    const exact = distance(found, word);
    const folded = distance(found.toLowerCase(), word.toLowerCase()) + (exact === 0 ? 0 : 0.5);
    const d = Math.min(exact, folded);
    if (d < bestDistance) {
      best = word;
      bestDistance = d;
    }
  }
  return best;
}
