import { isTrigonal } from "../../structure/flatAtoms.ts";
import { type Bond, bondBetween, type Molecule } from "../../structure/Molecule.ts";
import { bondLength } from "./covalentRadii.ts";
import type { DistanceRestraint, Restraints, Separation, VolumeRestraint } from "./Restraints.ts";

/** An endocyclic torsion that must hold: four atoms in a row, degrees. */
export interface TorsionTarget {
  readonly atoms: readonly [number, number, number, number];
  readonly degrees: number;
}

/** The points behind restraints: atoms first, then the hydrogens that the graph only counts. */
export interface RestrainedPoint {
  readonly element: string;
  /** Input atom, or null for a hydrogen. */
  readonly atom: number | null;
  /** Input atom it hangs on, for hydrogens and, in a cut-out, for the first atoms of groups; null otherwise. */
  readonly parent: number | null;
}

export interface RestraintOptions {
  /**
   * A cut-out to be drawn: these ring atoms, with the first atoms of their groups and their hydrogens, at tetrahedral
   * angles and one bond length for all ring bonds, so that chairs lie on the diamond lattice. Null for the
   * whole molecule at expected lengths and angles.
   */
  readonly cutOut: ReadonlySet<number> | null;
}

const TETRAHEDRAL = (Math.acos(-1 / 3) * 180) / Math.PI;
/** Length of every ring bond of a drawing, and of a flat one, Å. */
const DRAWN = { bond: 1.53, flat: 1.42 };
const WEIGHT = { bond: 10, angle: 4, looseAngle: 0.7, torsion: 2, sense: 0.35, sign: 0.35, flat: 0.6 };
/** Volume of three unit vectors at tetrahedral angles to each other: 4/(3√3). */
const TETRAHEDRAL_VOLUME = 0.7698;
/** Least distances in Å between points four or more bonds apart: heavy atoms, one hydrogen, two. */
const APART = [3.0, 2.5, 2.05];
const APART_ONE_FOUR = [2.6, 2.3, 2.15];
/** The same in a drawing: less than any distance on the lattice, so that only what would coincide there is pushed apart. */
const APART_DRAWN = [2.45, 2.0, 1.5];

/**
 * What the coordinates of a molecule must fulfil: bond lengths, angles, the given torsions with their signs, the senses
 * of its tetrahedral atoms, flatness of trigonal ones, and room for what is not bonded.
 */
