import type { Dossier } from "../../dossier/Dossier.ts";
import { toDecimals } from "../../quantity/toDecimals.ts";
import { GAS_CONSTANT } from "../../quantity/units.ts";
import type { DerivationStep } from "../DerivationStep.ts";
import { shownEquilibria } from "../shownEquilibria.ts";
import { texAligned } from "../texAligned.ts";
import { KILOJOULE_PER_MOLE, texEnergy } from "../texEnergy.ts";
import { texSignificant } from "../texSignificant.ts";
import { texConstant } from "./texConstant.ts";

/** K = exp(−ΔG°/RT) of each conformer against the most stable one, with R and T in numbers. */
export function equilibriumConstants(dossier: Dossier): DerivationStep {
  const temperature = dossier.conditions.temperature_K;
  const RT = GAS_CONSTANT * temperature;
  const kelvins = String(Number(toDecimals(temperature, 2)));
  const two = dossier.conformers.length === 2;
  const pairs = shownEquilibria(dossier);
  const symmetric = pairs.every(({ equilibrium }) => equilibrium.bySymmetry);
  const lines = pairs.flatMap(({ equilibrium, to }) => {
    const K = texConstant(dossier, to.id);
    if (equilibrium.bySymmetry) return [`${K} &= \\exp(0) = 1`];
    const { deltaG_kJ_mol: deltaG, K: value } = equilibrium;
    const numbers = `\\exp\\left(-\\frac{${texEnergy(deltaG)}}{${toDecimals(RT, 4)}}\\right)`;
    if (!two) return [`${K} &= ${numbers} = ${texSignificant(value)}`];
    return [
      `${K} &= \\exp\\left(-\\frac{\\Delta G^\\circ}{RT}\\right)`,
      `&= ${numbers}`,
      `&= \\exp(${toDecimals(-deltaG / RT, 3)}) = ${texSignificant(value)}`,
    ];
  });
  const thermal = [
    `RT &= ${toDecimals(GAS_CONSTANT * 1e3, 6)}\\times10^{-3}\\times ${kelvins}`,
    `&= ${toDecimals(RT, 4)}${KILOJOULE_PER_MOLE}`,
    ...(two ? [] : ["K_j &= \\exp\\left(-\\frac{\\Delta G^\\circ_j}{RT}\\right)"]),
  ];
  return {
    id: "constant",
    title: "Equilibrium constant",
    words: symmetric
      ? "With no difference in free energy the constant is 1 at every temperature."
      : `K is the ratio of ${two ? "the other" : "each"} conformer to the most stable at ${kelvins}\u00a0K. The gas constant R, in kJ/(mol\u00a0K), is exact in the SI since 2019.`,
    tex: texAligned(symmetric ? lines : [...thermal, ...lines]),
    where: [],
  };
}
