import { labelRuns } from "./labelRuns.ts";
import { CAP_HEIGHT, SMALL_SIZE } from "./measures.ts";
import { placeText } from "./placeText.ts";
import type { Ink, Part, Point, SceneText, TextAnchor } from "./Scene.ts";

/** A short text of a plot, its capitals centred on the point's height. */
export function plotText(
  markup: string,
  at: Point,
  anchor: TextAnchor,
  part: Part,
  style: { readonly ink?: Ink; readonly bold?: boolean; readonly size?: number } = {},
): SceneText {
  const size = style.size ?? SMALL_SIZE;
  return placeText(labelRuns(markup, { size, ink: style.ink ?? "ink", bold: style.bold ?? false }), {
    at: { x: at.x, y: at.y + (CAP_HEIGHT * size) / 2 },
    anchor,
    part,
  });
}
