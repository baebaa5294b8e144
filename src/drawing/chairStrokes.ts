import type { LaidChair } from "./layChair.ts";
import { BACK_STROKE, BOND_STROKE, FRONT_STROKE } from "./measures.ts";
import type { Stroke } from "./Stroke.ts";

/**
 * The bonds of a chair as strokes of full length. The front edge is heavy, its neighbours taper from it, the
 * back is light; the bonds to groups are as light as the back and take the accent of their orientation.
 */
export function chairStrokes({ view, branches }: LaidChair): readonly Stroke[] {
  const { vertices, front } = view;
  const count = vertices.length;
  const ring = vertices.map((vertex, index): Stroke => {
    const next = (index + 1) % count;
    const isFront = index === front;
    return {
      from: vertex.at,
      to: vertices[next]!.at,
      width: isFront || index === (front + 1) % count ? FRONT_STROKE : BACK_STROKE,
      endWidth: isFront || next === front ? FRONT_STROKE : BACK_STROKE,
      ink: "ink",
      part: "ring bond",
      atoms: [vertex.atom, vertices[next]!.atom],
      vertices: [index, next],
    };
  });
  const bonds = view.branches.map((branch, index): Stroke => {
    const vertex = vertices[branch.vertex]!;
    const isHydrogen = branch.atom === null;
    return {
      from: vertex.at,
      to: { ...branches[index]!.bond!.to, depth: branch.end.depth },
      width: BOND_STROKE,
      endWidth: BOND_STROKE,
      ink: isHydrogen ? "ink" : branch.orientation,
      part: isHydrogen ? "hydrogen bond" : `${branch.orientation} bond`,
      atoms: isHydrogen ? [vertex.atom] : [vertex.atom, branch.atom!],
      vertices: [branch.vertex],
    };
  });
  return [...ring, ...bonds];
}
