import { SCALE } from "./measures.ts";
import type { Point } from "./Scene.ts";

/** An orthographic camera that looks slightly down on a ring lying flat, its up face (+z) upwards. Degrees. */
export interface Camera {
  /** Turn of the ring about its threefold axis, counter-clockwise seen from above. */
  readonly turn: number;
  /** Height of the camera above the ring's mean plane. */
  readonly elevation: number;
}

export interface ProjectedPoint extends Point {
  /** Distance towards the viewer, in the same pixels. */
  readonly depth: number;
}

/**
 * Projects a point in Å to the screen in px.
 *
 * With c the turned point: x = c.x, upwards = c.z cos ε + c.y sin ε, towards the viewer = c.z sin ε − c.y cos ε.
 */
export function projectPoint(
  camera: Camera,
  point: { readonly x: number; readonly y: number; readonly z: number },
): ProjectedPoint {
  const turn = (camera.turn * Math.PI) / 180;
  const elevation = (camera.elevation * Math.PI) / 180;
  const x = point.x * Math.cos(turn) - point.y * Math.sin(turn);
  const y = point.x * Math.sin(turn) + point.y * Math.cos(turn);
  return {
    x: SCALE * x,
    y: -SCALE * (point.z * Math.cos(elevation) + y * Math.sin(elevation)),
    depth: SCALE * (point.z * Math.sin(elevation) - y * Math.cos(elevation)),
  };
}
