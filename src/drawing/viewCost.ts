import type { ChairView } from "./ChairView.ts";
import { isInside } from "./isInside.ts";
import { BOND } from "./measures.ts";
import { pointSegmentGap } from "./pointSegmentGap.ts";
import type { ProjectedPoint } from "./projectPoint.ts";
import { ringAxis } from "./ringAxis.ts";

interface Segment {
  readonly from: ProjectedPoint;
  readonly to: ProjectedPoint;
  readonly ring: boolean;
  readonly double: boolean;
  readonly vertices: readonly number[];
}

/** Drawn share of a bond's length below which it is seen too nearly end on; price of none at all. */
const SHORT = 0.5;
const END_ON = 40;
const GROUP_END_ON = 22;
/** Price of two bonds that cross: ring bonds, and where a bond to a group is one of them. */
const CROSSING = 4;
const GROUP_CROSSING = 2.5;
/** Free space wanted between the end of a bond and another bond, px, and the price of each px less. */
const APART = 0.2 * BOND;
const CLOSE = 1.2;
/** The same from the middle of the letters at the end of a bond to a group. */
const LETTER_APART = 0.33 * BOND;
/** Bonds that meet should differ in direction by this angle, degrees, wider double ones by more; price of each less. */
const NARROW = 20;
const NARROW_DOUBLE = 38;
const ACUTE = 0.5;
/** A corner of a ring wider than this, degrees, is hardly seen; the price of each degree. */
const STRAIGHT = 160;
const FLAT = 0.4;
/** Price of a group, or of a hydrogen, that seems to stand inside a ring. */
const GROUP_INSIDE = 6;
const HYDROGEN_INSIDE = 2;
/** A ring whose axis points at the viewer by more than this cosine looks flat; the price of all beyond. */
const SLANTED = 0.5;
const FACE_ON = 16;
/** A ring whose axis is nearer than this cosine to the plane of the drawing is seen from its edge. */
const OPEN = 0.22;
const EDGE_ON = 30;

/** What a drawing of several rings suffers from bonds that cross, coincide, or are seen end on. */
export function viewCost(view: ChairView): number {
  const at = (vertex: number) => view.vertices[vertex]!.at;
  const segments: readonly Segment[] = [
    ...view.bonds.map(({ from, to }) => ({
      from: at(from),
      to: at(to),
      ring: true,
      double: false,
      vertices: [from, to],
    })),
    ...view.branches.map((branch) => ({
      from: at(branch.vertex),
      to: branch.end,
      ring: false,
      double: branch.order > 1,
      vertices: [branch.vertex],
    })),
  ];
  let cost = 0;
  for (const [index, segment] of segments.entries()) {
    cost += (segment.ring ? END_ON : GROUP_END_ON) * Math.max(0, SHORT - seenShare(segment));
    for (const other of segments.slice(0, index)) cost += pairCost(segment, other);
  }
  const outlines = view.rings.map((ring) => ring.map(at));
  for (const branch of view.branches) {
    const inside = outlines.filter((outline) => isInside(branch.end, outline)).length;
    cost += (branch.atom === null ? HYDROGEN_INSIDE : GROUP_INSIDE) * inside;
  }
  for (const vertex of view.vertices.keys()) {
    const [a, b, third] = segments.filter((segment) => segment.ring && segment.vertices.includes(vertex));
    if (a === undefined || b === undefined || third !== undefined) continue;
    cost += FLAT * Math.max(0, angleAt(a, b, vertex) - STRAIGHT);
  }
  for (const ring of view.rings) {
    const axis = ringAxis(ring.map(at).map(({ x, y, depth }) => ({ x, y, z: depth })));
    cost += FACE_ON * Math.max(0, Math.abs(axis.z) - SLANTED);
    cost += EDGE_ON * Math.max(0, OPEN - Math.abs(axis.z));
  }
  return cost;
}

function seenShare({ from, to }: Segment): number {
  const flat = Math.hypot(to.x - from.x, to.y - from.y);
  return flat / Math.hypot(flat, to.depth - from.depth);
}

function pairCost(a: Segment, b: Segment): number {
  const shared = a.vertices.find((vertex) => b.vertices.includes(vertex));
  if (shared !== undefined)
    return ACUTE * Math.max(0, (a.double || b.double ? NARROW_DOUBLE : NARROW) - angleAt(a, b, shared));
  if (farApart(a, b)) return 0;
  const crossing = a.ring && b.ring ? CROSSING : GROUP_CROSSING;
  const gap = Math.min(
    pointSegmentGap(a.from, b.from, b.to),
    pointSegmentGap(a.to, b.from, b.to),
    pointSegmentGap(b.from, a.from, a.to),
    pointSegmentGap(b.to, a.from, a.to),
  );
  return (meet(a, b) ? crossing : 0) + CLOSE * Math.max(0, APART - gap) + letterCost(a, b) + letterCost(b, a);
}

/** What the letters at the end of a bond to a group suffer from another bond. */
function letterCost(group: Segment, other: Segment): number {
  if (group.ring) return 0;
  return CLOSE * Math.max(0, LETTER_APART - pointSegmentGap(group.to, other.from, other.to));
}

/** Whether two bonds are so far from each other across or down that neither can cost anything. */
function farApart(a: Segment, b: Segment): boolean {
  return (["x", "y"] as const).some(
    (axis) =>
      Math.min(a.from[axis], a.to[axis]) - Math.max(b.from[axis], b.to[axis]) > LETTER_APART ||
      Math.min(b.from[axis], b.to[axis]) - Math.max(a.from[axis], a.to[axis]) > LETTER_APART,
  );
}

/** Angle in degrees between two bonds at the vertex where they meet. */
function angleAt(a: Segment, b: Segment, vertex: number): number {
  const away = ({ from, to, vertices }: Segment) => {
    const sense = vertices[0] === vertex ? 1 : -1;
    return Math.atan2(sense * (to.y - from.y), sense * (to.x - from.x));
  };
  const difference = Math.abs(away(a) - away(b));
  return (Math.min(difference, 2 * Math.PI - difference) * 180) / Math.PI;
}

function meet(a: Segment, b: Segment): boolean {
  const side = ({ from, to }: Segment, point: ProjectedPoint) =>
    (to.x - from.x) * (point.y - from.y) - (to.y - from.y) * (point.x - from.x);
  return side(a, b.from) * side(a, b.to) < 0 && side(b, a.from) * side(b, a.to) < 0;
}
