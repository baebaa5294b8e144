import { hasOrientations } from "../conformers/Chair.ts";
import type { ChairSet } from "../conformers/enumerateConformers.ts";
import type { EnergyContext } from "./EnergyContext.ts";
import type { EnergyTerm } from "./EnergyTerm.ts";
import { ringFusion } from "./ringFusion.ts";
import { ENERGY_RULES } from "./rules/index.ts";

/**
 * Everything the energy model charges one conformer, in the order of rules, ring by ring. A contact that two fused rings
 * both see is charged once. Boats and twist-boats are charged nothing here.
 */
export function conformerTerms(chairs: ChairSet, context: EnergyContext): readonly EnergyTerm[] {
  const oriented = chairs.filter(hasOrientations);
  const seen = new Set<string>();
  const terms = ENERGY_RULES.flatMap((rule) => oriented.flatMap((chair) => rule.terms(chair, context)));
  return [...terms, ...ringFusion(oriented, context)].filter((term) => {
    if (term.kind !== "vicinal gauche" && term.kind !== "syn-axial") return true;
    const key = `${term.kind}/${[...term.atoms].sort((a, b) => a - b).join()}`;
    return !seen.has(key) && seen.add(key) !== undefined;
  });
}
