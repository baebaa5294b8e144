import type {
  Conformer,
  Dossier,
  Orientation,
  Position,
  Ring,
  RingSystem,
} from "../../src/dossier/Dossier.ts";
import { sampleDossier } from "./makeDossier.ts";

type Point = readonly [number, number, number];

/** The four bond directions of the diamond lattice; bonds from every second atom run the opposite way. */
const DIRECTIONS: readonly Point[] = [
  [1, 1, 1],
  [1, -1, -1],
  [-1, 1, -1],
  [-1, -1, 1],
];
/** Å for one unit of the lattice: bonds are 1.536 Å long. */
const UNIT = 1.536 / Math.sqrt(3);

export interface GroupOnLattice {
  readonly at: number;
  /** Lattice direction in the first conformer; in the others the place that keeps the configuration. */
  readonly direction: number;
  readonly element: string;
  readonly label: string;
  readonly labelReversed?: string;
  readonly order?: 1 | 2;
}

export interface SystemSpec {
  readonly name: string;
  readonly atoms: readonly {
    readonly element?: string;
    readonly hydrogens?: number;
    readonly charge?: number;
  }[];
  /** Analysed rings as atoms in ring order, clockwise seen from the up face of the first conformer or not: either holds. */
  readonly rings: readonly (readonly number[])[];
  readonly parents?: readonly string[];
  readonly locants?: readonly string[];
  readonly forms?: readonly Conformer["rings"][number]["form"][];
  readonly orders?: Readonly<Record<string, 2>>;
  readonly aromatic?: readonly string[];
  /** Coordinates in Å of all ring atoms, one list for each conformer. */
  readonly places: readonly (readonly Point[])[];
  readonly groups?: readonly GroupOnLattice[];
  readonly fusions?: RingSystem["fusions"];
}

/** Walks along the lattice: `{ from: 0, steps: [1, 2] }` places the next two atoms. Atom 0 stands at the origin. */
export function onLattice(
  walks: readonly { readonly from: number; readonly steps: readonly number[] }[],
  parity: 1 | -1 = 1,
): readonly Point[] {
  const found: { at: Point; sign: number }[] = [{ at: [0, 0, 0], sign: parity }];
  for (const { from, steps } of walks) {
    let here = found[from]!;
    for (const step of steps) {
      const direction = DIRECTIONS[step]!;
      here = {
        at: [0, 1, 2].map((k) => here.at[k]! + here.sign * direction[k]!) as unknown as Point,
        sign: -here.sign,
      };
      found.push(here);
    }
  }
  return found.map(({ at }) => at.map((value) => value * UNIT) as unknown as Point);
}

