import type { Molecule } from "./Molecule.ts";

/** Steps after which the search for one symmetry is given up; real molecules need a few per atom. */
const MAXIMUM_STEPS = 100_000;

/**
 * The symmetries of a constitution, stereochemistry ignored: permutations of the atoms that keep elements, charges,
 * isotopes, hydrogens and bonds. A set that generates all of them is returned, each as the image of every atom; it is
 * empty when only the identity is one.
 * @returns null in the case, not met in practice, that the search grows too long.
 */
export function constitutionalSymmetry(molecule: Molecule): readonly (readonly number[])[] | null {
  const links = linksOf(molecule);
  const colours = coloursOf(molecule, links);
  const generators: (readonly number[])[] = [];
  // Every symmetry found so far keeps the atoms before `first`, so what they join to it needs no further search.
  for (let first = molecule.atoms.length - 1; first >= 0; first--) {
    const reached = reach(first, generators);
    for (let image = first + 1; image < molecule.atoms.length; image++) {
      if (colours[image] !== colours[first] || reached.has(image)) continue;
      const found = extend(first, image, links, colours);
      if (found === "given up") return null;
      if (found === null) continue;
      generators.push(found);
      for (const atom of reach(first, generators)) reached.add(atom);
    }
  }
  return generators;
}

/** Neighbours of each atom with the kind of bond to them. */
function linksOf(molecule: Molecule): readonly ReadonlyMap<number, string>[] {
  const links = molecule.atoms.map(() => new Map<number, string>());
  for (const bond of molecule.bonds) {
    const kind = bond.aromatic ? "aromatic" : `${bond.order}`;
    links[bond.from]!.set(bond.to, kind);
    links[bond.to]!.set(bond.from, kind);
  }
  return links;
}

/** Classes of atoms that look alike out to any distance; symmetries stay within them. */
function coloursOf(molecule: Molecule, links: readonly ReadonlyMap<number, string>[]): readonly number[] {
  const number = (keys: readonly string[]) => {
    const order = [...new Set(keys)].sort();
    return { colours: keys.map((key) => order.indexOf(key)), count: order.length };
  };
  let { colours, count } = number(
    molecule.atoms.map(({ element, charge, isotope, hydrogens, radicals, aromatic }) =>
      [element, charge, isotope, hydrogens, radicals, aromatic].join(),
    ),
  );
  for (;;) {
    const next = number(
      colours.map((colour, atom) =>
        [colour, ...[...links[atom]!].map(([other, kind]) => `${kind}:${colours[other]}`).sort()].join(),
      ),
    );
    if (next.count === count) return colours;
    ({ colours, count } = next);
  }
}

/** The atoms that the generators can bring one atom to. */
function reach(start: number, generators: readonly (readonly number[])[]): Set<number> {
  const reached = new Set([start]);
  for (const atom of reached) for (const generator of generators) reached.add(generator[atom]!);
  return reached;
}

/** A symmetry that keeps every atom before `first` and brings `first` to `image`, moving as little else as possible. */
function extend(
  first: number,
  image: number,
  links: readonly ReadonlyMap<number, string>[],
  colours: readonly number[],
): readonly number[] | null | "given up" {
  const map = links.map((_, atom) => (atom < first ? atom : -1));
  const used = links.map((_, atom) => atom < first);
  const order = new Set([first]);
  for (const atom of order) for (const next of links[atom]!.keys()) if (next > first) order.add(next);
  for (let atom = first + 1; atom < links.length; atom++) order.add(atom);
  const queue = [...order];
  let steps = 0;

  const fits = (atom: number, target: number) =>
    !used[target] &&
    colours[atom] === colours[target] &&
    [...links[atom]!].every(([other, kind]) => map[other] === -1 || links[target]!.get(map[other]!) === kind);
  const place = (at: number): boolean => {
    if (at === queue.length) return true;
    const atom = queue[at]!;
    const anchor = [...links[atom]!.keys()].find((other) => map[other] !== -1);
    const near = anchor === undefined ? links.map((_, other) => other) : [...links[map[anchor]!]!.keys()];
    const targets =
      at === 0 ? [image] : near.includes(atom) ? [atom, ...near.filter((n) => n !== atom)] : near;
    for (const target of targets) {
      steps += 1;
      if (steps > MAXIMUM_STEPS) return false;
      if (!fits(atom, target)) continue;
      map[atom] = target;
      used[target] = true;
      if (place(at + 1)) return true;
      map[atom] = -1;
      used[target] = false;
    }
    return false;
  };
  if (place(0)) return map;
  return steps > MAXIMUM_STEPS ? "given up" : null;
}
