import type { ChairView, RingBond } from "./ChairView.ts";
import { cameraFrame } from "./cameraFrame.ts";
import { drawnEnd } from "./drawnEnd.ts";
import { outwardDirection } from "./outwardDirection.ts";
import { projectPoint } from "./projectPoint.ts";
import type { RingCamera } from "./RingCamera.ts";
import { ringAxis } from "./ringAxis.ts";
import type { Point } from "./Scene.ts";
import type { SystemBody } from "./SystemBody.ts";
import { combine, dot, middleOf, type Vector } from "./Vector.ts";

/** Axes of chairs that differ by less than this, degrees, are drawn as one. */
const ONE_AXIS = 8;

/**
 * Looks at a ring system: the axis of the leading ring stands upright, and everything else stands where its bonds put
 * it.
 */
export function viewSystem(body: SystemBody, camera: RingCamera): ChairView {
  const places = body.vertices.map((vertex) => vertex.at);
  const lead = body.analysed.findIndex((each) => each.ring === camera.lead);
  const { frame, axis } = cameraFrame(
    body.rings[lead]!.map((vertex) => places[vertex]!),
    camera,
    body.analysed[lead]!.isChair,
  );
  const origin = middleOf(places);
  const see = (point: Vector) => projectPoint(frame, combine([1, point], [-1, origin]));
  const points = places.map(see);
  const seeEnd = endsAlongChairs(body, axis);
  return {
    group: `${body.conformer}/${camera.lead}`,
    vertices: body.vertices.map(({ atom, locant, letters }, index) => ({
      atom,
      locant,
      letters,
      at: points[index]!,
      outward: outwardDirection(index, points, body.bonds, body.rings),
    })),
    bonds: body.bonds.map(({ from, to, order, home }): RingBond => {
      return { from, to, order, side: order === 1 ? 1 : sideOf(points[from]!, points[to]!, home, points) };
    }),
    rings: body.rings,
    lead,
    branches: body.branches.map((branch) => ({ ...branch, end: see(seeEnd(branch.vertex, branch.end)) })),
  };
}

/** Where the bond from a vertex to a place is drawn to: along a textbook direction of a chair that it is close to. */
function endsAlongChairs(body: SystemBody, axis: Vector): (vertex: number, end: Vector) => Vector {
  const chairs = body.rings.slice(0, body.analysed.length).flatMap((ring, index) => {
    if (!body.analysed[index]!.isChair) return [];
    const atoms = ring.map((vertex) => body.vertices[vertex]!.at);
    const own = ringAxis(atoms);
    const upright = Math.abs(dot(own, axis)) > Math.cos((ONE_AXIS * Math.PI) / 180);
    return [{ ring, atoms, axis: upright ? axis : own }];
  });
  return (vertex, end) => {
    for (const chair of chairs) {
      const index = chair.ring.indexOf(vertex);
      const drawn = index < 0 ? end : drawnEnd(chair, index, end);
      if (drawn !== end) return drawn;
    }
    return end;
  };
}

/** The side of a bond on which a ring lies: 1 to the right on the way from `from` to `to`, −1 to the left. */
function sideOf(from: Point, to: Point, ring: readonly number[], points: readonly Point[]): 1 | -1 {
  const across = { x: from.y - to.y, y: to.x - from.x };
  const distances = ring.map(
    (vertex) => across.x * (points[vertex]!.x - from.x) + across.y * (points[vertex]!.y - from.y),
  );
  return distances.reduce((sum, distance) => sum + distance, 0) >= 0 ? 1 : -1;
}
