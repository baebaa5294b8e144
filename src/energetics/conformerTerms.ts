import type { ChairSet } from "../conformers/enumerateConformers.ts";
import type { EnergyContext } from "./EnergyContext.ts";
import type { EnergyTerm } from "./EnergyTerm.ts";
import { ENERGY_RULES } from "./rules/index.ts";

/** Everything the energy model charges one conformer, in the order of rules, ring by ring. */
export function conformerTerms(chairs: ChairSet, context: EnergyContext): readonly EnergyTerm[] {
  return ENERGY_RULES.flatMap((rule) => chairs.flatMap((chair) => rule.terms(chair, context)));
}
