import type { Dossier } from "../dossier/Dossier.ts";
import type { DerivationStep } from "./DerivationStep.ts";
import { commonTerms } from "./steps/commonTerms.ts";
import { conformerEnergies } from "./steps/conformerEnergies.ts";
import { differenceUncertainty } from "./steps/differenceUncertainty.ts";
import { equilibriumConstants } from "./steps/equilibriumConstants.ts";
import { freeEnergyDifferences } from "./steps/freeEnergyDifferences.ts";
import { populationFractions } from "./steps/populationFractions.ts";
import { populationIntervals } from "./steps/populationIntervals.ts";
import { symmetry } from "./steps/symmetry.ts";

/**
 * From contributions to populations, with the dossier's own numbers in every formula.
 *
 * Nothing is calculated anew: each number is read from the record and rounded for print. Conformers that are
 * equal by symmetry get the reason instead of sums. A dossier without conformers has no derivation.
 */
export function equilibriumDerivation(dossier: Dossier): readonly DerivationStep[] {
  const { conformers, equilibria } = dossier;
  if (conformers.length === 0) return [];
  if (conformers.length === 1 || equilibria.length === 0) return [conformerEnergies(dossier)];
  if (equilibria.every(({ bySymmetry }) => bySymmetry)) {
    return [
      conformerEnergies(dossier),
      symmetry(dossier),
      freeEnergyDifferences(dossier),
      equilibriumConstants(dossier),
      populationFractions(dossier),
    ];
  }
  return [
    conformerEnergies(dossier),
    commonTerms(dossier),
    freeEnergyDifferences(dossier),
    differenceUncertainty(dossier),
    equilibriumConstants(dossier),
    populationFractions(dossier),
    populationIntervals(dossier),
  ];
}
