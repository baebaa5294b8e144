import { freePlace } from "./freePlace.ts";
import type { Ground } from "./Ground.ts";
import { labelRuns } from "./labelRuns.ts";
import type { LaidChair } from "./layChair.ts";
import { SMALL_SIZE } from "./measures.ts";
import { placeText } from "./placeText.ts";
import type { SceneText } from "./Scene.ts";

/** Places tried along a bond, as shares of its length, and beside it, px from the line to the letter's middle. */
const ALONG = [0.55, 0.48, 0.62, 0.4, 0.7, 0.32];
const BESIDE = [6.5, 8];
/** Small letters have no ascender: their middle is at half the x-height. */
const X_HEIGHT = 0.49;
/** Width of one small letter, px. */
const LETTER = 0.5 * SMALL_SIZE;

/** The letter a or e beside the bond to each group, in the accent of its orientation: the cue that needs no colour. */
export function orientationCues({ view, branches }: LaidChair, ground: Ground): readonly SceneText[] {
  const cues: SceneText[] = [];
  for (const [index, branch] of view.branches.entries()) {
    if (branch.atom === null || branch.cue === "") continue;
    const { from, to } = branches[index]!.bond!;
    const length = Math.hypot(to.x - from.x, to.y - from.y);
    const across = { x: -(to.y - from.y) / length, y: (to.x - from.x) / length };
    const runs = labelRuns(branch.cue, { size: SMALL_SIZE, ink: branch.orientation ?? "ink" });
    // Several letters need more room beside a steep bond than one.
    const last = runs.at(-1)!;
    const wider = branch.cue.length > 1 ? (Math.abs(across.x) * (last.x + last.width - LETTER)) / 2 : 0;
    const places = ALONG.flatMap((along, order) =>
      BESIDE.flatMap((beside) =>
        [1, -1].map((side) => {
          const x = from.x + along * (to.x - from.x) + side * (beside + wider) * across.x;
          const y = from.y + along * (to.y - from.y) + side * (beside + wider) * across.y;
          const text = placeText(runs, {
            at: { x, y: y + (X_HEIGHT * SMALL_SIZE) / 2 },
            anchor: "middle",
            part: "orientation cue",
            atoms: [view.vertices[branch.vertex]!.atom, branch.atom!],
            group: view.group,
          });
          // Capitals' room is more than these letters take; the overshoot would push them off their bond.
          const box = { ...text.box, top: text.box.bottom - (X_HEIGHT + 0.02) * SMALL_SIZE };
          return { text: { ...text, box }, cost: order * 0.6 + (beside - BESIDE[0]!) };
        }),
      ),
    );
    cues.push(
      freePlace(places, {
        lines: ground.lines,
        boxes: ground.boxes,
        small: [...ground.small, ...cues.map((cue) => cue.box)],
      }),
    );
  }
  return cues;
}
