import { toDecimals } from "../quantity/toDecimals.ts";

/** Decimals of energies in a derivation: more than a result may keep, so that the sums can be followed. */
const ENERGY_DECIMALS = 2;

/** kJ/mol as a TeX unit, with the space before it. */
export const KILOJOULE_PER_MOLE = "\\ \\mathrm{kJ\\,mol^{-1}}";

/** An energy in kJ/mol without its unit: `-7.28`. */
export function texEnergy(energy: number): string {
  return toDecimals(energy, ENERGY_DECIMALS);
}
