import type { Conformer, Dossier, Equilibrium } from "../dossier/Dossier.ts";
import { ARROW_LENGTH, arrowPair } from "./arrowPair.ts";
import { blockColumn } from "./blockColumn.ts";
import { boundsOf } from "./boundsOf.ts";
import type { ConformerBlock } from "./conformerBlock.ts";
import { labelRuns } from "./labelRuns.ts";
import { CAP_HEIGHT, LINE_HEIGHT, MAXIMUM_WIDTH, SMALL_SIZE, WORD_GAP } from "./measures.ts";
import { moveItems } from "./moveItems.ts";
import { placeText } from "./placeText.ts";
import type { Point, SceneItem } from "./Scene.ts";
import { wrapMarkup } from "./wrapMarkup.ts";

const ARROW_SPACE = ARROW_LENGTH + 22;

/** Two conformers beside each other, or one above the other where that would be too wide. */
export function conformerPair(
  dossier: Dossier,
  second: Conformer,
  a: ConformerBlock,
  b: ConformerBlock,
): readonly SceneItem[] {
  const equilibrium = dossier.equilibria.find((each) => each.to === second.id);
  const [left, right] = [blockColumn(a), blockColumn(b)];
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
    const relation = dossier.kinship.pairs.find(
      ({ first, second }) => first === equilibrium.from && second === equilibrium.to,
    )?.relation;
    return (relation ?? dossier.relation) === "enantiomeric" ? "mirror-image chairs" : "identical chairs";
  }
  return equilibrium.unresolved ? "major conformer unresolved" : "";
}

function blockItems(block: ConformerBlock): readonly SceneItem[] {
  return [...block.chairs, ...moveItems(block.words, 0, block.chairBounds.bottom + WORD_GAP)];
}
