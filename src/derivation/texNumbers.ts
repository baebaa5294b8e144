import { roundSignificant } from "../quantity/roundSignificant.ts";
import { toDecimals } from "../quantity/toDecimals.ts";

/** Decimals of energies in a derivation: more than a result may keep, so that the sums can be followed. */
const ENERGY_DECIMALS = 2;

/** kJ/mol as a TeX unit, with the space before it. */
export const KILOJOULE_PER_MOLE = "\\ \\mathrm{kJ\\,mol^{-1}}";

/** An energy in kJ/mol without its unit: `-7.28`. */
export function texEnergy(energy: number): string {
  return toDecimals(energy, ENERGY_DECIMALS);
}

/** A positive number with three significant digits: `0.0529`, `2.45\times10^{-3}`. */
export function texSignificant(value: number): string {
  const { mantissa, exponent } = roundSignificant(value, 3);
  return exponent === 0 ? mantissa : `${mantissa}\\times10^{${exponent}}`;
}

/** A fraction between 0 and 1 with enough digits that it never reads as 0 or 1 unless it is. */
export function texFraction(fraction: number): string {
  if (fraction === 0 || fraction === 1 || fraction === 0.5) return String(fraction);
  if (fraction < 0.01) return texSignificant(fraction);
  const fromOne = -Math.floor(Math.log10(Math.max(1 - fraction, 1e-12)));
  return toDecimals(fraction, Math.max(4, fromOne + 1));
}

/** A conformer's id, upright. */
export function texConformer(id: string): string {
  return `\\mathrm{${id.replace(/[^A-Za-z0-9]/g, "")}}`;
}
