import type { Dossier } from "../dossier/Dossier.ts";
import { boundsOf } from "./boundsOf.ts";
import { chooseCameras } from "./chooseCameras.ts";
import { conformerBlock } from "./conformerBlock.ts";
import { describeConformer } from "./describeConformer.ts";
import type { FigureOptions } from "./FigureOptions.ts";
import { growBox } from "./growBox.ts";
import { MARGIN, WORD_GAP } from "./measures.ts";
import { moveItems } from "./moveItems.ts";
import type { Scene } from "./Scene.ts";

/** One conformer: the chair of each ring, drawn through the camera that all conformers of the dossier share. */
export function chairScene(dossier: Dossier, conformerId: string, options: FigureOptions = {}): Scene {
  const conformer = dossier.conformers.find((each) => each.id === conformerId);
  if (conformer === undefined) throw new RangeError(`${dossier.code} has no conformer ${conformerId}`);
  const hydrogens = options.hydrogens ?? false;
  const cameras = chooseCameras(dossier, hydrogens);
  const block = conformerBlock(dossier, conformer, cameras, { hydrogens, locants: options.locants ?? true });
  const items = [...block.chairs, ...moveItems(block.words, 0, block.chairBounds.bottom + WORD_GAP)];
  return {
    title: `Conformer ${conformer.id} of ${dossier.name}`,
    description: describeConformer(dossier, conformer),
    bounds: growBox(boundsOf(items)!, MARGIN),
    items,
  };
}
