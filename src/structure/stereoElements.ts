import { couldHoldSense } from "./couldHoldSense.ts";
import { doubleBondReferences } from "./doubleBondReferences.ts";
import { isPermutationEven } from "./isPermutationEven.ts";
import { bondBetween, type Molecule } from "./Molecule.ts";

/** Stands for an implicit hydrogen or a lone pair, which the sense of a centre takes last. */
const IMPLICIT = -1;

/** An atom or a double bond that can be arranged in two ways. */
export type StereoElement =
  | { readonly kind: "centre"; readonly atom: number }
  | { readonly kind: "bond"; readonly bond: number; readonly references: readonly [number, number] };

/** What a symmetry of the constitution does to the elements: where each goes, and whether its sense turns over. */
export interface StereoAction {
  readonly images: readonly number[];
  readonly turned: readonly boolean[];
}

/**
 * The elements whose arrangement can make a difference, and how the symmetries act on them. An element that a symmetry
 * turns over while it leaves all others as they are (the ring carbon of methylcyclohexane) makes none.
 * @param symmetries - generators, each as the image of every atom.
 */
export function stereoElements(
  molecule: Molecule,
  symmetries: readonly (readonly number[])[],
): { readonly elements: readonly StereoElement[]; readonly actions: readonly StereoAction[] } {
  let elements = candidates(molecule, symmetries);
  for (;;) {
    const actions = symmetries.map((symmetry) => act(molecule, elements, symmetry));
    const idle = new Set<number>();
    for (const { images, turned } of actions) {
      const flips = turned.flatMap((turn, i) => (turn ? [i] : []));
      if (flips.length === 1 && images.every((image, i) => image === i)) idle.add(flips[0]!);
    }
    if (idle.size === 0) return { elements, actions };
    // What a symmetry makes of an idle element is idle too.
    for (const element of idle) for (const { images } of actions) idle.add(images[element]!);
    elements = elements.filter((_, i) => !idle.has(i));
  }
}

/** Everything that carries a configuration or could carry one, and what the symmetries make of it. */
function candidates(
  molecule: Molecule,
  symmetries: readonly (readonly number[])[],
): readonly StereoElement[] {
  const atoms = new Set(
    molecule.atoms.flatMap(({ index, stereo }) =>
      stereo !== null || couldHoldSense(molecule, index) ? [index] : [],
    ),
  );
  for (const atom of atoms) for (const symmetry of symmetries) atoms.add(symmetry[atom]!);
  return [
    ...[...atoms].sort((a, b) => a - b).map((atom) => ({ kind: "centre" as const, atom })),
    ...molecule.bonds.flatMap((bond) => {
      const references = bond.stereo?.references ?? doubleBondReferences(molecule, bond);
      return references === null ? [] : [{ kind: "bond" as const, bond: bond.index, references }];
    }),
  ];
}

function act(
  molecule: Molecule,
  elements: readonly StereoElement[],
  symmetry: readonly number[],
): StereoAction {
  const moved = elements.map((element) => {
    if (element.kind === "centre") {
      const image = symmetry[element.atom]!;
      const target = elements.findIndex((other) => other.kind === "centre" && other.atom === image);
      const here = molecule.atoms[element.atom]!.neighbours.map((atom) => symmetry[atom]!);
      const there = molecule.atoms[image]!.neighbours;
      return {
        target,
        turn: !isPermutationEven([...here, IMPLICIT], [...there, IMPLICIT]),
      };
    }
    const { from, to } = molecule.bonds[element.bond]!;
    const image = bondBetween(molecule, symmetry[from]!, symmetry[to]!)!.index;
    const target = elements.findIndex((other) => other.kind === "bond" && other.bond === image);
    const other = elements[target];
    if (other?.kind !== "bond") throw new Error("a symmetry left the stereo double bonds");
    const exchanged = element.references.filter((atom) => !other.references.includes(symmetry[atom]!));
    return { target, turn: exchanged.length === 1 };
  });
  return { images: moved.map(({ target }) => target), turned: moved.map(({ turn }) => turn) };
}
