import { type Atom, bondBetween, type Molecule } from "./Molecule.ts";

/** What is flat in a six-membered ring, by position in its list. */
export interface FlatParts {
  /** Ring bonds k (from atom k to atom k + 1) that are held flat: double, aromatic, or edge of a three-membered ring. */
  readonly bonds: readonly number[];
  /** Trigonal ring atoms that lie on no flat ring bond: C=O, C=C outside the ring, planar nitrogen. */
  readonly corners: readonly number[];
}

/** Finds the flat bonds and the flat corners of a ring. */
export function flatParts(molecule: Molecule, ring: readonly number[]): FlatParts {
  const threes = molecule.rings.filter((other) => other.length === 3);
  const bonds = ring.flatMap((from, k) => {
    const to = ring[(k + 1) % ring.length]!;
    const bond = bondBetween(molecule, from, to)!;
    const small = threes.some((other) => other.includes(from) && other.includes(to));
    return bond.order > 1 || bond.aromatic || small ? [k] : [];
  });
  const onFlat = (position: number) =>
    bonds.includes(position) || bonds.includes((position + ring.length - 1) % ring.length);
  const corners = ring.flatMap((index, position) =>
    !onFlat(position) && isTrigonal(molecule, molecule.atoms[index]!) ? [position] : [],
  );
  return { bonds, corners };
}

/** True for an atom whose neighbours lie in one plane with it. */
export function isTrigonal(molecule: Molecule, atom: Atom): boolean {
  if (atom.aromatic) return true;
  const doubles = atom.neighbours.some((n) => bondBetween(molecule, atom.index, n)!.order > 1);
  if (doubles) return !["S", "P", "Se", "Te", "As"].includes(atom.element);
  return isPlanarNitrogen(molecule, atom);
}

/**
 * True when a nitrogen's lone pair is drawn into a neighbouring acyl, sulfonyl, imine, nitrile or nitroso group:
 * amide, carbamate, urea, sulfonamide, amidine and the like.
 */
export function isPlanarNitrogen(molecule: Molecule, atom: Atom): boolean {
  if (atom.element !== "N" || atom.charge !== 0) return false;
  return atom.neighbours.some((neighbour) => {
    const next = molecule.atoms[neighbour]!;
    if (next.aromatic || !["C", "N", "S", "P"].includes(next.element)) return false;
    return next.neighbours.some((far) => {
      const order = bondBetween(molecule, neighbour, far)!.order;
      const element = molecule.atoms[far]!.element;
      return order > 1 && ["O", "S", "N", "Se"].includes(element);
    });
  });
}
