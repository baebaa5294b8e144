import type { Conformer, Dossier } from "../dossier/Dossier.ts";
import { rowUncertainties } from "./rowUncertainties.ts";

/** One register row in the variance of a free-energy difference. */
export interface VarianceTerm {
  readonly row: string;
  /** Factor of the row in G(to) − G(from). */
  readonly factor: number;
  /** Standard uncertainty of the row, kJ/mol. */
  readonly u: number;
}

/** Agreement asked of the terms with the uncertainty that the record states, relative. */
const AGREEMENT = 1e-3;

/**
 * The terms of u²(ΔG°) = Σ (Δc_j)² u_j² for two conformers, largest first; rows whose factors are equal in both
 * have a factor of zero and come last.
 *
 * @param stated - the record's own standard uncertainty of the difference, kJ/mol.
 * @returns null when the terms cannot be recovered from the record or do not explain the stated uncertainty:
 * then only the latter may be shown.
 */
export function varianceTerms(
  dossier: Dossier,
  from: Conformer,
  to: Conformer,
  stated: number,
): readonly VarianceTerm[] | null {
  const known = rowUncertainties(dossier);
  const factors = new Map<string, number>();
  for (const [conformer, sign] of [[from, -1] as const, [to, 1] as const]) {
    for (const { terms } of conformer.contributions) {
      for (const { row, coefficient } of terms)
        factors.set(row, (factors.get(row) ?? 0) + sign * coefficient);
    }
  }
  const terms: VarianceTerm[] = [];
  for (const [row, factor] of factors) {
    const u = known.get(row);
    if (u !== undefined) terms.push({ row, factor, u });
    else if (factor !== 0) return null;
  }
  const sum = Math.sqrt(terms.reduce((total, { factor, u }) => total + (factor * u) ** 2, 0));
  if (Math.abs(sum - stated) > AGREEMENT * Math.max(stated, 1e-6)) return null;
  const share = ({ factor, u }: VarianceTerm) => Math.abs(factor * u);
  return terms.sort((a, b) => share(b) - share(a) || (a.row < b.row ? -1 : a.row > b.row ? 1 : 0));
}
