import type { Molecule } from "./Molecule.ts";

/** A group cut from its ring: the ring atom has become the attachment point `*`. */
export interface Fragment {
  /** The group with its attachment point; the point's former ring atom comes as `*`. */
  readonly molecule: Molecule;
  /** Input atom of each fragment atom; the attachment point maps to the ring atom. */
  readonly atoms: readonly number[];
  /** Index of the attachment point in `molecule`. */
  readonly attachment: number;
}

/**
 * Cuts the group that begins at `first` from `ringAtom`. Neighbour order is kept, so senses stay true.
 * @throws RangeError when the group leads back to the ring atom by another way (the ring does not stand alone).
 */
export function extractFragment(molecule: Molecule, ringAtom: number, first: number): Fragment {
  const inside = new Set([ringAtom, first]);
  const queue = [first];
  while (queue.length > 0) {
    const index = queue.pop()!;
    for (const neighbour of molecule.atoms[index]!.neighbours) {
      if (neighbour === ringAtom && index !== first) throw new RangeError("the group closes a ring");
      if (inside.has(neighbour)) continue;
      inside.add(neighbour);
      queue.push(neighbour);
    }
  }
  const atoms = [...inside].sort((a, b) => a - b);
  const place = new Map(atoms.map((atom, index) => [atom, index]));
  const keep = (a: number, b: number) =>
    inside.has(a) && inside.has(b) && (a !== ringAtom || b === first) && (b !== ringAtom || a === first);
  const bonds = molecule.bonds
    .filter((bond) => keep(bond.from, bond.to))
    .map((bond, index) => ({
      ...bond,
      index,
      from: place.get(bond.from)!,
      to: place.get(bond.to)!,
      stereo:
        bond.stereo === null || !bond.stereo.references.every((atom) => inside.has(atom))
          ? null
          : {
              ...bond.stereo,
              references: [
                place.get(bond.stereo.references[0])!,
                place.get(bond.stereo.references[1])!,
              ] as const,
            },
    }));
  return {
    atoms,
    attachment: place.get(ringAtom)!,
    molecule: {
      bonds,
      rings: [],
      atoms: atoms.map((index, position) => {
        const atom = molecule.atoms[index]!;
        if (index === ringAtom) {
          const bare = { element: "*", atomicNumber: 0, charge: 0, isotope: 0, hydrogens: 0, radicals: 0 };
          return {
            ...atom,
            ...bare,
            index: position,
            aromatic: false,
            stereo: null,
            neighbours: [place.get(first)!],
          };
        }
        return {
          ...atom,
          index: position,
          neighbours: atom.neighbours.map((neighbour) => place.get(neighbour)!),
        };
      }),
    },
  };
}
