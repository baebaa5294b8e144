import type { Standing } from "../register/Register.ts";

/** Value and standard uncertainty at one temperature, both in kJ/mol. */
export interface ParameterValue {
  readonly value: number;
  readonly u: number;
}

/**
 * One independent input of the energy model: a register row, or a stand-in where the register has none.
 * Every use of the same `id` moves together, so that a value used twice is never counted as two observations.
 */
export interface Parameter {
  /** Register row id, or a stand-in's own name beginning with `stand-in/` or `allowance/`. */
  readonly id: string;
  /** @param temperature - in K. */
  readonly at: (temperature: number) => ParameterValue;
  readonly basis: "published" | "computed" | "not available";
  readonly standing: Standing | null;
  readonly sources: readonly string[];
  /** Medium as printed in the register, or what the stand-in assumes. */
  readonly medium: string;
  readonly temperature_K: number | null;
  readonly note: string | null;
}
