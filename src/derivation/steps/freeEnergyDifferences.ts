import type { Dossier } from "../../dossier/Dossier.ts";
import type { DerivationStep } from "../DerivationStep.ts";
import { shownEquilibria } from "../shownEquilibria.ts";
import { texAligned } from "../texAligned.ts";
import { texConformer } from "../texConformer.ts";
import { KILOJOULE_PER_MOLE, texEnergy } from "../texEnergy.ts";
import { texDifference } from "./texDifference.ts";

/** Difference between the sums and the record that rounding explains, kJ/mol. */
const TOLERANCE = 1e-6;

/** ΔG° of each conformer against the most stable one, with the numbers. */
export function freeEnergyDifferences(dossier: Dossier): DerivationStep {
  const two = dossier.conformers.length === 2;
  const first = dossier.conformers[0]?.id ?? "A";
  const pairs = shownEquilibria(dossier);
  const lines = pairs.flatMap(({ equilibrium, from, to }) => {
    const name = texDifference(dossier, to.id);
    if (equilibrium.bySymmetry) return [`${name} &= 0 \\quad\\text{exactly}`];
    const subtracted = from.sum_kJ_mol < 0 ? `(${texEnergy(from.sum_kJ_mol)})` : texEnergy(from.sum_kJ_mol);
    const numbers = `${texEnergy(to.sum_kJ_mol)} - ${subtracted}`;
    const result = texEnergy(equilibrium.deltaG_kJ_mol);
    if (!two) return [`${name} &= ${numbers} = ${result}`];
    return [
      `${name} &= G^\\circ(${texConformer(to.id)}) - G^\\circ(${texConformer(from.id)})`,
      `&= ${numbers}`,
      `&= ${result}${KILOJOULE_PER_MOLE}`,
    ];
  });
  const unexplained = pairs.some(
    ({ equilibrium, from, to }) =>
      Math.abs(to.sum_kJ_mol - from.sum_kJ_mol - equilibrium.deltaG_kJ_mol) > TOLERANCE,
  );
  return {
    id: "difference",
    title: "Free-energy difference",
    words:
      `The difference is taken as ${two ? "the other" : "each"} conformer minus ${first}, the most stable, in kJ/mol; it is positive when ${first} is preferred.` +
      (unexplained
        ? " The record’s difference is not the difference of the sums above and must be checked."
        : ""),
    tex: texAligned(
      two ? lines : [`\\Delta G^\\circ_j &= G^\\circ(j) - G^\\circ(${texConformer(first)})`, ...lines],
    ),
    where: [],
  };
}
