import type { Conformer, Dossier, Equilibrium } from "../dossier/Dossier.ts";
import { arrowPair } from "./arrowPair.ts";
import { blockColumn } from "./blockColumn.ts";
import { boundsOf } from "./boundsOf.ts";
import type { ConformerBlock } from "./conformerBlock.ts";
import { labelRuns } from "./labelRuns.ts";
import { CAP_HEIGHT, LINE_HEIGHT, MAXIMUM_WIDTH, SMALL_SIZE, WORD_GAP } from "./measures.ts";
import { moveItems } from "./moveItems.ts";
import { placeText } from "./placeText.ts";
import type { Box, SceneItem } from "./Scene.ts";
import { wrapMarkup } from "./wrapMarkup.ts";

const ROW_GAP = 26;
const COLUMN_GAP = 28;

/** One conformer, or more than two: in rows, each but the first headed by its equilibrium with the first. */
export function conformerRows(
  dossier: Dossier,
  drawn: readonly Conformer[],
  blocks: readonly ConformerBlock[],
): readonly SceneItem[] {
  const heads = blocks.map((block, index) => {
    const equilibrium = dossier.equilibria.find((each) => each.to === drawn[index]!.id);
    return index === 0 || equilibrium === undefined ? [] : heading(equilibrium, block.chairBounds.top);
  });
  const widest = Math.max(...blocks.map((block) => widthOf(blockColumn(block))));
  const fitting = Math.floor((MAXIMUM_WIDTH + COLUMN_GAP) / (widest + COLUMN_GAP));
  const columns = Math.max(1, Math.min(blocks.length, fitting));
  const items: SceneItem[] = [];
  let below = 0;
  for (let start = 0; start < blocks.length; start += columns) {
    const row = blocks.slice(start, start + columns);
    // Words of one row stand on one line, below its deepest chair.
    const wordsTop = Math.max(...row.map((block) => block.chairBounds.bottom)) + WORD_GAP;
    const cells = row.map((block, column) => [
      ...(heads[start + column] ?? []),
      ...block.chairs,
      ...moveItems(block.words, 0, wordsTop),
    ]);
    const down = start === 0 ? 0 : below + ROW_GAP - Math.min(...cells.map((cell) => boundsOf(cell)!.top));
    for (const [column, cell] of cells.entries()) {
      items.push(...moveItems(cell, column * (widest + COLUMN_GAP), down));
    }
    below = boundsOf(items)!.bottom;
  }
  const rest = dossier.conformers.length - drawn.length;
  if (rest > 0)
    items.push(
      ...noteLines(
        `and ${rest} more conformer${rest === 1 ? "" : "s"}, listed in the table`,
        boundsOf(items)!,
      ),
    );
  return items;
}

function heading(equilibrium: Equilibrium, chairTop: number): readonly SceneItem[] {
  const y = chairTop - 18;
  const word = (text: string, x: number) =>
    placeText(labelRuns(text, { size: SMALL_SIZE, ink: "muted", bold: true }), {
      at: { x, y: y + (CAP_HEIGHT * SMALL_SIZE) / 2 },
      anchor: "middle",
      part: "arrow note",
      group: equilibrium.to,
    });
  const arrows = arrowPair(equilibrium.K, { x: 0, y }, false, 36).map((item) => ({
    ...item,
    group: equilibrium.to,
  }));
  return [word(equilibrium.from, -30), ...arrows, word(equilibrium.to, 30)];
}

function widthOf(box: Box): number {
  return box.right - box.left;
}

function noteLines(words: string, above: Box): readonly SceneItem[] {
  return wrapMarkup(words, SMALL_SIZE, widthOf(above)).map((line, index) =>
    placeText(labelRuns(line, { size: SMALL_SIZE, ink: "muted" }), {
      at: { x: (above.left + above.right) / 2, y: above.bottom + 22 + index * LINE_HEIGHT * SMALL_SIZE },
      anchor: "middle",
      part: "note",
    }),
  );
}
