import type { Orientation } from "../dossier/Dossier.ts";
import type { AtomLetters } from "./atomLetters.ts";
import type { ProjectedPoint } from "./projectPoint.ts";
import type { Point } from "./Scene.ts";

/** One ring system of one conformer as the camera sees it, before labels are placed. Points in px, centre of the leading ring at the origin. */
export interface ChairView {
  /** Conformer and leading ring, `A/0`; marks the items drawn from this view. */
  readonly group: string;
  readonly vertices: readonly Vertex[];
  readonly bonds: readonly RingBond[];
  /** Every ring as indices in `vertices`, in ring order. */
  readonly rings: readonly (readonly number[])[];
  readonly branches: readonly Branch[];
}

/** A ring bond between two vertices, by their indices. */
export interface RingBond {
  readonly from: number;
  readonly to: number;
  readonly double: boolean;
}

export interface Vertex {
  readonly atom: number;
  readonly locant: string;
  readonly at: ProjectedPoint;
  /** Middle of the rings it belongs to; its number stands on the other side. */
  readonly centre: Point;
  /** Letters set at the vertex instead of a bare corner; null for carbon without charge or mass number. */
  readonly letters: AtomLetters | null;
}

/** A bond from a ring atom to a group, or to a hydrogen that is drawn. */
export interface Branch {
  /** Index in `vertices`. */
  readonly vertex: number;
  /** First atom of the group; null for a hydrogen. */
  readonly atom: number | null;
  /** Null where two rings differ, or where the group is neither. */
  readonly orientation: Orientation | null;
  /** Letters beside the bond: `a`, `ψe`, `a/e`; empty for none. */
  readonly cue: string;
  readonly double: boolean;
  /** Where the attached atom stands. */
  readonly end: ProjectedPoint;
  readonly label: string;
  readonly labelReversed: string;
}
