import type { Conformer } from "../dossier/Dossier.ts";
import type { Ink } from "./Scene.ts";

export interface CurveStyle {
  readonly ink: Ink;
  readonly dash: readonly number[];
}

/** For conformers that are neither all axial nor all equatorial: told apart by their dashes alone. */
const MIXED: readonly (readonly number[])[] = [[], [2, 3], [9, 3, 2, 3], [5, 2], [1, 2], [9, 3, 2, 3, 2, 3]];

/**
 * How the curve of each conformer is drawn. The accents keep their meaning: teal and dashed where every group is
 * equatorial, orange and solid where every group is axial, ink with a dash of its own otherwise.
 */
export function curveStyle(conformers: readonly Conformer[], index: number): CurveStyle {
  const kinds = conformers.map((conformer) => {
    const [first, ...others] = conformer.positions.map((position) => position.orientation);
    return first !== undefined && others.every((each) => each === first) ? first : "ink";
  });
  const kind = kinds[index] ?? "ink";
  if (kind === "equatorial" && kinds.indexOf(kind) === index) return { ink: kind, dash: [7, 4] };
  if (kind === "axial" && kinds.indexOf(kind) === index) return { ink: kind, dash: [] };
  const before = kinds
    .slice(0, index)
    .filter((each, at) => each === "ink" || kinds.indexOf(each) !== at).length;
  return { ink: "ink", dash: MIXED[before % MIXED.length]! };
}
