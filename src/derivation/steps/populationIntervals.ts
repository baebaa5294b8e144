import type { Conformer, Dossier, Equilibrium } from "../../dossier/Dossier.ts";
import { toDecimals } from "../../quantity/toDecimals.ts";
import { NORMAL_95 } from "../../quantity/units.ts";
import type { DerivationStep } from "../DerivationStep.ts";
import { shownConformers } from "../shownConformers.ts";
import { texAligned } from "../texAligned.ts";
import { texConformer } from "../texConformer.ts";
import { KILOJOULE_PER_MOLE, texEnergy } from "../texEnergy.ts";
import { texFraction } from "../texFraction.ts";
import { texSignificant } from "../texSignificant.ts";

/** Number of standard deviations, as printed. */
const FACTOR = toDecimals(NORMAL_95, 2);

/** 95 % intervals of the populations: end points are transformed, so they are not symmetric. */
export function populationIntervals(dossier: Dossier): DerivationStep {
  const [equilibrium] = dossier.equilibria;
  const [first, second] = dossier.conformers;
  const two = dossier.conformers.length === 2 && equilibrium !== undefined;
  const unresolved = dossier.equilibria.some((entry) => entry.unresolved);
  return {
    id: "interval",
    title: "95\u00a0% intervals",
    words:
      (two
        ? "The end points of the interval of ΔG° (1.96 standard uncertainties either way) are carried through K to the populations, whose intervals are therefore not symmetric."
        : "For more than two conformers the interval is formed on ℓ = ln(p/(1 − p)), whose uncertainty follows from those of the energies to first order, and its end points are transformed back.") +
      (unresolved
        ? " The interval of ΔG° includes zero: which conformer is the major one is unresolved."
        : ""),
    tex: texAligned(
      two && first !== undefined && second !== undefined
        ? throughDifference(equilibrium, first, second)
        : shownConformers(dossier).flatMap(throughLogit),
    ),
    where: [],
  };
}

const to = (low: string, high: string) => `${low}\\ \\text{to}\\ ${high}`;

function throughDifference(equilibrium: Equilibrium, first: Conformer, second: Conformer): readonly string[] {
  const [low, high] = equilibrium.deltaG95_kJ_mol;
  const [smallK, largeK] = equilibrium.K95;
  const [lowEnd, highEnd] = ends(first);
  return [
    `\\Delta G^\\circ &: ${texEnergy(equilibrium.deltaG_kJ_mol)} \\pm ${FACTOR}\\times ${texEnergy(equilibrium.u_kJ_mol)}`,
    `&= ${to(texEnergy(low), texEnergy(high))}${KILOJOULE_PER_MOLE}`,
    `K &: ${to(texSignificant(smallK), texSignificant(largeK))}`,
    `p(${texConformer(first.id)}) &: \\frac{1}{1 + ${texSignificant(largeK)}} = ${lowEnd}\\ \\text{to}`,
    `&\\phantom{:}\\ \\frac{1}{1 + ${texSignificant(smallK)}} = ${highEnd}`,
    `p(${texConformer(second.id)}) &: ${to(...ends(second))}`,
  ];
}

function throughLogit(conformer: Conformer): readonly string[] {
  const [low, high] = conformer.population95;
  const name = `p(${texConformer(conformer.id)})`;
  const range = `${name} &: ${to(...ends(conformer))}`;
  if (!(low > 0 && high < 1 && low < high)) return [range];
  const middle = logit(conformer.population);
  const u = (logit(high) - logit(low)) / (2 * NORMAL_95);
  return [
    `\\ell(${texConformer(conformer.id)}) &: ${toDecimals(middle, 3)} \\pm ${FACTOR}\\times ${toDecimals(u, 3)}`,
    `&= ${to(toDecimals(logit(low), 3), toDecimals(logit(high), 3))}`,
    range,
  ];
}

function ends({ population95: [low, high] }: Conformer): [string, string] {
  return [texFraction(low), texFraction(high)];
}

function logit(fraction: number): number {
  return Math.log(fraction / (1 - fraction));
}
