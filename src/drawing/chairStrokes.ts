import type { RingBond } from "./ChairView.ts";
import { frontBond } from "./frontBond.ts";
import type { LaidChair } from "./layChair.ts";
import { BACK_STROKE, BOND_STROKE, DOUBLE_GAP, FRONT_STROKE } from "./measures.ts";
import type { ProjectedPoint } from "./projectPoint.ts";
import type { Point } from "./Scene.ts";
import type { Stroke } from "./Stroke.ts";

/** How much the inner line of a double bond is shortened at either end, as a share of its length. */
const SHORTENED = 0.12;

/**
 * The bonds of a chair as strokes of full length. The front edge of each ring is heavy, its neighbours taper from it,
 * the back is light; the bonds to groups are as light as the back and take the accent of their orientation.
 * A double bond is two strokes: in a ring the second lies inside, beside the first.
 */
export function chairStrokes({ view, branches }: LaidChair): readonly Stroke[] {
  const { vertices } = view;
  const widthAt = endWidths(view);
  const ring = view.bonds.flatMap((bond): Stroke[] => {
    const [a, b] = [vertices[bond.from]!, vertices[bond.to]!];
    const single: Stroke = {
      from: a.at,
      to: b.at,
      width: widthAt(bond, bond.from),
      endWidth: widthAt(bond, bond.to),
      ink: "ink",
      part: "ring bond",
      atoms: [a.atom, b.atom],
      vertices: [bond.from, bond.to],
    };
    const beside = (side: number): Stroke => ({
      ...single,
      ...shifted(a.at, b.at, side * DOUBLE_GAP, SHORTENED),
      width: BACK_STROKE,
      endWidth: BACK_STROKE,
    });
    if (bond.order === 1) return [single];
    return bond.order === 2 ? [single, beside(bond.side)] : [single, beside(1), beside(-1)];
  });
  const bonds = view.branches.flatMap((branch, index): Stroke[] => {
    const vertex = vertices[branch.vertex]!;
    const isHydrogen = branch.atom === null;
    const to = { ...branches[index]!.bond!.to, depth: branch.end.depth };
    const single: Stroke = {
      from: vertex.at,
      to,
      width: BOND_STROKE,
      endWidth: BOND_STROKE,
      ink: isHydrogen ? "ink" : (branch.orientation ?? "ink"),
      part: isHydrogen
        ? "hydrogen bond"
        : branch.orientation === null
          ? "group bond"
          : `${branch.orientation} bond`,
      atoms: isHydrogen ? [vertex.atom] : [vertex.atom, branch.atom!],
      vertices: [branch.vertex],
    };
    const sides = branch.order === 1 ? [0] : branch.order === 2 ? [0.5, -0.5] : [1, 0, -1];
    return sides.map((side) => ({ ...single, ...shifted(vertex.at, to, side * DOUBLE_GAP, 0) }));
  });
  return [...ring, ...bonds];
}

/** Width of a ring bond at one of its ends: heavy where it belongs to the front edge of a ring or meets it. */
function endWidths(view: LaidChair["view"]): (bond: RingBond, end: number) => number {
  const heavy = new Set<string>();
  for (const ring of view.rings) {
    const front = frontBond(view.vertices, ring);
    const at = (step: number) => ring[(front + step + ring.length) % ring.length]!;
    const [before, first, second, after] = [at(-1), at(0), at(1), at(2)];
    for (const [from, to, end] of [
      [first, second, first],
      [first, second, second],
      [before, first, first],
      [second, after, second],
    ]) {
      heavy.add(`${from}-${to}@${end}`);
      heavy.add(`${to}-${from}@${end}`);
    }
  }
  return (bond, end) => (heavy.has(`${bond.from}-${bond.to}@${end}`) ? FRONT_STROKE : BACK_STROKE);
}

function normal(from: Point, to: Point): Point {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  return { x: -(to.y - from.y) / length, y: (to.x - from.x) / length };
}

/** The same line a little to one side, cut short at both ends by a share of its length. */
function shifted(
  from: ProjectedPoint,
  to: ProjectedPoint,
  by: number,
  cut: number,
): { readonly from: ProjectedPoint; readonly to: ProjectedPoint } {
  const across = normal(from, to);
  const along = (share: number): ProjectedPoint => ({
    x: from.x + share * (to.x - from.x) + by * across.x,
    y: from.y + share * (to.y - from.y) + by * across.y,
    depth: from.depth + share * (to.depth - from.depth),
  });
  return { from: along(cut), to: along(1 - cut) };
}
