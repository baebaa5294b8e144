import type { Dossier } from "../../src/dossier/Dossier.ts";
import { makeSystem, onLattice, type SystemSpec } from "./makeSystems.ts";

type Point = readonly [number, number, number];

const carbons = (count: number) => Array.from({ length: count }, () => ({}));
const DECALIN_LOCANTS = ["8a", "1", "2", "3", "4", "4a", "5", "6", "7", "8"];
const FIRST = [0, 1, 2, 3, 4, 5];
const SECOND = [0, 5, 6, 7, 8, 9];
const transDecalin = onLattice([{ from: 0, steps: [1, 2, 3, 1, 2, 1, 2, 3, 1] }]);
const fusion = (relation: "cis" | "trans") => [
  { atoms: [0, 5] as const, locants: ["8a", "4a"] as const, relation },
];

/** cis-Decalin and its flip: the second ring leaves the first through one axial and one equatorial bond. */
const cisDecalin = [
  onLattice([{ from: 0, steps: [1, 2, 3, 1, 2, 0, 2, 3, 0] }]),
  onLattice([{ from: 0, steps: [1, 2, 3, 1, 2, 1, 0, 3, 1] }], -1),
];

const decalin = (relation: "cis" | "trans", spec: Partial<SystemSpec> & Pick<SystemSpec, "name">): Dossier =>
  makeSystem({
    atoms: carbons(10),
    rings: [FIRST, SECOND],
    locants: DECALIN_LOCANTS,
    places: relation === "trans" ? [transDecalin] : cisDecalin,
    fusions: fusion(relation),
    ...spec,
  });

/** Ring atoms of the steroid skeleton, C1 to C17 without the angular methyls, on indices 0 to 16. */
const STEROID_WALKS = [
  { from: 0, steps: [1, 2, 3, 1] },
  { from: 4, steps: [3, 1, 2, 3, 1] },
  { from: 8, steps: [2, 1, 3, 2] },
];

function steroidPlaces(): readonly Point[] {
  const walked = onLattice([...STEROID_WALKS, { from: 13, steps: [3] }, { from: 12, steps: [1] }]);
  const [fifteen, seventeen] = [walked[14]!, walked[15]!];
  const toward = (a: Point, b: Point, by: number): Point => [
    a[0] + by * (b[0] - a[0]),
    a[1] + by * (b[1] - a[1]),
    a[2] + by * (b[2] - a[2]),
  ];
  // C15 and C17 lean towards each other until C16 can join them.
  const [c15, c17] = [toward(fifteen, seventeen, 0.09), toward(seventeen, fifteen, 0.09)];
  const [base, middle] = [toward(walked[12]!, walked[13]!, 0.5), toward(c15, c17, 0.5)];
  const reach = Math.hypot(middle[0] - base[0], middle[1] - base[1], middle[2] - base[2]);
  return [...walked.slice(0, 14), c15, toward(base, middle, (reach + 0.9) / reach), c17];
}

const STEROID: SystemSpec = {
  name: "5α-androstane skeleton",
  atoms: carbons(17),
  rings: [
    [0, 1, 2, 3, 4, 9],
    [4, 5, 6, 7, 8, 9],
    [7, 8, 10, 11, 12, 13],
  ],
  places: [steroidPlaces()],
  groups: [
    { at: 9, direction: 0, element: "C", label: "Me" },
    { at: 12, direction: 0, element: "C", label: "Me" },
  ],
  fusions: [
    { atoms: [4, 9], locants: ["5", "10"], relation: "trans" },
    { atoms: [7, 8], locants: ["8", "9"], relation: "trans" },
    { atoms: [12, 13], locants: ["13", "14"], relation: "trans" },
  ],
};

