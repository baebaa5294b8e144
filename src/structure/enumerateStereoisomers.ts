import { bridgesFit } from "./bridgesFit.ts";
import { constitutionalSymmetry } from "./constitutionalSymmetry.ts";
import type { Molecule } from "./Molecule.ts";
import { type StereoAction, type StereoElement, stereoElements } from "./stereoElements.ts";
import type { Toolkit } from "./Toolkit.ts";

/** Most elements whose arrangements are listed: 256 combinations. */
const MAXIMUM_ELEMENTS = 8;

/** One stereoisomer of a constitution. */
export interface Stereoisomer {
  /** The same atoms in the same order, every configuration that matters filled in. */
  readonly molecule: Molecule;
  /** All ways of writing it on these atoms that the symmetry of the constitution makes equal, `molecule` among them. */
  readonly arrangements: readonly Molecule[];
  readonly canonicalSmiles: string;
  /** To the molecule as given. Where that leaves configurations open, every stereoisomer it may stand for is `same`. */
  readonly relation: "same" | "enantiomer" | "diastereomer";
  /** Superimposable on its mirror image, ring inversions averaged. */
  readonly superimposable: boolean;
}

export interface StereoisomerList {
  /** `same` first, then `enantiomer`, then diastereomers by canonical SMILES; empty when `complete` is false. */
  readonly isomers: readonly Stereoisomer[];
  /** Upper bound of their number: 2 to the power of the number of elements. */
  readonly upTo: number;
  /** False when there are too many elements to list every arrangement. */
  readonly complete: boolean;
}

/**
 * Every stereoisomer of the constitution of a molecule: tetrahedral atoms with the 1,3 and 1,4 patterns of rings, and
 * E/Z bonds outside small rings. Two arrangements are one stereoisomer exactly when a symmetry of the constitution turns one
 * into the other, so that nothing depends on how a library writes symmetric molecules.
 * @param possible - drops arrangements that cannot exist; the given one and its mirror image are always kept.
 */
export function enumerateStereoisomers(
  molecule: Molecule,
  toolkit: Toolkit,
  possible: (arranged: Molecule) => boolean = bridgesFit,
): StereoisomerList {
  const symmetries = constitutionalSymmetry(molecule);
  const { elements, actions } = stereoElements(molecule, symmetries ?? []);
  const upTo = 2 ** elements.length;
  if (symmetries === null || elements.length > MAXIMUM_ELEMENTS)
    return { isomers: [], upTo, complete: false };

  const orbits = orbitsOf(upTo, actions);
  const written = (code: number) => agrees(molecule, elements, code);
  const mirrored = elements.reduce(
    (mask, { kind }, bit) => (kind === "centre" ? mask | (1 << bit) : mask),
    0,
  );
  const fits = orbits.map((orbit) => possible(arrange(molecule, elements, orbit[0]!)));
  const given = orbits.filter((orbit) => orbit.some(written));
  const stands = given.filter((orbit) => fits[orbits.indexOf(orbit)]);
  const same = stands.length > 0 ? stands : given;
  const mirrorOf = (orbit: readonly number[]) =>
    orbits.find((other) => other.includes(orbit[0]! ^ mirrored))!;
  const images = same.map(mirrorOf).filter((orbit) => !same.includes(orbit));
  const others = orbits.filter((orbit, i) => fits[i] && !same.includes(orbit) && !images.includes(orbit));

  const describe = (orbit: readonly number[], relation: Stereoisomer["relation"]): Stereoisomer => {
    const shown = arrange(molecule, elements, orbit.find(written) ?? orbit[0]!);
    return {
      molecule: shown,
      arrangements: orbit.map((code) => arrange(molecule, elements, code)),
      canonicalSmiles: toolkit.canonicalSmiles(shown),
      relation,
      superimposable: mirrorOf(orbit) === orbit,
    };
  };
  const bySmiles = (a: Stereoisomer, b: Stereoisomer) =>
    a.canonicalSmiles < b.canonicalSmiles ? -1 : a.canonicalSmiles > b.canonicalSmiles ? 1 : 0;
  const isomers = [
    ...same.map((orbit) => describe(orbit, "same")).sort(bySmiles),
    ...images.map((orbit) => describe(orbit, "enantiomer")).sort(bySmiles),
    ...others.map((orbit) => describe(orbit, "diastereomer")).sort(bySmiles),
  ];
  return { isomers, upTo, complete: true };
}

/** The combinations that the symmetries turn into each other; bit k of a code is the sense of element k. */
function orbitsOf(combinations: number, actions: readonly StereoAction[]): readonly (readonly number[])[] {
  const seen = new Set<number>();
  const orbits: (readonly number[])[] = [];
  for (let start = 0; start < combinations; start++) {
    if (seen.has(start)) continue;
    const orbit = new Set([start]);
    for (const code of orbit) {
      seen.add(code);
      for (const { images, turned } of actions) {
        orbit.add(
          images.reduce((next, image, k) => next | ((((code >> k) & 1) ^ (turned[k] ? 1 : 0)) << image), 0),
        );
      }
    }
    orbits.push([...orbit].sort((a, b) => a - b));
  }
  return orbits;
}

/** The molecule with its elements arranged as a code says and every other mark removed. */
function arrange(molecule: Molecule, elements: readonly StereoElement[], code: number): Molecule {
  const atoms = molecule.atoms.map((atom) => ({ ...atom, stereo: null as "cw" | "ccw" | null }));
  const bonds = molecule.bonds.map((bond) => ({ ...bond, stereo: null as (typeof bond)["stereo"] }));
  elements.forEach((element, bit) => {
    const set = (code >> bit) & 1;
    if (element.kind === "centre") atoms[element.atom]!.stereo = set ? "cw" : "ccw";
    else bonds[element.bond]!.stereo = { sense: set ? "trans" : "cis", references: element.references };
  });
  return { ...molecule, atoms, bonds };
}

/** True when a combination has every configuration that the molecule as given states. */
function agrees(molecule: Molecule, elements: readonly StereoElement[], code: number): boolean {
  return elements.every((element, bit) => {
    const set = (code >> bit) & 1;
    if (element.kind === "bond") {
      const stated = molecule.bonds[element.bond]!.stereo;
      return stated === null || (stated.sense === "trans") === (set === 1);
    }
    const stated = molecule.atoms[element.atom]!.stereo;
    return stated === null || (stated === "cw") === (set === 1);
  });
}
