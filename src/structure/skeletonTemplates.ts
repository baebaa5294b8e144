/** A ring skeleton with its locants: index of each place in reading order, bonds between places. */
export interface Skeleton {
  readonly bonds: readonly (readonly [number, number])[];
  /** Fixed locants, or null where they follow from the walk and the fusion atoms (`fusion`). */
  readonly locants: readonly string[] | null;
  /** Places shared by two fused rings, which as carbons take the locant before them with a letter. */
  readonly fusion: readonly number[];
  /** Whether heteroatoms may stand in it without changing the numbering. */
  readonly heteroatoms: boolean;
}

const walk = (size: number): [number, number][] =>
  Array.from({ length: size }, (_, i) => [i, (i + 1) % size] as [number, number]);

/** Skeletons whose numbering is fixed by name, as words of locants in the order of the periphery, then cross bonds. */
function named(
  periphery: string,
  cross: readonly (readonly [string, string])[],
  heteroatoms: boolean,
): Skeleton {
  const locants = periphery.split(" ");
  const at = (locant: string) => locants.indexOf(locant);
  return {
    bonds: [...walk(locants.length), ...cross.map(([a, b]): [number, number] => [at(a), at(b)])],
    locants,
    fusion: [],
    heteroatoms,
  };
}

/** Anthracene and phenanthrene keep their own numbering (IUPAC P-25.3.1.3, exceptions); so do steroids (P-101.3). */
const NAMED: readonly Skeleton[] = [
  named(
    "1 2 3 4 4a 10 10a 5 6 7 8 8a 9 9a",
    [
      ["4a", "9a"],
      ["10a", "8a"],
    ],
    false,
  ),
  named(
    "1 2 3 4 4a 4b 5 6 7 8 8a 9 10 10a",
    [
      ["4a", "10a"],
      ["4b", "8a"],
    ],
    false,
  ),
  named(
    "1 2 3 4 5 6 7 8 14 15 16 17 13 12 11 9 10",
    [
      ["5", "10"],
      ["8", "9"],
      ["14", "13"],
    ],
    true,
  ),
  // Tricyclo[3.3.1.1^3,7]decane, retained name adamantane (P-23.7).
  named("1 2 3 4 5 6 7 8", [], true),
];

function adamantane(): Skeleton {
  const ring = NAMED[3]!;
  return {
    ...ring,
    locants: [...ring.locants!, "9", "10"],
    bonds: [...ring.bonds, [0, 8], [8, 4], [2, 9], [9, 6]],
  };
}

/** Two rings that share a bond: around the periphery, the first ring before the second. */
function fused(first: number, second: number): Skeleton {
  const size = first + second - 2;
  const inner = first - 2;
  return {
    bonds: [...walk(size), [inner, size - 1]],
    locants: null,
    fusion: [inner, size - 1],
    heteroatoms: true,
  };
}

/** Spiro[a.b]: from beside the spiro atom through the smaller ring, the spiro atom, then the larger (P-24.2.1). */
function spiro(smaller: number, larger: number): Skeleton {
  const centre = smaller - 1;
  const bonds: [number, number][] = [];
  for (let i = 0; i < smaller + larger - 2; i++) bonds.push([i, i + 1]);
  bonds.push([centre, 0], [centre, smaller + larger - 2]);
  return numbered(bonds, smaller + larger - 1);
}

/** Bicyclo[x.y.z]: bridgehead 1, the longest branch, the other bridgehead, the next, then the shortest (P-23.2). */
function bicyclo(x: number, y: number, z: number): Skeleton {
  const size = x + y + 2;
  const bonds = walk(size);
  const other = x + 1;
  for (let i = 0; i < z; i++) bonds.push([i === 0 ? 0 : size + i - 1, size + i]);
  bonds.push([z === 0 ? 0 : size + z - 1, other]);
  return numbered(bonds, size + z);
}

function numbered(bonds: readonly (readonly [number, number])[], size: number): Skeleton {
  return {
    bonds,
    locants: Array.from({ length: size }, (_, i) => `${i + 1}`),
    fusion: [],
    heteroatoms: true,
  };
}

/**
 * Skeletons that a ring system may have by its rings: number of atoms in each, and atoms shared between two.
 * @param sizes - ring sizes in atoms.
 * @param shared - atoms common to the two rings of a bicyclic system; 0 for systems of more rings.
 */
export function skeletonTemplates(sizes: readonly number[], shared: number): readonly Skeleton[] {
  const [a, b] = [...sizes].sort((m, n) => m - n);
  if (sizes.length === 2 && a !== undefined && b !== undefined) {
    if (shared === 1) return [spiro(a, b)];
    if (shared === 2) return a === b ? [fused(a, b)] : [fused(a, b), fused(b, a)];
    const branches = [shared - 2, a - shared, b - shared].sort((m, n) => n - m);
    return [bicyclo(branches[0]!, branches[1]!, branches[2]!)];
  }
  return [...NAMED.slice(0, 3), adamantane()];
}