/** A dossier of one ring system, for drawing tests only: its populations are invented and stand for nothing. */
export function makeSystem(spec: SystemSpec): Dossier {
  const count = spec.atoms.length;
  const groups = spec.groups ?? [];
  const key = (a: number, b: number) => (a < b ? `${a}-${b}` : `${b}-${a}`);
  const [first] = spec.places;
  const ringBonds: [number, number][] = [];
  for (let a = 0; a < count; a++)
    for (let b = a + 1; b < count; b++) if (distance(first![a]!, first![b]!) < 1.7) ringBonds.push([a, b]);
  const neighbours = (atom: number) =>
    ringBonds.flatMap(([a, b]) => (a === atom ? [b] : b === atom ? [a] : []));
  const orderOf = (a: number, b: number) => spec.orders?.[key(a, b)] ?? (1 as const);
  const atoms = [
    ...spec.atoms.map(({ element = "C", hydrogens, charge = 0 }, index) => {
      const used =
        neighbours(index).reduce((sum, other) => sum + orderOf(index, other), 0) +
        groups.filter(({ at }) => at === index).reduce((sum, { order = 1 }) => sum + order, 0);
      const valence = { C: 4, N: 3, O: 2, S: 2 }[element] ?? 4;
      return {
        element,
        charge,
        isotope: 0,
        hydrogens: hydrogens ?? Math.max(0, valence + charge - used),
        x: 0,
        y: 0,
      };
    }),
    ...groups.map(({ element }) => ({ element, charge: 0, isotope: 0, hydrogens: 0, x: 0, y: 0 })),
  ];
  const locants = spec.locants ?? spec.atoms.map((_, index) => String(index + 1));
  const rings = spec.rings.map(
    (ring, index): Ring => ({
      index,
      atoms: ring,
      locants: ring.map((atom) => locants[atom]!),
      parent: spec.parents?.[index] ?? "cyclohexane",
      ringKey: "cyclohexane",
      system: 0,
      kind: "chair",
      substituents: groups.flatMap((group, k) =>
        ring.includes(group.at)
          ? [
              {
                ringAtom: group.at,
                atom: count + k,
                locant: locants[group.at]!,
                face: "up" as const,
                group: group.label,
                label: group.label,
                labelReversed: group.labelReversed ?? group.label,
              },
            ]
          : [],
      ),
      branches: [],
      configuration: [],
    }),
  );
  const conformers = spec.places.map((places, number): Conformer => {
    const ends = hang(spec, first!, places, neighbours, atoms);
    const positions = rings.flatMap((ring): Position[] =>
      ring.substituents.flatMap((substituent): Position[] => {
        if (orderOfGroup(spec, substituent.atom - count) === 2) return [];
        const axis = normalOf(ring.atoms.map((atom) => places[atom]!));
        const bond = minus(ends.groups[substituent.atom - count]!, places[substituent.ringAtom]!);
        const slope = Math.abs(dot(bond, axis)) / Math.hypot(...bond);
        const orientation: Orientation = slope > 0.7 ? "axial" : "equatorial";
        return [
          {
            ring: ring.index,
            ringAtom: substituent.ringAtom,
            substituent: substituent.atom,
            locant: substituent.locant,
            kind: "group",
            group: substituent.label,
            orientation,
            pseudo: false,
            face: dot(bond, axis) > 0 ? "up" : "down",
          },
        ];
      }),
    );
    const population = spec.places.length === 1 ? 1 : number === 0 ? 0.9 : 0.1 / (spec.places.length - 1);
    return {
      id: String.fromCharCode(65 + number),
      label: labelOf(positions),
      rings: rings.map((ring) => ({ ring: ring.index, form: spec.forms?.[ring.index] ?? "chair" })),
      positions,
      deltaG_kJ_mol: 0,
      u_kJ_mol: 0.5,
      sum_kJ_mol: 0,
      population,
      population95: [Math.max(0, population - 0.03), Math.min(1, population + 0.02)],
      contributions: [],
      relaxed: null,
      nitrogens: [],
      geometry: {
        atoms: [
          ...spec.atoms.map((_, atom) => placed(atoms[atom]!.element, atom, null, places[atom]!)),
          ...groups.map((group, k) => placed(group.element, count + k, group.at, ends.groups[k]!)),
          ...ends.hydrogens.map(({ parent, at }) => placed("H", null, parent, at)),
        ],
      },
    };
  });
  return {
    ...sampleDossier,
    code: "TX-02",
    slug: "tx-02",
    name: spec.name,
    structure: {
      atoms,
      bonds: [
        ...ringBonds.map(([from, to]) => ({
          from,
          to,
          order: orderOf(from, to),
          aromatic: spec.aromatic?.includes(key(from, to)) ?? false,
          wedge: null,
        })),
        ...groups.map((group, k) => ({
          from: group.at,
          to: count + k,
          order: group.order ?? (1 as const),
          aromatic: false,
          wedge: null,
        })),
      ],
    },
    rings,
    systems: [
      {
        index: 0,
        rings: rings.map((ring) => ring.index),
        atoms: spec.atoms.map((_, index) => index),
        bonds: ringBonds.map(([from, to]) => ({
          from,
          to,
          order: orderOf(from, to),
          aromatic: spec.aromatic?.includes(key(from, to)) ?? false,
        })),
        fusions: spec.fusions ?? [],
      },
    ],
    conformers,
    relation: conformers.length === 2 ? "diastereomeric" : null,
    equilibria: conformers.slice(1).map((conformer) => ({
      from: "A",
      to: conformer.id,
      deltaG_kJ_mol: 5,
      u_kJ_mol: 1,
      deltaG95_kJ_mol: [3, 7],
      K: conformer.population / conformers[0]!.population,
      K95: [0.05, 0.2],
      unresolved: false,
      bySymmetry: false,
    })),
    temperatures: [],
  };
}

