import { GAS_CONSTANT, type Kelvin, NORMAL_95 } from "../quantity/units.ts";
import { combine, type LinearEnergy } from "./LinearEnergy.ts";

export interface Population {
  readonly population: number;
  /** 95 % interval, never symmetric about the value. */
  readonly population95: readonly [number, number];
}

/**
 * Boltzmann populations of conformers with 95 % intervals.
 *
 *   p_i = exp(−G_i/RT) / Σ exp(−G_k/RT)
 *
 * The interval is that of logit p_i = −G_i/RT − ln Σ_{k≠i} exp(−G_k/RT), whose uncertainty is propagated to first
 * order and whose ends are transformed back. For two conformers that is exactly the transformation of the ends of
 * ΔG; for more it is an approximation that keeps every population between 0 and 1.
 *
 * @param energies - one per conformer, kJ/mol, at least one.
 * @param temperature - in K, above zero.
 * @returns dimensionless populations that sum to 1, in the same order.
 */
export function populations(energies: readonly LinearEnergy[], temperature: Kelvin): readonly Population[] {
  if (!(temperature > 0)) throw new RangeError(`temperature must be above 0 K, got ${temperature} K`);
  if (energies.length === 1) return [{ population: 1, population95: [1, 1] }];
  const RT = GAS_CONSTANT * temperature;
  // Energies relative to the first keep parameters common to all from spoiling the last digits.
  const relative = energies.map(
    (energy) =>
      combine(
        [
          { energy, weight: 1 },
          { energy: energies[0]!, weight: -1 },
        ],
        temperature,
      ).value,
  );
  return energies.map((energy, i) => {
    const others = relative.flatMap((g, k) => (k === i ? [] : [{ k, x: -g / RT }]));
    const highest = Math.max(...others.map(({ x }) => x));
    const weights = others.map(({ x }) => Math.exp(x - highest));
    const total = weights.reduce((sum, weight) => sum + weight, 0);
    const logit = -relative[i]! / RT - (highest + Math.log(total));
    const { u } = combine(
      [
        { energy, weight: 1 },
        ...others.map(({ k }, n) => ({ energy: energies[k]!, weight: -weights[n]! / total })),
      ],
      temperature,
    );
    const half = (NORMAL_95 * u) / RT;
    return {
      population: logistic(logit),
      population95: [logistic(logit - half), logistic(logit + half)] as const,
    };
  });
}

function logistic(x: number): number {
  return 1 / (1 + Math.exp(-x));
}
