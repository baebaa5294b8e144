import type { Vertex } from "./ChairView.ts";
import type { LabelChoice } from "./LabelSlot.ts";
import { labelRuns } from "./labelRuns.ts";
import { CAP_HEIGHT, LABEL_SIZE } from "./measures.ts";
import { placeText } from "./placeText.ts";
import type { Box, Point, SceneText, TextAnchor } from "./Scene.ts";

const HEIGHT = CAP_HEIGHT * LABEL_SIZE;
/** From the baseline of a letter to that of a hydrogen set above or below it. */
const STACK = HEIGHT + 3;

/**
 * Ways to set the letters of a ring atom: the element stands on the corner, its hydrogens to the right, to the
 * left, below or above, its charge behind the element.
 */
export function vertexChoices(vertex: Vertex, group: string): readonly LabelChoice[] {
  const { letters } = vertex;
  if (letters === null) return [];
  const { element, hydrogens, charge } = letters;
  const style = { size: LABEL_SIZE, ink: "ink" } as const;
  const width = (markup: string) => {
    const last = labelRuns(markup, style).at(-1);
    return last === undefined ? 0 : last.x + last.width;
  };
  // A mass number hangs before the letter that stands on the corner.
  const prefix = width(element) - width(element.replace(/^\^\d+/, ""));
  const half = (width(element) - prefix) / 2;
  const middle: Point = { x: vertex.at.x, y: vertex.at.y + HEIGHT / 2 };
  const core: Box = {
    left: middle.x - half - prefix,
    right: middle.x + half,
    top: middle.y - HEIGHT,
    bottom: middle.y,
  };
  const set = (markup: string, x: number, y: number, anchor: TextAnchor): SceneText =>
    placeText(labelRuns(markup, style), {
      at: { x, y },
      anchor,
      part: "atom label",
      atoms: [vertex.atom],
      group,
    });
  const choice = (texts: readonly SceneText[], boxes: readonly Box[], cost: number): LabelChoice => ({
    texts,
    boxes,
    core,
    bond: null,
    cost,
  });
  const withCharge = set(element + charge, core.left, middle.y, "start");
  const chargeBox = charge === "" ? [] : [{ ...withCharge.box, left: core.right }];
  if (hydrogens === "") return [choice([withCharge], chargeBox, 0)];

  const right = set(element + hydrogens + charge, core.left, middle.y, "start");
  const left = set(hydrogens + element + charge, core.right + width(charge), middle.y, "end");
  const stacked = ([1, -1] as const).map((down) => {
    // The H itself, not its subscript, stands under or over the element.
    const hydrogen = set(hydrogens, middle.x - width("H") / 2, middle.y + down * STACK, "start");
    const outward = down === (Math.sin(vertex.outward) >= 0 ? 1 : -1);
    return choice([withCharge, hydrogen], [...chargeBox, hydrogen.box], outward ? 2 : 4);
  });
  return [
    choice([right], [{ ...right.box, left: core.right }], Math.cos(vertex.outward) >= 0 ? 0 : 3),
    choice([left], [{ ...left.box, right: core.left }, ...chargeBox], Math.cos(vertex.outward) < 0 ? 0 : 3),
    ...stacked,
  ];
}
