import type { RegisterRow } from "./Register.ts";

/** A row and how its medium was matched. */
export interface RowMatch {
  readonly row: RegisterRow;
  readonly match: "exact solvent" | "same medium" | "nearest medium" | "any medium";
}
