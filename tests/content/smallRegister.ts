import type { Group, Register, RingParent, Solvent } from "../../src/register/Register.ts";

const group = (key: string, prefix: string, smiles: string, ...aliases: string[]): Group => ({
  key,
  aliases,
  prefix,
  smiles,
  label: key,
  labelReversed: key,
  groupClass: "any",
});
const ring = (name: string, elements: string, ...aliases: string[]): RingParent => ({
  name,
  aliases,
  elements: elements.split(" "),
});
const solvent = (key: string, ...aliases: string[]): Solvent => ({
  key,
  aliases,
  label: key,
  medium: "nonpolar",
});

/** A register with words enough to read content by; it holds no energies. */
export const SMALL_REGISTER: Register = {
  version: "test",
  sha256: "",
  groups: [
    group("Me", "methyl", "[*]C", "CH3"),
    group("Et", "ethyl", "[*]CC"),
    group("t-Bu", "tert-butyl", "[*]C(C)(C)C", "tBu"),
    group("OH", "hydroxy", "[*]O"),
    group("OMe", "methoxy", "[*]OC", "OCH3"),
    group("Cl", "chloro", "[*]Cl"),
    group("CO2Me", "methoxycarbonyl", "[*]C(=O)OC"),
    group("Ph", "phenyl", "[*]c1ccccc1"),
  ],
  groupClasses: [],
  rows: [],
  barriers: [],
  nonChair: [],
  parents: [
    ring("cyclohexane", "C C C C C C"),
    ring("oxane", "O C C C C C", "tetrahydropyran"),
    ring("piperidine", "N C C C C C"),
    ring("1,3-dioxane", "O C O C C C"),
    ring("thiane", "S C C C C C"),
  ],
  solvents: [solvent("CDCl3", "chloroform-d"), solvent("D2O"), solvent("DMSO-d6"), solvent("CD2Cl2")],
  citations: [],
};
