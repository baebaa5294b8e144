import type { ProjectedPoint } from "./projectPoint.ts";
import type { Ink, Part } from "./Scene.ts";

/** A bond of a chair before it is cut where it ends at letters or passes behind a nearer one. */
export interface Stroke {
  readonly from: ProjectedPoint;
  readonly to: ProjectedPoint;
  readonly width: number;
  readonly endWidth: number;
  readonly ink: Ink;
  readonly part: Part;
  readonly atoms: readonly number[];
  /** Indices of the ring atoms at its ends; strokes that share one meet there and are not cut. */
  readonly vertices: readonly number[];
}
