declare const unit: unique symbol;
type Quantity<U extends string> = number & { readonly [unit]: U };

/** Molar energy in kJ/mol. */
export type KilojoulePerMole = Quantity<"kJ/mol">;
/** Absolute temperature in K. */
export type Kelvin = Quantity<"K">;

/** Marks a plain number as a molar energy in kJ/mol. */
export const kilojoulePerMole = (value: number): KilojoulePerMole => value as KilojoulePerMole;
/** Marks a plain number as an absolute temperature in K. */
export const kelvin = (value: number): Kelvin => value as Kelvin;

/** kJ per kcal, thermochemical calorie, exact by definition (1 cal = 4.184 J). */
export const KILOJOULE_PER_KILOCALORIE = 4.184;

/**
 * Molar gas constant in kJ/(mol K): exact since the 2019 SI revision
 * (8.314 462 618 153 24 J/(mol K), product of the Avogadro and Boltzmann constants).
 */
export const GAS_CONSTANT = 8.314_462_618_153_24e-3;

/** 0 °C in K, exact. */
export const ZERO_CELSIUS = 273.15;

/** Half-width of a two-sided 95 % interval in standard deviations of a normal distribution. */
export const NORMAL_95 = 1.959_963_984_540_054;

/** Converts an energy printed in kcal/mol to kJ/mol. */
export function fromKilocalorie(value: number): KilojoulePerMole {
  return (value * KILOJOULE_PER_KILOCALORIE) as KilojoulePerMole;
}

/** Converts kJ/mol to kcal/mol. */
export function toKilocalorie(value: number): number {
  return value / KILOJOULE_PER_KILOCALORIE;
}
