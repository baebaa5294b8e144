import type { Group } from "../register/Register.ts";
import type { Molecule } from "./Molecule.ts";
import type { RingSite } from "./ringFaces.ts";

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

/** A saturated six-membered ring that stands alone, with faces, locants and groups. */
export interface AnalysedRing {
  readonly index: number;
  /** From the lowest atom, in the direction of rising locants; clockwise seen from the up face. */
  readonly atoms: readonly number[];
  /** Locants 1…6 of `atoms`. */
  readonly locants: readonly number[];
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
  readonly substituents: readonly Substituent[];
}

/** Everything later rooms need to know of a structure; all senses that matter are filled in. */
export interface StructureAnalysis {
  /** As written by the author. */
  readonly written: Molecule;
  /** The member that is analysed; equal to `written` when nothing was open. */
  readonly molecule: Molecule;
  readonly rings: readonly AnalysedRing[];
}
