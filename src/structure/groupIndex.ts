import type { Group, Register } from "../register/Register.ts";
import type { Fragment } from "./extractFragment.ts";
import type { Molecule } from "./Molecule.ts";
import type { Toolkit } from "./Toolkit.ts";

/** Finds the register's group for a fragment by its canonical form, senses left out. */
export interface GroupIndex {
  find(fragment: Fragment): Group | undefined;
}

/**
 * Builds the index once per register. Groups are matched as structures from the attachment point, never by name.
 * @throws Error when two groups of the register have the same structure or one cannot be read.
 */
export function groupIndex(register: Register, toolkit: Toolkit): GroupIndex {
  const byForm = new Map<string, Group>();
  for (const group of register.groups) {
    const form = flatForm(group.smiles, toolkit);
    const other = byForm.get(form);
    if (other !== undefined) throw new Error(`groups ${other.key} and ${group.key} have the same structure`);
    byForm.set(form, group);
  }
  return { find: (fragment) => byForm.get(toolkit.canonicalSmiles(withoutSenses(fragment.molecule))) };
}

/** The graph without any stereochemistry. */
export function withoutSenses(molecule: Molecule): Molecule {
  return {
    ...molecule,
    atoms: molecule.atoms.map((atom) => ({ ...atom, stereo: null })),
    bonds: molecule.bonds.map((bond) => ({ ...bond, stereo: null })),
  };
}

function flatForm(smiles: string, toolkit: Toolkit): string {
  const read = toolkit.readFragment(smiles);
  if (read === null) throw new Error(`the register's group SMILES ${smiles} cannot be read`);
  return toolkit.canonicalSmiles(withoutSenses(read));
}
