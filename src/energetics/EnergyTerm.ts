import type { Parameter } from "./Parameter.ts";

export type TermKind =
  | "axial group"
  | "anomeric"
  | "vicinal gauche"
  | "syn-axial"
  | "geminal"
  | "nitrogen substituent"
  | "ring fusion"
  | "non-chair form"
  | "additivity allowance";

/** One line of the energy table of one conformer: a sum of parameters with their factors. */
export interface EnergyTerm {
  readonly kind: TermKind;
  /** Label markup allowed. */
  readonly label: string;
  readonly atoms: readonly number[];
  readonly parts: readonly { readonly parameter: Parameter; readonly coefficient: number }[];
}
