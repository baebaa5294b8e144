import type { Molecule } from "./Molecule.ts";

/** What the program asks of a cheminformatics library; one adapter implements it. */
export interface Toolkit {
  readonly version: string;
  /** Reads an OpenSMILES string; atoms keep their order. */
  read(smiles: string): ReadResult;
  /** Reads a group's SMILES with its attachment point `[*]`; null when it is not valid. */
  readFragment(smiles: string): Molecule | null;
  /** Canonical SMILES with stereochemistry; equal for superimposable molecules. */
  canonicalSmiles(molecule: Molecule): string;
  /** Standard InChI, empty when the library cannot make one. */
  inchi(molecule: Molecule): string;
  inchikey(inchi: string): string;
  /** CIP descriptors by the library's labeller, including r and s. */
  descriptors(molecule: Molecule): Descriptors;
  /** Flat coordinates (y upwards) and wedges, narrow end first. */
  depict(molecule: Molecule): Depiction;
}

export type ReadResult =
  | {
      readonly ok: true;
      readonly molecule: Molecule;
      /** Place of each atom in the SMILES as written, where hydrogens written as atoms count too. */
      readonly writtenAtoms: readonly number[];
      readonly formula: string;
      readonly molarMass: number;
    }
  | {
      readonly ok: false;
      readonly reason: string /** 0-based character in the string, where known. */;
      readonly position: number | null;
    };

export interface Descriptors {
  readonly atoms: ReadonlyMap<number, string>;
  readonly bonds: readonly { readonly atoms: readonly [number, number]; readonly descriptor: string }[];
}

export interface Depiction {
  readonly coordinates: readonly { readonly x: number; readonly y: number }[];
  readonly wedges: readonly {
    readonly from: number;
    readonly to: number;
    readonly wedge: "solid" | "hashed";
  }[];
}
