import type { Conformer } from "../dossier/Dossier.ts";
import { conformerLabelRuns } from "./conformerLabelRuns.ts";
import { labelRuns } from "./labelRuns.ts";
import { CAP_HEIGHT, SMALL_SIZE } from "./measures.ts";
import { placeText } from "./placeText.ts";
import type { Ink, Point, SceneText, TextRun } from "./Scene.ts";

/** Distance kept between the middles of two labels, px. */
const SPACING = 18;
/** A conformer's label longer than this is left to the figure's caption. */
const LONGEST = 96;

/** Names of the curves beside their right ends, moved apart up and down where ends come close. */
export function curveLabels(
  ends: readonly { readonly conformer: Conformer; readonly at: Point; readonly ink: Ink }[],
  area: { readonly left: number; readonly top: number; readonly bottom: number },
): readonly SceneText[] {
  const merged: { ids: string[]; label: string; y: number; ink: Ink }[] = [];
  for (const { conformer, at, ink } of [...ends].sort((a, b) => a.at.y - b.at.y)) {
    const same = merged.at(-1);
    // Curves on top of each other, as for chairs equal by symmetry, share a label.
    if (same !== undefined && Math.abs(same.y - at.y) < 0.5) {
      same.ids.push(conformer.id);
      same.label = "";
      same.ink = "ink";
    } else merged.push({ ids: [conformer.id], label: conformer.label, y: at.y, ink });
  }
  const heights = spread(
    merged.map((each) => each.y),
    area.top,
    area.bottom,
  );
  return merged.map(({ ids, label, ink }, index) => {
    const name = labelRuns([...ids].sort().join(" and "), { size: SMALL_SIZE, ink, bold: true });
    const full =
      ids.length > 1 || label === "" ? name : joined(name, conformerLabelRuns(`\u2002${label}`, SMALL_SIZE));
    const last = full.at(-1)!;
    return placeText(last.x + last.width > LONGEST && ids.length === 1 ? name : full, {
      at: { x: area.left, y: heights[index]! + (CAP_HEIGHT * SMALL_SIZE) / 2 },
      anchor: "start",
      part: "curve label",
      group: ids[0]!,
    });
  });
}

/** Heights in rising order moved apart to the wanted spacing, pushed down first and then back up from the end. */
function spread(heights: readonly number[], top: number, bottom: number): readonly number[] {
  const moved = [...heights];
  for (let index = 0; index < moved.length; index++) {
    moved[index] = Math.max(moved[index]!, index === 0 ? top : moved[index - 1]! + SPACING);
  }
  for (let index = moved.length - 1; index >= 0; index--) {
    moved[index] = Math.min(moved[index]!, index === moved.length - 1 ? bottom : moved[index + 1]! - SPACING);
  }
  return moved;
}

function joined(first: readonly TextRun[], second: readonly TextRun[]): readonly TextRun[] {
  const last = first.at(-1);
  const shift = last === undefined ? 0 : last.x + last.width;
  return [...first, ...second.map((run) => ({ ...run, x: run.x + shift }))];
}
