import type { Claim } from "../Dossier.ts";

/** What a compound inherits where it says nothing itself; null or absent where the series says nothing either. */
export interface SeriesDefaults {
  readonly temperature_K: number | null;
  /** Register key. */
  readonly solvent: string | null;
  readonly stereoisomers: "refuse" | "enumerate" | null;
  readonly claim: Claim | null;
}

export const NO_DEFAULTS: SeriesDefaults = {
  temperature_K: null,
  solvent: null,
  stereoisomers: null,
  claim: null,
};
