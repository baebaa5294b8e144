import type { Dossier } from "../dossier/Dossier.ts";
import { boundsOf } from "./boundsOf.ts";
import { describeStructure } from "./describeStructure.ts";
import type { FigureOptions } from "./FigureOptions.ts";
import { flatAtoms } from "./flatAtoms.ts";
import { flatBondItems } from "./flatBondItems.ts";
import { flatLocants } from "./flatLocants.ts";
import { growBox } from "./growBox.ts";
import { MARGIN } from "./measures.ts";
import type { Scene, SceneItem } from "./Scene.ts";

/** The flat diagram that carries the configuration: solid wedges towards the viewer, hashed ones away. */
export function wedgeScene(dossier: Dossier, options: FigureOptions = {}): Scene {
  const { structure } = dossier;
  const atoms = flatAtoms(structure);
  const bonds = structure.bonds.flatMap((bond) => flatBondItems(bond, structure, atoms));
  const letters = atoms.flatMap((atom) => atom.texts);
  const locants = options.locants === false ? [] : flatLocants(dossier, atoms, bonds);
  const items: readonly SceneItem[] = [...bonds, ...letters, ...locants];
  return {
    title: `Structural diagram of ${dossier.name}`,
    description: describeStructure(dossier),
    bounds: growBox(boundsOf(items) ?? { left: 0, top: 0, right: 0, bottom: 0 }, MARGIN),
    items,
  };
}
