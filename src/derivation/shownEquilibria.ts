import type { Conformer, Dossier, Equilibrium } from "../dossier/Dossier.ts";
import { shownConformers } from "./shownConformers.ts";

/** An equilibrium with both its partners. */
export interface ShownEquilibrium {
  readonly equilibrium: Equilibrium;
  readonly from: Conformer;
  readonly to: Conformer;
}

/** The equilibria between the first conformer and the others that are written out. */
export function shownEquilibria(dossier: Dossier): readonly ShownEquilibrium[] {
  const shown = shownConformers(dossier);
  const find = (id: string) => shown.find((conformer) => conformer.id === id);
  return dossier.equilibria.flatMap((equilibrium) => {
    const [from, to] = [find(equilibrium.from), find(equilibrium.to)];
    return from === undefined || to === undefined ? [] : [{ equilibrium, from, to }];
  });
}
