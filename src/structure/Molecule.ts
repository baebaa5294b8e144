/**
 * A molecular graph in input SMILES order. Hydrogens are counts, except isotopic ones, which are atoms.
 * Bonds are Kekulé; `aromatic` marks those the toolkit perceives as aromatic.
 */
export interface Molecule {
  readonly atoms: readonly Atom[];
  readonly bonds: readonly Bond[];
  /** Smallest set of smallest rings, each as atoms in ring order. */
  readonly rings: readonly (readonly number[])[];
}

export interface Atom {
  readonly index: number;
  readonly element: string;
  readonly atomicNumber: number;
  readonly charge: number;
  /** Mass number; 0 means natural. */
  readonly isotope: number;
  readonly hydrogens: number;
  readonly radicals: number;
  readonly aromatic: boolean;
  /**
   * Sense of the neighbours as listed, an implicit hydrogen or lone pair taken last: seen from the
   * first neighbour the others run counter-clockwise (`ccw`) or clockwise (`cw`). Null when not given.
   */
  readonly stereo: TetrahedralSense | null;
  /** Neighbouring atoms in bond order. */
  readonly neighbours: readonly number[];
}

export type TetrahedralSense = "cw" | "ccw";

export interface Bond {
  readonly index: number;
  readonly from: number;
  readonly to: number;
  readonly order: 1 | 2 | 3;
  readonly aromatic: boolean;
  /** Double-bond geometry with respect to the two reference atoms; null when not given. */
  readonly stereo: { readonly sense: "cis" | "trans"; readonly references: readonly [number, number] } | null;
}

/** The bond between two atoms, or undefined. */
export function bondBetween(molecule: Molecule, a: number, b: number): Bond | undefined {
  return molecule.bonds.find(
    (bond) => (bond.from === a && bond.to === b) || (bond.from === b && bond.to === a),
  );
}

/** The same molecule with some tetrahedral senses replaced. */
export function withSenses(
  molecule: Molecule,
  senses: ReadonlyMap<number, TetrahedralSense | null>,
): Molecule {
  return {
    ...molecule,
    atoms: molecule.atoms.map((atom) => {
      const sense = senses.get(atom.index);
      return sense === undefined ? atom : { ...atom, stereo: sense };
    }),
  };
}

/** The mirror image: every tetrahedral sense reversed, double-bond geometry kept. */
export function mirrorImage(molecule: Molecule): Molecule {
  return {
    ...molecule,
    atoms: molecule.atoms.map((atom) =>
      atom.stereo === null ? atom : { ...atom, stereo: atom.stereo === "cw" ? "ccw" : "cw" },
    ),
  };
}
