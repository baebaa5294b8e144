import { ASCENDER, CAP_HEIGHT, DESCENDER } from "./measures.ts";
import type { Part, Point, SceneText, TextAnchor, TextRun } from "./Scene.ts";

export interface TextPlace {
  readonly at: Point;
  readonly anchor: TextAnchor;
  readonly part: Part;
  readonly atoms?: readonly number[];
  readonly group?: string;
}

/** Puts pieces of text at a point and measures the room their letters take. */
export function placeText(runs: readonly TextRun[], place: TextPlace): SceneText {
  const last = runs.at(-1);
  const width = last === undefined ? 0 : last.x + last.width;
  const { at, anchor } = place;
  const left = at.x - (anchor === "start" ? 0 : anchor === "middle" ? width / 2 : width);
  const top = Math.max(0, ...runs.map((run) => heightOf(run) * run.size - run.dy));
  const bottom = Math.max(0, ...runs.map((run) => depthOf(run) * run.size + run.dy));
  return {
    kind: "text",
    part: place.part,
    atoms: place.atoms ?? [],
    group: place.group ?? "",
    runs,
    at,
    anchor,
    box: { left, top: at.y - top, right: left + width, bottom: at.y + bottom },
  };
}

function heightOf(run: TextRun): number {
  return /[bdfhkl()]/.test(run.text) ? ASCENDER : CAP_HEIGHT;
}

function depthOf(run: TextRun): number {
  return /[gjpqyQ,;()]/.test(run.text) ? DESCENDER : 0;
}
