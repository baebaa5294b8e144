import type { Register } from "../register/Register.ts";
import type { Molecule } from "./Molecule.ts";

/** Replacement prefixes in order of precedence, for rings without a name of their own in the register. */
const PREFIXES: readonly (readonly [string, string])[] = [
  ["O", "oxa"],
  ["S", "thia"],
  ["Se", "selena"],
  ["Te", "tellura"],
  ["N", "aza"],
  ["P", "phospha"],
  ["As", "arsa"],
  ["Si", "sila"],
  ["Ge", "germa"],
  ["Sn", "stanna"],
  ["Pb", "plumba"],
];

/** A parent name with every way of numbering the ring that fits it: atoms at locants 1 to 6. */
export interface RingName {
  readonly parent: string;
  readonly numberings: readonly (readonly number[])[];
}

/**
 * Names the parent of a six-membered ring and lists the numberings its name allows.
 * Rings the register does not name are numbered by replacement nomenclature (IUPAC P-31.1.4.2: lowest
 * locants to the heteroatoms together, then in the order O, S, Se, Te, N, P, …).
 */
export function nameRing(molecule: Molecule, ring: readonly number[], register: Register): RingName {
  const walks = [0, 1, 2, 3, 4, 5].flatMap((start) => [
    ring.map((_, step) => ring[(start + step) % 6]!),
    ring.map((_, step) => ring[(start - step + 12) % 6]!),
  ]);
  const elements = (walk: readonly number[]) => walk.map((index) => molecule.atoms[index]!.element);
  for (const parent of register.parents) {
    const wanted = parent.elements.join(" ");
    const numberings = walks.filter((walk) => elements(walk).join(" ") === wanted);
    if (numberings.length > 0) return { parent: parent.name, numberings };
  }
  const score = (walk: readonly number[]) => {
    const list = elements(walk);
    const all = list.flatMap((element, i) => (element === "C" ? [] : [i + 1]));
    const each = PREFIXES.flatMap(([element]) => list.flatMap((e, i) => (e === element ? [i + 1] : [])));
    return [...all, ...each];
  };
  const best = walks.map(score).sort(compareLists)[0]!;
  const numberings = walks.filter((walk) => compareLists(score(walk), best) === 0);
  const list = elements(numberings[0]!);
  const multiply = ["", "", "di", "tri", "tetra", "penta", "hexa"];
  const parts = PREFIXES.flatMap(([element, prefix]) => {
    const locants = list.flatMap((e, i) => (e === element ? [i + 1] : []));
    return locants.length === 0 ? [] : [`${locants.join(",")}-${multiply[locants.length]}${prefix}`];
  });
  return { parent: `${parts.join("-")}cyclohexane`, numberings };
}

/** Compares two lists of numbers from the left; a list that is a prefix of the other comes first. */
export function compareLists(a: readonly number[], b: readonly number[]): number {
  for (let i = 0; i < Math.min(a.length, b.length); i++) {
    if (a[i] !== b[i]) return a[i]! - b[i]!;
  }
  return a.length - b.length;
}
