import type { Contribution, ContributionKind, Dossier } from "../dossier/Dossier.ts";

/** A row of the energy table: one contribution, in every conformer that has it. */
export interface NumberedContribution {
  /** Counts from 1, the same in table, derivation and figure. */
  readonly number: number;
  /** The contribution as it stands in the first conformer that has it. */
  readonly contribution: Contribution;
  /** Ids of the conformers that have it, in the dossier's order. */
  readonly conformers: readonly string[];
}

/** Kinds in the order in which energies are read: single groups, pairs, then doubts. */
const KINDS: readonly ContributionKind[] = [
  "axial group",
  "anomeric",
  "nitrogen substituent",
  "geminal",
  "vicinal gauche",
  "syn-axial",
  "additivity allowance",
];

/**
 * Numbers the contributions of a dossier: those with the same label and the same value share a number
 * across conformers. Where one conformer has the same contribution twice, each occurrence has its own number,
 * so that every row counts once in every conformer that it names.
 */
export function numberContributions(dossier: Dossier): readonly NumberedContribution[] {
  const rows = new Map<string, { contribution: Contribution; conformers: string[] }>();
  for (const conformer of dossier.conformers) {
    const seen = new Map<string, number>();
    for (const contribution of conformer.contributions) {
      const name = JSON.stringify([contribution.kind, contribution.label, contribution.value_kJ_mol]);
      const occurrence = (seen.get(name) ?? 0) + 1;
      seen.set(name, occurrence);
      const key = `${occurrence} ${name}`;
      const row = rows.get(key);
      if (row === undefined) rows.set(key, { contribution, conformers: [conformer.id] });
      else row.conformers.push(conformer.id);
    }
  }
  const rank = ({ contribution }: { contribution: Contribution }) => KINDS.indexOf(contribution.kind);
  return [...rows.values()]
    .map((row, position) => ({ row, position }))
    .sort((a, b) => rank(a.row) - rank(b.row) || a.position - b.position)
    .map(({ row }, index) => ({ number: index + 1, ...row }));
}
