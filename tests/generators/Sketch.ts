/** A molecule as a plain graph, as far as writing SMILES needs it. */
export interface Sketch {
  readonly atoms: SketchAtom[];
  readonly bonds: SketchBond[];
}

export interface SketchAtom {
  /** As in SMILES: `C`, `c`, `Cl`, or what stands between brackets: `2H`, `N+`, `O-`, `nH`. */
  readonly symbol: string;
  readonly bracket: boolean;
  /** The mark to be written, with respect to the order of writing; null for none. */
  sense: "@" | "@@" | null;
}

export interface SketchBond {
  readonly from: number;
  readonly to: number;
  /** Empty where SMILES needs no symbol: single, or aromatic between two aromatic atoms. */
  readonly symbol: "" | "-" | "=" | "#";
}

/** Bonds at an atom. */
export function bondsAt(sketch: Sketch, atom: number): SketchBond[] {
  return sketch.bonds.filter((bond) => bond.from === atom || bond.to === atom);
}

export function otherEnd(bond: SketchBond, atom: number): number {
  return bond.from === atom ? bond.to : bond.from;
}

/** Hydrogens that fill an atom of this symbol up, when its bonds take what they take. */
export function hydrogensOn(sketch: Sketch, atom: number): number {
  const { symbol } = sketch.atoms[atom]!;
  const taken = bondsAt(sketch, atom).reduce(
    (sum, bond) => sum + ({ "": 1, "-": 1, "=": 2, "#": 3 }[bond.symbol] ?? 1),
    0,
  );
  const room = { B: 3, C: 4, "13C": 4, N: 3, "N+": 4, O: 2, Si: 4, P: 3, S: 2 }[symbol] ?? 0;
  return Math.max(0, room - taken);
}
