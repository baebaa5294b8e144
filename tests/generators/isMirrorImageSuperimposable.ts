import { bondBetween, type Molecule } from "../../src/structure/Molecule.ts";

/**
 * Whether a molecule is superimposable on its mirror image, by the definition and by nothing else: some permutation of
 * its atoms keeps elements and bonds and reverses the sense of every centre. For small molecules without E/Z bonds;
 * rings count as flat on the average of their inversions. Every atom that may be a centre must have a sense.
 */
export function isMirrorImageSuperimposable(molecule: Molecule): boolean {
  const colours = refine(molecule);
  const order = breadthFirst(molecule);
  const image = new Map<number, number>();
  const used = new Set<number>();

  const fits = (atom: number, target: number): boolean =>
    colours[atom] === colours[target] &&
    molecule.atoms[atom]!.neighbours.every(
      (next) =>
        !image.has(next) ||
        bondColour(molecule, atom, next) === bondColour(molecule, target, image.get(next)!),
    );
  const search = (place: number): boolean => {
    if (place === order.length) return reversesEverySense(molecule, image);
    const atom = order[place]!;
    const parent = molecule.atoms[atom]!.neighbours.find((next) => image.has(next));
    const targets =
      parent === undefined
        ? molecule.atoms.map(({ index }) => index)
        : molecule.atoms[image.get(parent)!]!.neighbours;
    for (const target of targets) {
      if (used.has(target) || !fits(atom, target)) continue;
      image.set(atom, target);
      used.add(target);
      if (search(place + 1)) return true;
      image.delete(atom);
      used.delete(target);
    }
    return false;
  };
  return search(0);
}

function reversesEverySense(molecule: Molecule, image: ReadonlyMap<number, number>): boolean {
  return molecule.atoms.every((atom) => {
    const target = molecule.atoms[image.get(atom.index)!]!;
    if (atom.stereo === null || target.stereo === null) return atom.stereo === target.stereo;
    const moved = atom.neighbours.map((next) => target.neighbours.indexOf(image.get(next)!));
    // An even order of the neighbours keeps what "clockwise" means, an odd one turns it round.
    return isEven(moved) === (atom.stereo !== target.stereo);
  });
}

function isEven(order: readonly number[]): boolean {
  const inversions = order.flatMap((value, place) => order.slice(place + 1).filter((later) => later < value));
  return inversions.length % 2 === 0;
}

/** Colours that equivalent atoms share, by the elements and bonds around them. */
function refine(molecule: Molecule): number[] {
  const number = (keys: readonly string[]) => {
    const distinct = [...new Set(keys)].sort();
    return keys.map((key) => distinct.indexOf(key));
  };
  let colours = number(
    molecule.atoms.map(
      ({ atomicNumber, charge, isotope, hydrogens, radicals, aromatic, neighbours, stereo }) =>
        [
          atomicNumber,
          charge,
          isotope,
          hydrogens,
          radicals,
          aromatic,
          neighbours.length,
          stereo !== null,
        ].join(" "),
    ),
  );
  for (let size = 0; size !== new Set(colours).size; ) {
    size = new Set(colours).size;
    colours = number(
      molecule.atoms.map(({ index, neighbours }) => {
        const around = neighbours.map((next) => `${bondColour(molecule, index, next)}:${colours[next]}`);
        return `${colours[index]} ${around.sort().join()}`;
      }),
    );
  }
  return colours;
}

function bondColour(molecule: Molecule, a: number, b: number): string {
  const bond = bondBetween(molecule, a, b);
  if (bond === undefined) return "none";
  return bond.aromatic ? "aromatic" : String(bond.order);
}

function breadthFirst(molecule: Molecule): number[] {
  const order: number[] = [];
  const seen = new Set<number>();
  for (const { index } of molecule.atoms) {
    if (seen.has(index)) continue;
    seen.add(index);
    order.push(index);
    for (let at = order.length - 1; at < order.length; at++) {
      for (const next of molecule.atoms[order[at]!]!.neighbours) {
        if (seen.has(next)) continue;
        seen.add(next);
        order.push(next);
      }
    }
  }
  return order;
}
