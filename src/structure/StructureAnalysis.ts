import type { Group } from "../register/Register.ts";
import type { RingKind } from "./findRings.ts";
import type { Molecule } from "./Molecule.ts";
import type { RingSite } from "./ringFaces.ts";
import type { RingPartner } from "./ringPartners.ts";

/** A group on an analysed ring. */
export interface Substituent {
  readonly ringAtom: number;
  /** First atom of the group. */
  readonly atom: number;
  /** Register group, or null when the register does not list it. */
  readonly group: Group | null;
  readonly groupClass: string;
  /** Label markup, attached atom first and last. */
  readonly label: string;
  readonly labelReversed: string;
  /** Name prefix, for alphabetical order and sentences. */
  readonly prefix: string;
  /** Canonical form with senses, and that of its mirror image: what superposition has to match. */
  readonly form: string;
  readonly mirrorForm: string;
}

/** A six-membered ring whose states are known, alone or in a ring system, with faces, locants and groups. */
export interface AnalysedRing {
  readonly index: number;
  readonly kind: RingKind;
  /** Index of its ring system. */
  readonly system: number;
  /** From the lowest atom, in the direction of rising locants; clockwise seen from the up face. */
  readonly atoms: readonly number[];
  /** Locants 1…6 of `atoms` in the ring's own parent, by which the register is read. */
  readonly locants: readonly number[];
  /** Locants of `atoms` as printed: those of the whole ring system or the author's own where there are any. */
  readonly names: readonly string[];
  /** Ring bonds k (atom k to atom k + 1 of `atoms`) held flat. */
  readonly flatBonds: readonly number[];
  /** Positions of trigonal atoms in `atoms`. */
  readonly flatAtoms: readonly number[];
  /** Other rings that share atoms with this one. */
  readonly partners: readonly RingPartner[];
  readonly parent: string;
  readonly ringKey: string;
  /** Element symbols of `atoms`. */
  readonly elements: readonly string[];
  /** Ring carbons. */
  readonly carbons: readonly number[];
  /** Ring atoms that invert and so let their group change face. */
  readonly inverting: readonly number[];
  /** In the order of `atoms`. */
  readonly sites: readonly RingSite[];
  /** Groups on tetrahedral atoms, which are axial or equatorial in a chair. */
  readonly substituents: readonly Substituent[];
  /** Bonds to atoms of other rings of the system, each described as the open-chain group it resembles. */
  readonly branches: readonly Substituent[];
  /** Groups on trigonal atoms (=O, =CH2, N-acyl …), which are neither axial nor equatorial. */
  readonly flatGroups: readonly Substituent[];
}

/** Everything later rooms need to know of a structure; all senses that matter are filled in. */
export interface StructureAnalysis {
  /** As written by the author. */
  readonly written: Molecule;
  /** The member that is analysed; equal to `written` when nothing was open. */
  readonly molecule: Molecule;
  readonly rings: readonly AnalysedRing[];
}
