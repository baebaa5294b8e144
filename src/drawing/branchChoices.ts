import { labelText } from "../quantity/labelText.ts";
import type { Branch, Vertex } from "./ChairView.ts";
import { clipSegment } from "./clipSegment.ts";
import { growBox } from "./growBox.ts";
import type { LabelChoice } from "./LabelSlot.ts";
import { labelRuns } from "./labelRuns.ts";
import { BOND, CAP_HEIGHT, LABEL_GAP, LABEL_SIZE } from "./measures.ts";
import { placeText } from "./placeText.ts";
import { runBoxes } from "./runBoxes.ts";
import type { Point, SceneText } from "./Scene.ts";
import { textWidth } from "./textWidth.ts";

/** Lengths at which a bond may be drawn when its true end is crowded. */
const STRETCHES = [1, 1.15, 1.3, 1.5, 1.75];
/** A hydrogen, whose letter is small, may also stand nearer. */
const HYDROGEN_STRETCHES = [...STRETCHES, 0.8];
const STRETCH_COST = 14;
/** Bonds with less sideways run than this share of their length are steep: their label may go to either side. */
const STEEP = 0.35;
/** From this share on the label must continue in the direction of the bond. */
const SHALLOW = 0.8;
/** Half of a usual letter: a label beside a shallow bond begins this far before the attached atom's place. */
const HALF_LETTER = 0.32 * LABEL_SIZE;
/** A bond of which less than this is left between ring atom and letters, px, is too short to show its direction. */
const SHORTEST_STUB = 0.36 * BOND;
const STUB_COST = 1.2;

/**
 * Ways to label a group: reading to the right from the attached atom, or, reversed, to the left up to it, with
 * its bond at the true length or a little longer.
 */
export function branchChoices(vertex: Vertex, branch: Branch, group: string): readonly LabelChoice[] {
  const [dx, dy] = [branch.end.x - vertex.at.x, branch.end.y - vertex.at.y];
  const sideways = Math.abs(dx) / (Math.hypot(dx, dy) || 1);
  return (branch.atom === null ? HYDROGEN_STRETCHES : STRETCHES).flatMap((stretch) =>
    ([1, -1] as const).flatMap((side): LabelChoice[] => {
      const outward = dx === 0 || Math.sign(dx) === side;
      if (!outward && sideways > SHALLOW) return [];
      const to = { x: vertex.at.x + stretch * dx, y: vertex.at.y + stretch * dy };
      const text = setLabel(branch, side, sideways < STEEP, to, group, vertex.atom);
      const turn =
        sideways < STEEP ? (side === (Math.cos(vertex.outward) >= 0 ? 1 : -1) ? 0 : 1) : outward ? 0 : 5;
      return [
        {
          texts: [text],
          boxes: [text.box],
          core: text.box,
          bond: { from: vertex.at, to },
          cost: turn + STRETCH_COST * Math.abs(stretch - 1) + stubCost(vertex, to, text),
        },
      ];
    }),
  );
}

function stubCost(vertex: Vertex, to: Point, text: SceneText): number {
  const inside = runBoxes(text).map((box) => clipSegment(vertex.at, to, growBox(box, LABEL_GAP))?.[0] ?? 1);
  const stub = Math.min(...inside) * Math.hypot(to.x - vertex.at.x, to.y - vertex.at.y);
  return STUB_COST * Math.max(0, SHORTEST_STUB - stub);
}

function setLabel(
  branch: Branch,
  side: 1 | -1,
  steep: boolean,
  to: { readonly x: number; readonly y: number },
  group: string,
  vertexAtom: number,
): SceneText {
  const markup = side === 1 ? branch.label : branch.labelReversed;
  const inset = steep ? attachmentInset(markup, side) : HALF_LETTER;
  return placeText(labelRuns(markup, { size: LABEL_SIZE, ink: "ink" }), {
    at: { x: to.x - side * inset, y: to.y + (CAP_HEIGHT * LABEL_SIZE) / 2 },
    anchor: side === 1 ? "start" : "end",
    part: branch.atom === null ? "hydrogen label" : "group label",
    atoms: branch.atom === null ? [vertexAtom] : [vertexAtom, branch.atom],
    group,
  });
}

/**
 * From the outer edge of a label to the middle of the first letter of its attached atom or abbreviation. The
 * prefix of `t-Bu` or `i-Pr` hangs before that letter.
 */
function attachmentInset(markup: string, side: 1 | -1): number {
  const text = labelText(markup);
  const italic = /^\*[^*]+\*/.test(markup);
  if (side === 1) {
    const prefix = /^[a-z]+-/.exec(text)?.[0] ?? "";
    const head = prefix === "" ? 0 : prefixWidth(prefix, italic);
    return head + textWidth(text.charAt(prefix.length), LABEL_SIZE) / 2;
  }
  const unit = /[A-Z][a-z]?$/.exec(text)?.[0] ?? text.slice(-1);
  return textWidth(unit, LABEL_SIZE) - textWidth(unit.charAt(0), LABEL_SIZE) / 2;
}

function prefixWidth(prefix: string, italic: boolean): number {
  const letters = prefix.slice(0, -1);
  return textWidth(letters, LABEL_SIZE, italic ? "italic" : "regular") + textWidth("-", LABEL_SIZE);
}
