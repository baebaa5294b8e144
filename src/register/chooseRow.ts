import { MEDIUM_CLASSES, type MediumClass, type RegisterRow } from "./Register.ts";
import type { RowMatch } from "./RowMatch.ts";

const STANDINGS = ["confirmed", "memory", "estimate"];

/**
 * The row that fits a medium best: one that names the solvent; else one for its class; else one for any medium;
 * else the one whose class is nearest in the order of growing polarity (on a tie the less polar). Rows equal in
 * this are ordered by standing, then by id.
 */
export function chooseRow(
  rows: readonly RegisterRow[],
  solvent: string | null,
  medium: MediumClass,
): RowMatch | undefined {
  const own = MEDIUM_CLASSES.indexOf(medium);
  const scored = rows.map((row) => {
    if (solvent !== null && row.solvents.includes(solvent))
      return { row, score: 0, match: "exact solvent" as const };
    if (row.media.includes(medium)) return { row, score: 1, match: "same medium" as const };
    if (row.media.length === 0) return { row, score: 2, match: "any medium" as const };
    const distances = row.media.map((entry) => {
      const there = MEDIUM_CLASSES.indexOf(entry);
      return Math.abs(there - own) + (there > own ? 0.5 : 0);
    });
    return { row, score: 3 + Math.min(...distances), match: "nearest medium" as const };
  });
  scored.sort(
    (a, b) =>
      a.score - b.score ||
      STANDINGS.indexOf(a.row.standing) - STANDINGS.indexOf(b.row.standing) ||
      (a.row.id < b.row.id ? -1 : a.row.id > b.row.id ? 1 : 0),
  );
  const best = scored[0];
  return best === undefined ? undefined : { row: best.row, match: best.match };
}
