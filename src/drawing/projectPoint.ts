import { SCALE } from "./measures.ts";
import type { Point } from "./Scene.ts";
import { dot, type Vector } from "./Vector.ts";

/** Directions of an orthographic camera, unit length, each at right angles to the others. */
export interface CameraFrame {
  readonly right: Vector;
  readonly up: Vector;
  /** Towards the viewer. */
  readonly towards: Vector;
}

export interface ProjectedPoint extends Point {
  /** Distance towards the viewer, in the same pixels. */
  readonly depth: number;
}

/** Projects a point in Å to the screen in px. */
export function projectPoint(frame: CameraFrame, point: Vector): ProjectedPoint {
  return {
    x: SCALE * dot(point, frame.right),
    y: -SCALE * dot(point, frame.up),
    depth: SCALE * dot(point, frame.towards),
  };
}
