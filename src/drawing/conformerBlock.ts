import type { Conformer, Dossier } from "../dossier/Dossier.ts";
import { formatPopulation } from "../quantity/formatPopulation.ts";
import { boundsOf } from "./boundsOf.ts";
import { chairItems } from "./chairItems.ts";
import { conformerLabelRuns } from "./conformerLabelRuns.ts";
import { labelRuns } from "./labelRuns.ts";
import { layChair } from "./layChair.ts";
import { CAP_HEIGHT, LINE_HEIGHT, MAXIMUM_WIDTH, SMALL_SIZE, TEXT_SIZE } from "./measures.ts";
import { moveItems } from "./moveItems.ts";
import { placeSystem } from "./placeSystem.ts";
import { placeText } from "./placeText.ts";
import type { RingCamera } from "./RingCamera.ts";
import type { Box, Part, SceneItem, SceneText, TextRun } from "./Scene.ts";
import { viewSystem } from "./viewSystem.ts";
import { wrapLabel } from "./wrapLabel.ts";

/** A conformer ready to be set into a figure: chairs centred on the origin, words to be set beneath. */
export interface ConformerBlock {
  readonly chairs: readonly SceneItem[];
  readonly chairBounds: Box;
  /** Lines of text, each centred on the origin, the first with its capitals' top at y = 0. */
  readonly words: readonly SceneText[];
  readonly wordBounds: Box;
}

export interface BlockOptions {
  readonly hydrogens: boolean;
  readonly locants: boolean;
}

/** Between the chairs of two rings of one conformer. */
const RING_GAP = 20;

/** Draws every ring system of a conformer, side by side where there is room, with its label and population. */
export function conformerBlock(
  dossier: Dossier,
  conformer: Conformer,
  cameras: readonly RingCamera[],
  options: BlockOptions,
): ConformerBlock {
  const chairs = dossier.systems.map((system, index): RingDrawing => {
    const view = viewSystem(placeSystem(dossier, conformer, system, options.hydrogens), cameras[index]!);
    const first = Math.min(...system.rings) + 1;
    const last = Math.max(...system.rings) + 1;
    return {
      items: chairItems(layChair(view), options),
      caption: first === last ? `ring ${first}` : `rings ${first}–${last}`,
      group: view.group,
    };
  });
  const items = sideBySide(chairs);
  const words = wordsOf(dossier, conformer);
  return { chairs: items, chairBounds: boundsOf(items)!, words, wordBounds: boundsOf(words)! };
}

interface RingDrawing {
  readonly items: readonly SceneItem[];
  readonly caption: string;
  readonly group: string;
}

/** Rings in a row about the origin; a ring that would make the row too wide begins the next row. */
function sideBySide(chairs: readonly RingDrawing[]): readonly SceneItem[] {
  const [only] = chairs;
  // A single ring keeps its centre on the origin, so that the two chairs of a flip stand in line.
  if (chairs.length === 1 && only !== undefined) return only.items;
  const rows: { readonly chairs: (RingDrawing & { readonly centre: number })[]; width: number }[] = [];
  for (const chair of chairs) {
    const box = boundsOf(chair.items)!;
    const width = box.right - box.left;
    let row = rows.at(-1);
    if (row === undefined || row.width + RING_GAP + width > MAXIMUM_WIDTH) {
      row = { chairs: [], width: -RING_GAP };
      rows.push(row);
    }
    row.chairs.push({ ...chair, centre: row.width + RING_GAP - box.left });
    row.width += RING_GAP + width;
  }
  let below = 0;
  return rows.flatMap((row, index) => {
    const items = row.chairs.flatMap((chair) => moveItems(chair.items, chair.centre, 0));
    const box = boundsOf(items)!;
    const captions = row.chairs.map((chair) => ringCaption(chair, box.bottom));
    const down = index === 0 ? 0 : below + RING_GAP - box.top;
    below = down + boundsOf(captions)!.bottom;
    return moveItems([...items, ...captions], -(box.left + box.right) / 2, down);
  });
}

function ringCaption(chair: { caption: string; group: string; centre: number }, below: number): SceneText {
  return placeText(labelRuns(chair.caption, { size: SMALL_SIZE, ink: "muted" }), {
    at: { x: chair.centre, y: below + 6 + CAP_HEIGHT * SMALL_SIZE },
    anchor: "middle",
    part: "ring caption",
    group: chair.group,
  });
}

function wordsOf(dossier: Dossier, conformer: Conformer): readonly SceneText[] {
  const population = formatPopulation(conformer.population, conformer.population95);
  const name: TextRun[] = [
    ...labelRuns(`${conformer.id}\u2002`, { size: TEXT_SIZE, ink: "ink", bold: true }),
  ];
  const lines = wrapLabel(conformer.label, TEXT_SIZE, Math.max(150, 150 * dossier.systems.length));
  const rows: { readonly runs: readonly TextRun[]; readonly part: Part }[] = [
    { runs: join(name, conformerLabelRuns(lines[0] ?? "", TEXT_SIZE)), part: "conformer label" },
    ...lines
      .slice(1)
      .map((line) => ({ runs: conformerLabelRuns(line, TEXT_SIZE), part: "conformer label" as const })),
    { runs: labelRuns(population, { size: TEXT_SIZE, ink: "ink" }), part: "population" },
  ];
  return rows.map(({ runs, part }, index) =>
    placeText(runs, {
      at: { x: 0, y: CAP_HEIGHT * TEXT_SIZE + index * LINE_HEIGHT * TEXT_SIZE },
      anchor: "middle",
      part,
      group: conformer.id,
    }),
  );
}

function join(first: readonly TextRun[], second: readonly TextRun[]): readonly TextRun[] {
  const last = first.at(-1);
  const shift = last === undefined ? 0 : last.x + last.width;
  return [...first, ...second.map((run) => ({ ...run, x: run.x + shift }))];
}
