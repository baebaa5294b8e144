import type { Dossier } from "../../dossier/Dossier.ts";
import { toDecimals } from "../../quantity/toDecimals.ts";
import type { DerivationKey, DerivationStep } from "../DerivationStep.ts";
import { shownEquilibria } from "../shownEquilibria.ts";
import { texAligned } from "../texAligned.ts";
import { KILOJOULE_PER_MOLE, texEnergy } from "../texEnergy.ts";
import { texSum } from "../texSum.ts";
import { varianceTerms } from "../varianceTerms.ts";
import { texDifference } from "./texDifference.ts";

/** A factor times an uncertainty, squared, is wider than a plain number. */
const SQUARES_PER_LINE = 2;

/** Standard uncertainty of each ΔG°, from the register rows that do not cancel. */
export function differenceUncertainty(dossier: Dossier): DerivationStep {
  const indices = new Map<string, number>();
  const still = new Set<string>();
  let hidden = false;
  const lines = shownEquilibria(dossier).flatMap(({ equilibrium, from, to }) => {
    if (equilibrium.bySymmetry) return [];
    const name = texDifference(dossier, to.id);
    const result = `u(${name}) &= ${texEnergy(equilibrium.u_kJ_mol)}${KILOJOULE_PER_MOLE}`;
    const terms = varianceTerms(from, to, equilibrium.u_kJ_mol);
    if (terms === null) {
      hidden = true;
      return [result];
    }
    for (const { row, factor } of terms) if (factor === 0) still.add(row);
    const moving = terms.filter(({ factor }) => factor !== 0);
    if (moving.length === 0) return [result];
    const [first = "", ...more] = texSum(
      moving.map(({ row, factor, u }) => {
        const index = indices.get(row) ?? indices.size + 1;
        indices.set(row, index);
        return { tex: `\\underset{u_{${index}}}{${squared(factor, u)}}`, negative: false };
      }),
      SQUARES_PER_LINE,
    );
    return [`u^2(${name}) &= ${first}`, ...more, result];
  });
  const where: DerivationKey[] = [...indices].map(([row, index]) => ({
    symbol: `u${index}`,
    meaning: row,
    row,
  }));
  const cancelled = [...still].filter((row) => !indices.has(row)).sort();
  const one = cancelled.length === 1;
  return {
    id: "uncertainty",
    title: "Uncertainty of the difference",
    words:
      "A register value that stands in both conformers moves them together, so its factors are subtracted before they are squared: u²(ΔG°) = Σ (Δc)² u², in kJ²/mol²." +
      (cancelled.length > 0
        ? ` With equal factors in both conformers ${cancelled.join(", ")} ${one ? "adds" : "add"} nothing.`
        : "") +
      (hidden ? " The record does not say how single values share in it, so only the result is shown." : ""),
    tex: texAligned(lines),
    where,
  };
}

/** `(0.5 \times 0.25)^2`, without a factor of one. */
function squared(factor: number, u: number): string {
  const size = Math.abs(factor);
  const text = String(Number(toDecimals(size, 3)));
  return size === 1 ? `${texEnergy(u)}^2` : `(${text}\\times ${texEnergy(u)})^2`;
}
