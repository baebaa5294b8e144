import { chairStrokes } from "./chairStrokes.ts";
import { clipSegment } from "./clipSegment.ts";
import { crossingGap } from "./crossingGap.ts";
import { cutStroke, type Span } from "./cutStroke.ts";
import { growBox } from "./growBox.ts";
import type { LaidChair } from "./layChair.ts";
import { LABEL_GAP } from "./measures.ts";
import { orientationCues } from "./orientationCues.ts";
import { ringLocants } from "./ringLocants.ts";
import { runBoxes } from "./runBoxes.ts";
import type { Box, SceneItem, SceneLine, SceneText } from "./Scene.ts";

/** Everything drawn of one chair, farthest first, ring centre at the origin. */
export function chairItems(laid: LaidChair, options: { readonly locants: boolean }): readonly SceneItem[] {
  const { view } = laid;
  const strokes = chairStrokes(laid);
  const texts: readonly SceneText[] = [
    ...laid.branches.flatMap((branch) => branch.texts),
    ...[...laid.letters.values()].flatMap((letters) => letters.texts),
  ];
  const cores = [...laid.letters.values()].map((letters) => letters.core);
  const keepClear: readonly Box[] = [...texts.flatMap(runBoxes), ...cores].map((box) =>
    growBox(box, LABEL_GAP),
  );

  const lines = strokes.flatMap((stroke): readonly SceneLine[] => {
    const crossed = strokes.map((other) => (other === stroke ? null : crossingGap(stroke, other)));
    const lettered = keepClear.map((box) => clipSegment(stroke.from, stroke.to, box));
    const gaps = [...crossed, ...lettered].filter((gap): gap is Span => gap !== null);
    return cutStroke(stroke, gaps, view.group);
  });
  lines.sort((a, b) => middleDepth(a) - middleDepth(b));

  const boxes = texts.map((text) => text.box);
  const cues = orientationCues(laid, { lines, boxes, small: [] });
  const locants = options.locants
    ? ringLocants(laid, { lines, boxes, small: cues.map((cue) => cue.box) })
    : [];
  return [...lines, ...texts, ...cues, ...locants];
}

function middleDepth(line: SceneLine): number {
  return line.depth === null ? 0 : (line.depth[0] + line.depth[1]) / 2;
}
