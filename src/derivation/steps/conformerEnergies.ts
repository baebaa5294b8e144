import type { Dossier } from "../../dossier/Dossier.ts";
import type { DerivationStep } from "../DerivationStep.ts";
import { numberContributions } from "../numberContributions.ts";
import { shownConformers } from "../shownConformers.ts";
import { shownNotice } from "../shownNotice.ts";
import { texAligned } from "../texAligned.ts";
import { texConformer } from "../texConformer.ts";
import { KILOJOULE_PER_MOLE, texEnergy } from "../texEnergy.ts";
import { texSum } from "../texSum.ts";

/** G° of each conformer as the sum of its contributions, numbered as in the energy table. */
export function conformerEnergies(dossier: Dossier): DerivationStep {
  const rows = numberContributions(dossier);
  const shown = shownConformers(dossier);
  const lines = shown.flatMap((conformer) => {
    const own = rows.filter((row) => row.conformers.includes(conformer.id));
    const head = `G^\\circ(${texConformer(conformer.id)}) &=`;
    const total = `${texEnergy(conformer.sum_kJ_mol)}${KILOJOULE_PER_MOLE}`;
    if (own.length === 0) return [`${head} ${total}`];
    const [first = "", ...more] = texSum(
      own.map(({ number, contribution: { value_kJ_mol } }) => ({
        tex: `\\underset{(${number})}{${texEnergy(Math.abs(value_kJ_mol))}}`,
        negative: Number(texEnergy(value_kJ_mol)) < 0,
      })),
    );
    return [`${head} ${first}`, ...more, `&= ${total}`];
  });
  const bare = shown.some((conformer) => conformer.contributions.length === 0);
  const notice = shownNotice(dossier);
  return {
    id: "energies",
    title: "Energy of each conformer",
    words:
      "Each conformer’s free energy is the sum of its contributions; the number under each is its row in the energy table." +
      (bare ? " A conformer without any contribution is the zero of this scale." : "") +
      " Numbers are rounded for print and calculated unrounded." +
      (notice === "" ? "" : ` ${notice}`),
    tex: texAligned(lines),
    where: rows
      .filter((row) => shown.some(({ id }) => row.conformers.includes(id)))
      .map(({ number, contribution }) => ({ symbol: `(${number})`, meaning: contribution.label })),
  };
}