/** Dossiers of ring systems that strain the drawing in different ways. */
export const systems: Readonly<Record<string, Dossier>> = {
  "trans-decalin": decalin("trans", { name: "trans-decalin" }),
  "trans-decalin groups": decalin("trans", {
    name: "invented trans-decalin",
    groups: [
      { at: 2, direction: 1, element: "O", label: "OH", labelReversed: "HO" },
      { at: 5, direction: 0, element: "C", label: "Me" },
      { at: 8, direction: 0, element: "C", label: "CO_2Me", labelReversed: "MeO_2C" },
    ],
  }),
  "trans-decalone": decalin("trans", {
    name: "invented trans-decalone",
    groups: [
      { at: 1, direction: 3, element: "O", label: "O", order: 2 },
      { at: 5, direction: 0, element: "C", label: "Me" },
    ],
  }),
  oxadecalin: decalin("trans", {
    name: "invented oxadecalin",
    atoms: [{}, { element: "O" }, {}, {}, {}, {}, {}, { element: "N" }, {}, {}],
    groups: [{ at: 2, direction: 2, element: "O", label: "OMe", labelReversed: "MeO" }],
  }),
  "cis-decalin": decalin("cis", { name: "cis-decalin" }),
  "cis-decalin groups": decalin("cis", {
    name: "invented cis-decalin",
    groups: [
      { at: 5, direction: 1, element: "C", label: "Me" },
      { at: 2, direction: 1, element: "O", label: "OH", labelReversed: "HO" },
    ],
  }),
  perhydroanthracene: makeSystem({
    name: "trans-syn-trans-perhydroanthracene",
    atoms: carbons(14),
    rings: [FIRST, SECOND, [7, 8, 10, 11, 12, 13]],
    locants: ["9a", "1", "2", "3", "4", "4a", "10", "10a", "8a", "9", "8", "7", "6", "5"],
    places: [
      onLattice([
        { from: 0, steps: [1, 2, 3, 1, 2, 1, 2, 3, 1] },
        { from: 8, steps: [2, 1, 3, 2] },
      ]),
    ],
    fusions: [
      { atoms: [0, 5], locants: ["9a", "4a"], relation: "trans" },
      { atoms: [7, 8], locants: ["10a", "8a"], relation: "trans" },
    ],
  }),
  steroid: makeSystem(STEROID),
  "steroid groups": makeSystem({
    ...STEROID,
    name: "invented androstanolone",
    groups: [
      ...STEROID.groups!,
      { at: 2, direction: 2, element: "O", label: "OH", labelReversed: "HO" },
      { at: 16, direction: 3, element: "O", label: "O", order: 2 },
      { at: 10, direction: 0, element: "O", label: "OH", labelReversed: "HO" },
    ],
  }),
  spiro: makeSystem({
    name: "spiro[5.5]undecane",
    atoms: carbons(11),
    rings: [FIRST, [0, 6, 7, 8, 9, 10]],
    locants: ["6", "1", "2", "3", "4", "5", "7", "8", "9", "10", "11"],
    places: [
      onLattice([
        { from: 0, steps: [1, 2, 3, 1, 2] },
        { from: 0, steps: [0, 1, 2, 0, 1] },
      ]),
      onLattice([
        { from: 0, steps: [1, 2, 3, 1, 2] },
        { from: 0, steps: [2, 1, 0, 2, 1] },
      ]),
    ],
    groups: [{ at: 2, direction: 1, element: "C", label: "Me" }],
  }),
  adamantane: makeSystem({
    name: "adamantane",
    atoms: carbons(10),
    rings: [FIRST, [0, 1, 2, 7, 9, 6], [2, 3, 4, 8, 9, 7], [4, 5, 0, 6, 9, 8]],
    locants: ["1", "2", "3", "4", "5", "6", "8", "10", "9", "7"],
    places: [
      onLattice([
        { from: 0, steps: [1, 2, 3, 1, 2] },
        { from: 0, steps: [0] },
        { from: 2, steps: [0] },
        { from: 4, steps: [0] },
        { from: 6, steps: [2] },
      ]),
    ],
    groups: [{ at: 9, direction: 0, element: "O", label: "OH", labelReversed: "HO" }],
  }),
  bicyclononane: makeSystem({
    name: "bicyclo[3.3.1]nonane",
    atoms: carbons(9),
    rings: [FIRST, [0, 1, 2, 7, 8, 6]],
    locants: ["1", "9", "5", "4", "3", "2", "8", "6", "7"],
    places: [
      onLattice([
        { from: 0, steps: [1, 2, 3, 1, 2] },
        { from: 0, steps: [0] },
        { from: 2, steps: [0] },
        { from: 6, steps: [2] },
      ]),
    ],
  }),
  tetralin: makeSystem({
    name: "invented tetralin",
    atoms: carbons(10),
    rings: [FIRST],
    parents: ["cyclohexene"],
    forms: ["half-chair"],
    locants: ["8a", "1", "2", "3", "4", "4a", "", "", "", ""],
    orders: { "0-5": 2, "6-7": 2, "8-9": 2 },
    aromatic: ["0-5", "5-6", "6-7", "7-8", "8-9", "0-9"],
    places: [tetralinPlaces(1), tetralinPlaces(-1)],
    groups: [{ at: 2, direction: 1, element: "O", label: "OH", labelReversed: "HO" }],
  }),
};

function tetralinPlaces(sense: 1 | -1): readonly Point[] {
  return [
    [0.7, 0, 0],
    [1.45, -1.31, 0],
    [2.9, -0.68, 0.36 * sense],
    [2.9, 0.68, -0.36 * sense],
    [1.45, 1.31, 0],
    [0.7, 0, 0],
  ]
    .map((_, index): Point => {
      const table: readonly Point[] = [
        [0, -0.7, 0],
        [1.29, -1.47, 0],
        [2.55, -0.69, 0.36 * sense],
        [2.55, 0.69, -0.36 * sense],
        [1.29, 1.47, 0],
        [0, 0.7, 0],
      ];
      return table[index]!;
    })
    .concat([
      [-1.21, 1.4, 0],
      [-2.42, 0.7, 0],
      [-2.42, -0.7, 0],
      [-1.21, -1.4, 0],
    ] as Point[]);
}
