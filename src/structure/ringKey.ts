import { isPlanarNitrogen } from "./flatAtoms.ts";
import type { Atom, Molecule } from "./Molecule.ts";

/**
 * The register's key of a ring: the parent's name, and after a slash the state of its nitrogen or sulfur
 * where the energies depend on it, e.g. `piperidine/NH`, `piperidine/NR2+`, `thiane/SO`.
 * The first heteroatom in locant order that has a variant decides; a carbocycle has none.
 */
export function ringKey(molecule: Molecule, parent: string, numbering: readonly number[]): string {
  for (const index of numbering) {
    const atom = molecule.atoms[index]!;
    const groups = atom.neighbours.filter((neighbour) => !numbering.includes(neighbour));
    const variant =
      atom.element === "N"
        ? nitrogenVariant(molecule, atom, groups)
        : atom.element === "S"
          ? sulfurVariant(molecule, atom, groups)
          : null;
    if (variant !== null) return `${parent}/${variant}`;
  }
  return parent;
}

function nitrogenVariant(molecule: Molecule, atom: Atom, groups: readonly number[]): string {
  if (isPlanarNitrogen(molecule, atom)) return "NAcyl";
  if (atom.charge > 0) return groups.length === 0 ? "NH2+" : groups.length === 1 ? "NHR+" : "NR2+";
  const first = groups[0];
  if (first === undefined) return "NH";
  const group = molecule.atoms[first]!;
  if (group.aromatic) return "NAr";
  return group.element === "C" ? "NR" : `N${group.element}`;
}

function sulfurVariant(molecule: Molecule, atom: Atom, groups: readonly number[]): string | null {
  const oxygens = groups.filter((index) => molecule.atoms[index]!.element === "O").length;
  if (oxygens === 2) return "SO2";
  if (oxygens === 1) return "SO";
  return atom.charge > 0 ? "SR+" : null;
}
