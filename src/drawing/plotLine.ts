import { HAIRLINE } from "./measures.ts";
import type { Ink, Part, Point, SceneLine } from "./Scene.ts";

/** A straight line of a plot; hairline and solid unless asked otherwise. */
export function plotLine(
  from: Point,
  to: Point,
  part: Part,
  style: { readonly ink?: Ink; readonly width?: number; readonly dash?: readonly number[] } = {},
): SceneLine {
  const width = style.width ?? HAIRLINE;
  return {
    kind: "line",
    part,
    atoms: [],
    group: "",
    from,
    to,
    width,
    endWidth: width,
    ink: style.ink ?? "ink",
    dash: style.dash ?? [],
    depth: null,
  };
}
