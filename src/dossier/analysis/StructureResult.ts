import type { AuthorNumbering } from "../../structure/analyseRings.ts";
import type { Body } from "../../structure/Body.ts";
import type { Member } from "../../structure/findOpenCentres.ts";
import type { FoundRing } from "../../structure/findRings.ts";
import type { Molecule } from "../../structure/Molecule.ts";
import type { AnalysedRing } from "../../structure/StructureAnalysis.ts";
import type { Alert, Identity, Structure } from "../Dossier.ts";

/** A refusal: the line is wrong (`invalid-…`) or understood and not analysed (`unsupported-…`). */
export interface Refusal {
  readonly code: string;
  readonly message: string;
  /** 0-based character of the SMILES, where known. */
  readonly position: number | null;
}

/** What can be said of a structure before any energy. */
export interface StructureResult {
  readonly identity: Identity;
  readonly structure: Structure;
  readonly written: Molecule;
  /** Place of each atom in the SMILES as written, hydrogens written as atoms counted. */
  readonly writtenAtoms: readonly number[];
  /** Six-membered rings whose states are known; empty when `refusal` says why. */
  readonly rings: readonly AnalysedRing[];
  /** The same rings as found in the graph, and what the author fixed of their locants. */
  readonly found: readonly FoundRing[];
  readonly author: AuthorNumbering;
  /** The part of `molecule` whose conformers are compared; null when there is none. */
  readonly body: Body | null;
  readonly refusal: Refusal | null;
  /** The molecule whose conformers are listed; null when open stereochemistry forbids it. */
  readonly molecule: Molecule | null;
  /** Stereoisomers that the structure as written may stand for. */
  readonly members: readonly Member[];
  readonly alerts: readonly Alert[];
}