function orderOfGroup(spec: SystemSpec, index: number): 1 | 2 {
  return spec.groups?.[index]?.order ?? 1;
}

/** Groups and hydrogens on the free places of every ring atom, the configuration of the first conformer kept. */
function hang(
  spec: SystemSpec,
  first: readonly Point[],
  places: readonly Point[],
  neighbours: (atom: number) => readonly number[],
  atoms: readonly { readonly hydrogens: number }[],
) {
  const groups: Point[] = [];
  const hydrogens: { parent: number; at: Point }[] = [];
  for (const [atom, own] of places.entries()) {
    const ring = neighbours(atom);
    const here = (spec.groups ?? []).flatMap((group, index) => (group.at === atom ? [{ group, index }] : []));
    const free = freePlaces(
      own,
      ring.map((other) => places[other]!),
    );
    const freeFirst = freePlaces(
      first[atom]!,
      ring.map((other) => first[other]!),
    );
    const taken = new Set<number>();
    for (const { group, index } of here) {
      const flat = group.order === 2;
      const away = unit(
        ring.reduce((sum, other) => plus(sum, unit(minus(own, places[other]!))), [0, 0, 0] as Point),
      );
      const length = flat ? 1.22 : group.element === "H" ? 1.07 : 1.5;
      if (flat) {
        groups[index] = plus(own, times(length, away));
        continue;
      }
      // Nearest free place to the lattice direction in the first conformer, the same index of handedness in the others.
      const parity = (point: Point) =>
        dot(unit(minus(point, first[atom]!)), unit(DIRECTIONS[group.direction]!));
      const scores = freeFirst.map((direction) => Math.abs(parity(plus(first[atom]!, direction))));
      const choice = scores.indexOf(Math.max(...scores));
      taken.add(choice);
      groups[index] = plus(own, times(length, free[choice]!));
    }
    const left = free.filter((_, index) => !taken.has(index));
    for (const direction of left.slice(0, atoms[atom]!.hydrogens))
      hydrogens.push({ parent: atom, at: plus(own, times(1.07, direction)) });
  }
  return { groups, hydrogens };
}

/** Directions of the free places of a tetrahedral atom, listed so that equal index means equal handedness. */
function freePlaces(own: Point, others: readonly Point[]): readonly Point[] {
  const bonds = others.map((other) => unit(minus(other, own)));
  const away = unit(times(-1, bonds.reduce(plus, [0, 0, 0])));
  if (bonds.length >= 3) return [away];
  const across = unit(cross(bonds[0]!, bonds[1]!));
  const [a, b] = [Math.sqrt(1 / 3), Math.sqrt(2 / 3)];
  return [plus(times(a, away), times(b, across)), plus(times(a, away), times(-b, across))];
}

function placed(element: string, atom: number | null, parent: number | null, [x, y, z]: Point) {
  return { element, atom, parent, system: 0, x, y, z };
}

function labelOf(positions: readonly Position[]): string {
  const atoms = [...new Set(positions.map((position) => position.substituent))];
  return atoms
    .map((atom) => {
      const own = positions.filter((position) => position.substituent === atom);
      const letters = [
        ...new Set(own.map((position) => (position.orientation === "axial" ? "a" : "e"))),
      ].join("/");
      return `${own[0]!.locant}-${letters}`;
    })
    .join(",");
}

function normalOf(ring: readonly Point[]): Point {
  const around = (f: (angle: number) => number) =>
    ring.reduce((sum, point, k) => plus(sum, times(f((2 * Math.PI * k) / ring.length), point)), [
      0, 0, 0,
    ] as Point);
  return unit(cross(around(Math.sin), around(Math.cos)));
}

function distance(a: Point, b: Point): number {
  return Math.hypot(...minus(a, b));
}
const plus = (a: Point, b: Point): Point => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
const minus = (a: Point, b: Point): Point => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
const times = (factor: number, a: Point): Point => [factor * a[0], factor * a[1], factor * a[2]];
const dot = (a: Point, b: Point): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross = (a: Point, b: Point): Point => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
const unit = (a: Point): Point => times(1 / (Math.hypot(...a) || 1), a);
