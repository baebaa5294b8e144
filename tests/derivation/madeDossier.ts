import { readFileSync } from "node:fs";
import type { Conformer, Contribution, Dossier } from "../../src/dossier/Dossier.ts";
import type { EnergyTerm } from "../../src/energetics/EnergyTerm.ts";
import { combine, linearEnergy } from "../../src/energetics/LinearEnergy.ts";
import type { Parameter } from "../../src/energetics/Parameter.ts";
import { populations } from "../../src/energetics/populations.ts";
import { GAS_CONSTANT, kelvin, NORMAL_95 } from "../../src/quantity/units.ts";

/** The hand-made record that development began with; its numbers are not true. */
export function sampleDossier(): Dossier {
  return JSON.parse(readFileSync(new URL("../fixtures/sample.dossier.json", import.meta.url), "utf8"));
}

/** Invented register rows: value and standard uncertainty, kJ/mol. */
export type MadeRows = Readonly<Record<string, readonly [value: number, u: number]>>;

/** An invented contribution: its label, and register rows with their factors. */
export interface MadeContribution {
  readonly label: string;
  readonly kind?: Contribution["kind"];
  readonly rows: Readonly<Record<string, number>>;
}

/** A consistent record with invented rows, calculated by the energy model itself, for tests of what is printed. */
export function madeDossier(
  rows: MadeRows,
  conformers: readonly (readonly MadeContribution[])[],
  changes: Partial<Dossier> = {},
): Dossier {
  const sample = sampleDossier();
  const temperature = kelvin(changes.conditions?.temperature_K ?? sample.conditions.temperature_K);
  const bySymmetry = changes.relation === "identical" || changes.relation === "enantiomeric";
  const parameter = (id: string): Parameter => ({
    id,
    at: () => ({ value: rows[id]![0], u: rows[id]![1] }),
    basis: "published",
    standing: "confirmed",
    sources: [],
    medium: "any",
    temperature_K: null,
    note: null,
  });
  const energies = conformers.map((contributions) =>
    linearEnergy(
      contributions.map(
        (entry): EnergyTerm => ({
          kind: entry.kind ?? "axial group",
          label: entry.label,
          atoms: [],
          parts: Object.entries(entry.rows).map(([id, coefficient]) => ({
            parameter: parameter(id),
            coefficient,
          })),
        }),
      ),
    ),
  );
  const shares = populations(energies, temperature);
  const difference = (index: number) =>
    combine(
      [
        { energy: energies[index]!, weight: 1 },
        { energy: energies[0]!, weight: -1 },
      ],
      temperature,
    );
  const RT = GAS_CONSTANT * temperature;
  const made = conformers.map((contributions, index): Conformer => {
    const alone = combine([{ energy: energies[index]!, weight: 1 }], temperature);
    return {
      ...sample.conformers[0]!,
      id: String.fromCharCode(65 + index),
      label: `state ${index + 1}`,
      deltaG_kJ_mol: difference(index).value,
      u_kJ_mol: difference(index).u,
      sum_kJ_mol: alone.value,
      ...shares[index]!,
      ...(bySymmetry ? { population: 0.5, population95: [0.5, 0.5] as const } : {}),
      contributions: contributions.map((entry): Contribution => {
        const parts = Object.entries(entry.rows);
        return {
          kind: entry.kind ?? "axial group",
          label: entry.label,
          atoms: [],
          value_kJ_mol: parts.reduce((sum, [id, factor]) => sum + factor * rows[id]![0], 0),
          u_kJ_mol: Math.hypot(...parts.map(([id, factor]) => factor * rows[id]![1])),
          basis: "published",
          standing: "confirmed",
          source: "invented",
          sourceKeys: [],
          terms: parts.map(([row, coefficient]) => ({
            row,
            coefficient,
            value_kJ_mol: rows[row]![0],
            u_kJ_mol: rows[row]![1],
          })),
          medium: "any",
          temperature_K: null,
          note: null,
        };
      }),
    };
  });
  return {
    ...sample,
    conformers: made,
    relation: made.length === 2 ? "diastereomeric" : null,
    equilibria: made.slice(1).map((conformer, index) => {
      const { value, u } = bySymmetry ? { value: 0, u: 0 } : difference(index + 1);
      const ends = [value - NORMAL_95 * u, value + NORMAL_95 * u] as const;
      const K = (deltaG: number) => Math.exp(-deltaG / RT);
      return {
        from: "A",
        to: conformer.id,
        deltaG_kJ_mol: value,
        u_kJ_mol: u,
        deltaG95_kJ_mol: ends,
        K: K(value),
        K95: [K(ends[1]), K(ends[0])] as const,
        unresolved: !bySymmetry && ends[0] <= 0 && ends[1] >= 0,
        bySymmetry,
      };
    }),
    ...changes,
  };
}
