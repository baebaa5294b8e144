import type { CameraFrame } from "./projectPoint.ts";
import type { RingCamera } from "./RingCamera.ts";
import { ringAxis } from "./ringAxis.ts";
import { combine, cross, dot, middleOf, unit, type Vector } from "./Vector.ts";

/**
 * Directions of a camera for the coordinates of one conformer. The camera looks slightly down on the leading ring.
 *
 * @param lead - atoms of the leading ring, in the order of its list, Å.
 * @param isChair - whether it is a chair, in which the camera steps aside according to the atom at the right end. Other
 *   forms keep their flat parts when they flip, and these should stay where they are.
 * @returns also the leading ring's axis, which is vertical on the screen.
 */
export function cameraFrame(
  lead: readonly Vector[],
  camera: RingCamera,
  isChair: boolean,
): { readonly frame: CameraFrame; readonly axis: Vector } {
  const normal = ringAxis(lead);
  const axis = camera.above === "up" ? normal : combine([-1, normal]);
  const end = combine([1, lead[camera.rightEnd]!], [-1, middleOf(lead)]);
  const rise = dot(end, axis);
  const sideways = unit(combine([1, end], [-rise, axis]));
  const behind = cross(axis, sideways);
  const pointsUp = isChair ? rise > 0 : camera.above === "up";
  const turn = ((pointsUp ? camera.azimuth : -camera.azimuth) * Math.PI) / 180;
  const elevation = (camera.elevation * Math.PI) / 180;
  const away = combine([Math.sin(turn), sideways], [Math.cos(turn), behind]);
  return {
    axis,
    frame: {
      right: combine([Math.cos(turn), sideways], [-Math.sin(turn), behind]),
      up: combine([Math.cos(elevation), axis], [Math.sin(elevation), away]),
      towards: combine([Math.sin(elevation), axis], [-Math.cos(elevation), away]),
    },
  };
}
