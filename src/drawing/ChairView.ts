import type { Orientation } from "../dossier/Dossier.ts";
import type { AtomLetters } from "./atomLetters.ts";
import type { ProjectedPoint } from "./projectPoint.ts";

/**
 * One ring system of one conformer as the camera sees it, before labels are placed: a single ring, or several that
 * share atoms, drawn as one body. Points in px, the middle of the ring atoms at the origin.
 */
export interface ChairView {
  /** Conformer and leading ring, `A/0`; marks the items drawn from this view. */
  readonly group: string;
  readonly vertices: readonly Vertex[];
  readonly bonds: readonly RingBond[];
  /** Every ring as indices in `vertices`, in ring order. */
  readonly rings: readonly (readonly number[])[];
  /** Index in `rings` of the one whose axis is vertical. */
  readonly lead: number;
  readonly branches: readonly Branch[];
}

/** A ring bond between two vertices, given by their indices. */
export interface RingBond {
  readonly from: number;
  readonly to: number;
  readonly order: 1 | 2 | 3;
  /** Side of the second line of a double bond: 1 to the right on the way from `from` to `to`, −1 to the left. */
  readonly side: 1 | -1;
}

/** A ring atom. */
export interface Vertex {
  readonly atom: number;
  /** Empty where the atom has none. */
  readonly locant: string;
  readonly at: ProjectedPoint;
  /** Direction on the screen that leads away from the rings, radians, clockwise from the right. */
  readonly outward: number;
  /** Letters set at the vertex instead of a bare corner; null for carbon without charge or mass number. */
  readonly letters: AtomLetters | null;
}

/** A bond from a ring atom to a group, or to a hydrogen that is drawn. */
export interface Branch {
  /** Index in `vertices`. */
  readonly vertex: number;
  /** First atom of the group; null for a hydrogen. */
  readonly atom: number | null;
  readonly order: 1 | 2 | 3;
  /** Gives the accent; null where the group is neither, or where two of its rings differ. */
  readonly orientation: Orientation | null;
  /** What stands beside the bond: `a`, `ψe`, `a/e` where two rings differ, or nothing. */
  readonly cue: string;
  /** Where the attached atom stands. */
  readonly end: ProjectedPoint;
  readonly label: string;
  readonly labelReversed: string;
}
