import type { Identity, Ring, RingSystem, Stereocentre } from "../Dossier.ts";

/** What a claim is compared with. */
export interface ClaimFacts {
  readonly identity: Pick<Identity, "stereocentres" | "stereobonds">;
  readonly rings: readonly Pick<Ring, "configuration">[];
  readonly systems: readonly Pick<RingSystem, "fusions">[];
  /** Stereocentres under every numbering as good as the printed one; empty where only the printed one counts. */
  readonly equalNumberings: readonly (readonly Stereocentre[])[];
}
