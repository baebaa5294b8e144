import type { EnergyTerm } from "./EnergyTerm.ts";
import type { Parameter } from "./Parameter.ts";

/** A conformer's energy as a sum of independent parameters: factor of each by parameter id. */
export type LinearEnergy = ReadonlyMap<
  string,
  { readonly parameter: Parameter; readonly coefficient: number }
>;

/** Collects the factor of every parameter over all terms of a conformer. */
export function linearEnergy(terms: readonly EnergyTerm[]): LinearEnergy {
  const sum = new Map<string, { parameter: Parameter; coefficient: number }>();
  for (const term of terms) {
    for (const { parameter, coefficient } of term.parts) {
      const before = sum.get(parameter.id)?.coefficient ?? 0;
      sum.set(parameter.id, { parameter, coefficient: before + coefficient });
    }
  }
  return sum;
}

/**
 * Value and standard uncertainty of a weighted sum of energies, kJ/mol. Parameters are independent of each other,
 * and one that stands in several energies moves them together, so factors are added before they are squared.
 *
 * @param energies - each energy with its dimensionless weight.
 * @param temperature - in K.
 */
export function combine(
  energies: readonly { readonly energy: LinearEnergy; readonly weight: number }[],
  temperature: number,
): { readonly value: number; readonly u: number } {
  const factors = new Map<string, { parameter: Parameter; factor: number }>();
  for (const { energy, weight } of energies) {
    for (const [id, { parameter, coefficient }] of energy) {
      factors.set(id, { parameter, factor: (factors.get(id)?.factor ?? 0) + weight * coefficient });
    }
  }
  let value = 0;
  let variance = 0;
  for (const id of [...factors.keys()].sort()) {
    const { parameter, factor } = factors.get(id)!;
    if (factor === 0) continue;
    const at = parameter.at(temperature);
    value += factor * at.value;
    variance += (factor * at.u) ** 2;
  }
  return { value, u: Math.sqrt(variance) };
}
