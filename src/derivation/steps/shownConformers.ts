import type { Conformer, Dossier, Equilibrium } from "../../dossier/Dossier.ts";

/** Conformers written out in a derivation; with several rings there may be many more. */
const MOST_SHOWN = 6;

/** The conformers that a derivation writes out, most stable first. */
export function shownConformers(dossier: Dossier): readonly Conformer[] {
  return dossier.conformers.slice(0, MOST_SHOWN);
}

/** The equilibria between the first conformer and the others written out, with both partners. */
export function shownEquilibria(
  dossier: Dossier,
): readonly { readonly equilibrium: Equilibrium; readonly from: Conformer; readonly to: Conformer }[] {
  const shown = shownConformers(dossier);
  const find = (id: string) => shown.find((conformer) => conformer.id === id);
  return dossier.equilibria.flatMap((equilibrium) => {
    const [from, to] = [find(equilibrium.from), find(equilibrium.to)];
    return from === undefined || to === undefined ? [] : [{ equilibrium, from, to }];
  });
}

/** A sentence for steps that do not write out every conformer, else nothing. */
export function shownNotice(dossier: Dossier): string {
  const total = dossier.conformers.length;
  const count = shownConformers(dossier).length;
  return count === total
    ? ""
    : ` The ${count} most stable of ${total} conformers are written out; the energy table has all.`;
}
