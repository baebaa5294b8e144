import { additivityAllowance } from "./additivityAllowance.ts";
import { axialGroup } from "./axialGroup.ts";
import type { EnergyRule } from "./EnergyRule.ts";
import { geminal } from "./geminal.ts";
import { nitrogenSubstituent } from "./nitrogenSubstituent.ts";
import { synAxial } from "./synAxial.ts";
import { vicinalGauche } from "./vicinalGauche.ts";

/** Every rule of the energy model, in the order in which the dossier prints the terms. */
export const ENERGY_RULES: readonly EnergyRule[] = [
  axialGroup,
  nitrogenSubstituent,
  geminal,
  vicinalGauche,
  synAxial,
  additivityAllowance,
];
