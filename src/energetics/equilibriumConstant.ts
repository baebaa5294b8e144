import { GAS_CONSTANT, type Kelvin, type KilojoulePerMole } from "../quantity/units.ts";

/**
 * Equilibrium constant of A ⇌ B.
 *
 *   K = [B]/[A] = exp(−ΔG°/RT),  with ΔG° = G°(B) − G°(A)
 *
 * @param deltaG - ΔG° in kJ/mol; negative when B is the more stable.
 * @param temperature - absolute temperature in K, above zero.
 * @returns K, dimensionless.
 */
export function equilibriumConstant(deltaG: KilojoulePerMole, temperature: Kelvin): number {
  if (!(temperature > 0)) throw new RangeError(`temperature must be above 0 K, got ${temperature} K`);
  return Math.exp(-deltaG / (GAS_CONSTANT * temperature));
}