export function moleculeRestraints(
  molecule: Molecule,
  torsions: readonly TorsionTarget[],
  options: RestraintOptions,
): { readonly points: readonly RestrainedPoint[]; readonly restraints: Restraints } {
  const { cutOut } = options;
  const inside = (atom: number) => cutOut === null || cutOut.has(atom);
  const kept = molecule.atoms
    .map((atom) => atom.index)
    .filter((atom) => inside(atom) || molecule.atoms[atom]!.neighbours.some(inside));
  const points: RestrainedPoint[] = kept.map((atom) => ({
    element: molecule.atoms[atom]!.element,
    atom,
    parent: inside(atom) ? null : molecule.atoms[atom]!.neighbours.find(inside)!,
  }));
  const place = new Map(kept.map((atom, index) => [atom, index]));
  const linked: number[][] = kept.map((atom) =>
    inside(atom)
      ? molecule.atoms[atom]!.neighbours.map((neighbour) => place.get(neighbour)!)
      : molecule.atoms[atom]!.neighbours.filter(inside).map((neighbour) => place.get(neighbour)!),
  );
  for (const atom of kept.filter(inside)) {
    for (let n = 0; n < molecule.atoms[atom]!.hydrogens; n++) {
      const index = points.push({ element: "H", atom: null, parent: atom }) - 1;
      linked.push([place.get(atom)!]);
      linked[place.get(atom)!]!.push(index);
    }
  }
  const bondOf = (i: number, j: number): Bond | undefined =>
    points[i]!.atom === null || points[j]!.atom === null
      ? undefined
      : bondBetween(molecule, points[i]!.atom!, points[j]!.atom!);
  const ringsWith = (...indices: number[]) =>
    molecule.rings.filter((ring) =>
      indices.every((index) => points[index]!.atom !== null && ring.includes(points[index]!.atom!)),
    );
  const smallest = (...indices: number[]) =>
    Math.min(99, ...ringsWith(...indices).map((ring) => ring.length));
  const trigonal = (i: number) =>
    points[i]!.atom !== null && isTrigonal(molecule, molecule.atoms[points[i]!.atom!]!);
  const linear = (i: number) => {
    const orders = linked[i]!.map((j) => bondOf(i, j)?.order ?? 1);
    return orders.includes(3) || orders.filter((order) => order === 2).length > 1;
  };
  const lengthOf = (i: number, j: number) => {
    const bond = bondOf(i, j);
    if (
      cutOut !== null &&
      ringsWith(i, j).length > 0 &&
      points[i]!.parent === null &&
      points[j]!.parent === null
    )
      return bond !== undefined && (bond.aromatic || bond.order > 1) ? DRAWN.flat : DRAWN.bond;
    return bondLength(points[i]!.element, points[j]!.element, bond?.order ?? 1, bond?.aromatic ?? false);
  };
  /** Angle i–c–k in degrees, and how firmly it is held. */
  const angleOf = (i: number, c: number, k: number): readonly [number, number] => {
    const ring = smallest(i, c, k);
    const flat = trigonal(c);
    if (ring === 3) return [60, WEIGHT.angle];
    if (ring === 4) return [89, WEIGHT.angle];
    if (ring === 5) return [flat ? 108 : 104.5, WEIGHT.angle];
    if (linear(c)) return [180, WEIGHT.angle];
    const own = smallest(c);
    if (own < 6) return flat ? [126, WEIGHT.looseAngle] : [113, WEIGHT.looseAngle];
    if (flat) return [120, WEIGHT.angle];
    if (ring === 6) return [cutOut === null ? 111 : TETRAHEDRAL, WEIGHT.angle];
    return [TETRAHEDRAL, cutOut === null ? WEIGHT.looseAngle * 2 : WEIGHT.angle];
  };

  const distances: DistanceRestraint[] = [];
  const volumes: VolumeRestraint[] = [];
  const near = new Map<number, number>();
  const mark = (i: number, j: number, bonds: number) => {
    const key = i < j ? i * points.length + j : j * points.length + i;
    near.set(key, Math.min(near.get(key) ?? 9, bonds));
  };
  linked.forEach((list, c) => {
    list.forEach((i, a) => {
      if (c < i) {
        distances.push({ i: c, j: i, distance: lengthOf(c, i), weight: WEIGHT.bond });
        mark(c, i, 1);
      }
      for (const k of list.slice(a + 1)) {
        const [degrees, weight] = angleOf(i, c, k);
        const distance = third(lengthOf(c, i), lengthOf(c, k), degrees);
        distances.push({ i, j: k, distance, weight });
        mark(i, k, 2);
      }
      for (const k of linked[i]!)
        for (const far of list) if (k !== c && far !== i && far !== k) mark(far, k, 3);
    });
  });

  for (const { atoms, degrees } of torsions) {
    const [i, j, k, l] = atoms.map((atom) => place.get(atom)) as [number, number, number, number];
    const lengths = [lengthOf(i, j), lengthOf(j, k), lengthOf(k, l)] as const;
    const angles = [angleOf(i, j, k)[0], angleOf(j, k, l)[0]] as const;
    distances.push({ i, j: l, distance: fourth(lengths, angles, degrees), weight: WEIGHT.torsion });
    const rad = Math.PI / 180;
    volumes.push({
      vectors: [
        [i, j],
        [j, k],
        [k, l],
      ],
      volume:
        lengths[0] *
        lengths[1] *
        lengths[2] *
        Math.sin(angles[0] * rad) *
        Math.sin(angles[1] * rad) *
        Math.sin(degrees * rad),
      weight: WEIGHT.sign,
    });
  }

  linked.forEach((list, c) => {
    const index = points[c]!.atom;
    if (index === null || points[c]!.parent !== null) return;
    const atom = molecule.atoms[index]!;
    if (trigonal(c)) {
      if (list.length === 3) volumes.push(flatAround(c, list));
      return;
    }
    // Hydrogens stand behind the listed neighbours, as the rule for senses has them.
    if (atom.stereo === null || list.length < 3) return;
    const three = list.length === 4 ? list.slice(1) : list;
    const shape = three.reduce((product, i) => product * lengthOf(c, i), TETRAHEDRAL_VOLUME);
    // From the first of four the others run as the sense says; from a lone pair in last place they run the other way.
    const sign = (atom.stereo === "cw") === (list.length === 4) ? 1 : -1;
    volumes.push({
      vectors: [
        [c, three[0]!],
        [c, three[1]!],
        [c, three[2]!],
      ],
      volume: sign * shape,
      weight: WEIGHT.sense,
    });
  });

  for (const bond of molecule.bonds) {
    const [i, j] = [place.get(bond.from), place.get(bond.to)];
    if (i === undefined || j === undefined || !trigonal(i) || !trigonal(j)) continue;
    const conjugated = bond.order === 2 || bond.aromatic || [i, j].some((at) => isAmideNitrogen(at));
    if (!conjugated) continue;
    for (const a of linked[i]!.filter((n) => n !== j)) {
      for (const b of linked[j]!.filter((n) => n !== i && n !== a)) {
        volumes.push({
          vectors: [
            [a, i],
            [i, j],
            [j, b],
          ],
          volume: 0,
          weight: WEIGHT.flat,
        });
      }
    }
    const ring = ringsWith(i, j)[0];
    if (ring === undefined && bond.stereo?.references.every((atom) => place.has(atom))) {
      const ends = bond.stereo.references.map((atom) => place.get(atom)) as [number, number];
      const [first, last] = linked[i]!.includes(ends[0]) ? ends : [ends[1], ends[0]];
      const lengths = [lengthOf(first, i), lengthOf(i, j), lengthOf(j, last)] as const;
      const degrees = bond.stereo.sense === "cis" ? 0 : 180;
      distances.push({
        i: first,
        j: last,
        distance: fourth(lengths, [120, 120], degrees),
        weight: WEIGHT.torsion,
      });
    }
  }

  function isAmideNitrogen(at: number): boolean {
    const index = points[at]!.atom;
    return index !== null && molecule.atoms[index]!.element === "N";
  }

  const separations: Separation[] = [];
  const sameRings = (i: number, j: number) =>
    points[i]!.atom !== null && points[j]!.atom !== null && smallest(i) < 99 && smallest(j) < 99;
  for (let i = 0; i < points.length; i++) {
    for (let j = i + 1; j < points.length; j++) {
      const bonds = near.get(i * points.length + j) ?? 9;
      if (bonds < 3 || (sameRings(i, j) && ringsWith(i, j).length > 0) || (bonds === 3 && sameRings(i, j)))
        continue;
      const hydrogens = Number(points[i]!.element === "H") + Number(points[j]!.element === "H");
      const apart = cutOut !== null ? APART_DRAWN : bonds === 3 ? APART_ONE_FOUR : APART;
      separations.push({ i, j, least: apart[hydrogens]! });
    }
  }
  return { points, restraints: { points: points.length, distances, separations, volumes } };

  function flatAround(c: number, list: readonly number[]): VolumeRestraint {
    return {
      vectors: [
        [c, list[0]!],
        [c, list[1]!],
        [c, list[2]!],
      ],
      volume: 0,
      weight: WEIGHT.flat,
    };
  }
}

/** Third side of a triangle from two sides and the angle between them, degrees. */
function third(a: number, b: number, degrees: number): number {
  return Math.sqrt(a * a + b * b - 2 * a * b * Math.cos((degrees * Math.PI) / 180));
}

/** Distance between the ends of a chain of three bonds from its two angles and its torsion, degrees. */
function fourth(
  lengths: readonly [number, number, number],
  angles: readonly [number, number],
  torsion: number,
): number {
  const rad = Math.PI / 180;
  const [a, b, c] = lengths;
  const [p, q] = [angles[0] * rad, angles[1] * rad];
  // The middle bond lies along x; torsion 0 puts both ends on the same side.
  const x = b - a * Math.cos(p) - c * Math.cos(q);
  const y = c * Math.sin(q) * Math.cos(torsion * rad) - a * Math.sin(p);
  const z = c * Math.sin(q) * Math.sin(torsion * rad);
  return Math.hypot(x, y, z);
}
