import type { StructureAtom } from "../dossier/Dossier.ts";

/** Letters of an atom as label markup, in three pieces so that hydrogens can stand on either side. */
export interface AtomLetters {
  /** With its mass number: `^13C`, `D`. */
  readonly element: string;
  /** `H`, `H_2`, or empty. */
  readonly hydrogens: string;
  /** `^+`, `^2-`, or empty. */
  readonly charge: string;
}

/** The letters an atom would be set with; a carbon's hydrogens count only where the atom stands alone. */
export function atomLetters(atom: StructureAtom, withHydrogens: boolean): AtomLetters {
  const { element, charge, isotope, hydrogens } = atom;
  const heavyHydrogen = element === "H" ? { 2: "D", 3: "T" }[isotope] : undefined;
  const count = withHydrogens ? hydrogens : 0;
  const size = Math.abs(charge) > 1 ? String(Math.abs(charge)) : "";
  return {
    element: heavyHydrogen ?? (isotope === 0 ? element : `^${isotope}${element}`),
    hydrogens: count === 0 ? "" : count === 1 ? "H" : `H_${count}`,
    charge: charge === 0 ? "" : `^${size}${charge > 0 ? "+" : "-"}`,
  };
}
