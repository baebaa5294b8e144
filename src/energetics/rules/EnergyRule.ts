import type { Chair } from "../../conformers/Chair.ts";
import type { EnergyContext } from "../EnergyContext.ts";
import type { EnergyTerm } from "../EnergyTerm.ts";

/** One kind of contribution: looks at one chair and returns what it charges. */
export interface EnergyRule {
  readonly id: string;
  readonly title: string;
  /** One phrase for the methods page: what the rule charges. */
  readonly appliesTo: string;
  readonly terms: (chair: Chair, context: EnergyContext) => readonly EnergyTerm[];
}
