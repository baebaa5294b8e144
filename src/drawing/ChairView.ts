import type { Orientation } from "../dossier/Dossier.ts";
import type { AtomLetters } from "./atomLetters.ts";
import type { ProjectedPoint } from "./projectPoint.ts";

/** One chair of one ring as the camera sees it, before labels are placed. Points in px, ring centre at the origin. */
export interface ChairView {
  /** Conformer and ring, `A/0`; marks the items drawn from this view. */
  readonly group: string;
  readonly vertices: readonly Vertex[];
  readonly branches: readonly Branch[];
  /** Index in `vertices` of the ring bond nearest to the viewer: from this vertex to the next. */
  readonly front: number;
}

export interface Vertex {
  readonly atom: number;
  readonly locant: string;
  readonly at: ProjectedPoint;
  /** Letters set at the vertex instead of a bare corner; null for carbon without charge or mass number. */
  readonly letters: AtomLetters | null;
}

/** A bond from a ring atom to a group, or to a hydrogen that is drawn. */
export interface Branch {
  /** Index in `vertices`. */
  readonly vertex: number;
  /** First atom of the group; null for a hydrogen. */
  readonly atom: number | null;
  readonly orientation: Orientation;
  /** Where the attached atom stands. */
  readonly end: ProjectedPoint;
  readonly label: string;
  readonly labelReversed: string;
}
