import type { Dossier } from "../dossier/Dossier.ts";
import { boundsOf } from "./boundsOf.ts";
import { chooseCameras } from "./chooseCameras.ts";
import { conformerBlock } from "./conformerBlock.ts";
import { conformerPair } from "./conformerPair.ts";
import { conformerRows } from "./conformerRows.ts";
import { describeConformers } from "./describeConformers.ts";
import type { FigureOptions } from "./FigureOptions.ts";
import { growBox } from "./growBox.ts";
import { MARGIN, MOST_DRAWN } from "./measures.ts";
import type { Scene } from "./Scene.ts";

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
      ? conformerPair(dossier, drawn[1]!, blocks[0]!, blocks[1]!)
      : conformerRows(dossier, drawn, blocks);
  return {
    title: `Conformers of ${dossier.name}`,
    description: describeConformers(dossier),
    bounds: growBox(boundsOf(items)!, MARGIN),
    items,
  };
}
