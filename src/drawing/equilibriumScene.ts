import type { Conformer, Dossier, Equilibrium } from "../dossier/Dossier.ts";
import { ARROW_LENGTH, arrowPair } from "./arrowPair.ts";
import { boundsOf } from "./boundsOf.ts";
import { chooseCameras } from "./chooseCameras.ts";
import { type ConformerBlock, conformerBlock } from "./conformerBlock.ts";
import { describeConformers } from "./describeConformers.ts";
import type { FigureOptions } from "./FigureOptions.ts";
import { growBox } from "./growBox.ts";
import { labelRuns } from "./labelRuns.ts";
import { CAP_HEIGHT, LINE_HEIGHT, MARGIN, MAXIMUM_WIDTH, MOST_DRAWN, SMALL_SIZE } from "./measures.ts";
import { moveItems } from "./moveItems.ts";
import { placeText } from "./placeText.ts";
import type { Box, Point, Scene, SceneItem } from "./Scene.ts";
import { wrapMarkup } from "./wrapMarkup.ts";

const ARROW_SPACE = ARROW_LENGTH + 22;
const ROW_GAP = 26;
const WORD_GAP = 14;
const COLUMN_GAP = 28;

/** All conformers of a dossier with their populations, and the equilibrium between them. */
export function equilibriumScene(dossier: Dossier, options: FigureOptions = {}): Scene {
  if (dossier.conformers.length === 0) throw new RangeError(`${dossier.code} has no conformers to draw`);
  const drawn = dossier.conformers.slice(0, MOST_DRAWN);
  const hydrogens = options.hydrogens ?? false;
  const cameras = chooseCameras(dossier, hydrogens);
  const blockOptions = { hydrogens, locants: options.locants ?? true };
  const blocks = drawn.map((conformer) => conformerBlock(dossier, conformer, cameras, blockOptions));
  const items =
    drawn.length === 2
      ? drawPair(dossier, drawn[1]!, blocks[0]!, blocks[1]!)
      : drawRows(dossier, drawn, blocks);
  return {
    title: `Conformers of ${dossier.name}`,
    description: describeConformers(dossier),
    bounds: growBox(boundsOf(items)!, MARGIN),
    items,
  };
}

/** Two conformers beside each other, or one above the other where that would be too wide. */
function drawPair(
  dossier: Dossier,
  second: Conformer,
  a: ConformerBlock,
  b: ConformerBlock,
): readonly SceneItem[] {
  const equilibrium = dossier.equilibria.find((each) => each.to === second.id);
  const [left, right] = [columnOf(a), columnOf(b)];
  const width = left.right - left.left + ARROW_SPACE + right.right - right.left;
  if (width <= MAXIMUM_WIDTH) {
    const shift = left.right + ARROW_SPACE - right.left;
    const wordsTop = Math.max(a.chairBounds.bottom, b.chairBounds.bottom) + WORD_GAP;
    return [
      ...a.chairs,
      ...moveItems(a.words, 0, wordsTop),
      ...drawArrows(dossier, equilibrium, { x: left.right + ARROW_SPACE / 2, y: 0 }, false),
      ...moveItems(b.chairs, shift, 0),
      ...moveItems(b.words, shift, wordsTop),
    ];
  }
  const above = blockItems(a);
  const bottom = boundsOf(above)!.bottom;
  const arrowsAt = bottom + 18 + ARROW_LENGTH / 2;
  const down = arrowsAt + ARROW_LENGTH / 2 + 16 - b.chairBounds.top;
  return [
    ...above,
    ...drawArrows(dossier, equilibrium, { x: 0, y: arrowsAt }, true),
    ...moveItems(blockItems(b), 0, down),
  ];
}

/** One conformer, or more than two: in rows, each but the first headed by its equilibrium with the first. */
function drawRows(
  dossier: Dossier,
  drawn: readonly Conformer[],
  blocks: readonly ConformerBlock[],
): readonly SceneItem[] {
  const heads = blocks.map((block, index) => {
    const equilibrium = dossier.equilibria.find((each) => each.to === drawn[index]!.id);
    return index === 0 || equilibrium === undefined ? [] : heading(equilibrium, block.chairBounds.top);
  });
  const widest = Math.max(...blocks.map((block) => widthOf(columnOf(block))));
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

function drawArrows(
  dossier: Dossier,
  equilibrium: Equilibrium | undefined,
  centre: Point,
  vertical: boolean,
): readonly SceneItem[] {
  if (equilibrium === undefined) return [];
  const words = arrowWords(dossier, equilibrium);
  const width = ARROW_SPACE - 6;
  const arrows = arrowPair(equilibrium.bySymmetry ? 1 : equilibrium.K, centre, vertical);
  const lines = words === "" ? [] : vertical ? [words] : wrapMarkup(words, SMALL_SIZE, width);
  const notes = lines.map((line, index) =>
    placeText(labelRuns(line, { size: SMALL_SIZE, ink: "muted" }), {
      at: vertical
        ? { x: centre.x + 16, y: centre.y + (CAP_HEIGHT * SMALL_SIZE) / 2 }
        : { x: centre.x, y: centre.y + 24 + index * LINE_HEIGHT * SMALL_SIZE },
      anchor: vertical ? "start" : "middle",
      part: "arrow note",
    }),
  );
  return [...arrows, ...notes];
}

function arrowWords(dossier: Dossier, equilibrium: Equilibrium): string {
  if (equilibrium.bySymmetry) {
    return dossier.relation === "enantiomeric" ? "mirror-image chairs" : "identical chairs";
  }
  return equilibrium.unresolved ? "major conformer unresolved" : "";
}

function blockItems(block: ConformerBlock): readonly SceneItem[] {
  return [...block.chairs, ...moveItems(block.words, 0, block.chairBounds.bottom + WORD_GAP)];
}

function columnOf(block: ConformerBlock): Box {
  return boundsOf([...block.chairs, ...block.words])!;
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
