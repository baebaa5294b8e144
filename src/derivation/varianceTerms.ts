import type { Conformer } from "../dossier/Dossier.ts";

/** One register row or stand-in in the variance of a free-energy difference. */
export interface VarianceTerm {
  readonly row: string;
  /** Factor of the row in G(to) − G(from). */
  readonly factor: number;
  /** Standard uncertainty of the row, kJ/mol. */
  readonly u: number;
}

/** Agreement asked of the terms with the uncertainty that the record states, relative. */
const AGREEMENT = 1e-3;
/** A factor below this is what is left of a difference of equal ones. */
const NO_FACTOR = 1e-9;

/**
 * The terms of u²(ΔG°) = Σ (Δc_j)² u_j² for two conformers, largest first; rows whose factors are equal in both
 * have a factor of zero and come last.
 *
 * @param stated - the record's own standard uncertainty of the difference, kJ/mol.
 * @returns null when the terms do not explain the stated uncertainty: then only the latter may be shown.
 */
export function varianceTerms(
  from: Conformer,
  to: Conformer,
  stated: number,
): readonly VarianceTerm[] | null {
  const rows = new Map<string, { factor: number; u: number }>();
  for (const [conformer, sign] of [[from, -1] as const, [to, 1] as const]) {
    for (const { row, coefficient, u_kJ_mol: u } of conformer.contributions.flatMap(({ terms }) => terms)) {
      rows.set(row, { factor: (rows.get(row)?.factor ?? 0) + sign * coefficient, u });
    }
  }
  const terms = [...rows].map(([row, { factor, u }]) => ({
    row,
    factor: Math.abs(factor) < NO_FACTOR ? 0 : factor,
    u,
  }));
  const sum = Math.hypot(...terms.map(({ factor, u }) => factor * u));
  if (Math.abs(sum - stated) > AGREEMENT * Math.max(stated, NO_FACTOR)) return null;
  const share = ({ factor, u }: VarianceTerm) => Math.abs(factor * u);
  return terms.sort((a, b) => share(b) - share(a) || (a.row < b.row ? -1 : a.row > b.row ? 1 : 0));
}
