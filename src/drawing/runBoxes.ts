import { placeText } from "./placeText.ts";
import type { Box, SceneText } from "./Scene.ts";

/** The room of each piece of a text by itself: tighter than the box of the whole where there are subscripts. */
export function runBoxes(text: SceneText): readonly Box[] {
  const left = text.box.left;
  return text.runs.map((run) => {
    const alone = placeText([{ ...run, x: 0 }], {
      at: { x: left + run.x, y: text.at.y },
      anchor: "start",
      part: text.part,
    });
    return alone.box;
  });
}
