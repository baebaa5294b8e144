import type { Contribution, Dossier } from "../dossier/Dossier.ts";

/** Relative size below which what is left of a variance is rounding, not an uncertainty. */
const ROUNDING = 1e-9;

/**
 * Standard uncertainty of each register row (or stand-in) that the dossier's contributions use, kJ/mol, by row id.
 *
 * A contribution states the uncertainty of its whole value and the factor of each row in it. Where it rests on
 * one row, that row's uncertainty is the quotient; where all rows but one are already known,
 * the last follows from u² = Σ c_j² u_j². Rows that cannot be told apart are left out.
 */
export function rowUncertainties(dossier: Dossier): ReadonlyMap<string, number> {
  const known = new Map<string, number>();
  let waiting = dossier.conformers.flatMap((conformer) => conformer.contributions);
  for (;;) {
    const left = waiting.filter((contribution) => !learn(contribution, known));
    if (left.length === waiting.length) return known;
    waiting = left;
  }
}

/** Adds the only unknown row of a contribution to what is known; false while more than one is unknown. */
function learn(contribution: Contribution, known: Map<string, number>): boolean {
  const factors = factorsOf(contribution);
  const unknown = factors.filter(([row, factor]) => factor !== 0 && !known.has(row));
  const [only] = unknown;
  if (only === undefined) return true;
  if (unknown.length > 1) return false;
  const whole = contribution.u_kJ_mol ** 2;
  const explained = factors.reduce((sum, [row, factor]) => sum + (factor * (known.get(row) ?? 0)) ** 2, 0);
  const rest = whole - explained;
  if (rest < -ROUNDING * whole) return false;
  known.set(only[0], Math.sqrt(Math.max(0, rest)) / Math.abs(only[1]));
  return true;
}

/** Factor of each row, where a row is named more than once in one contribution. */
function factorsOf(contribution: Contribution): readonly (readonly [string, number])[] {
  const factors = new Map<string, number>();
  for (const { row, coefficient } of contribution.terms)
    factors.set(row, (factors.get(row) ?? 0) + coefficient);
  return [...factors];
}
