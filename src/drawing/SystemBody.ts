import type { AtomLetters } from "./atomLetters.ts";
import type { Branch } from "./ChairView.ts";
import type { Vector } from "./Vector.ts";

/** One ring system of one conformer in space, with everything to be drawn of it: what every camera looks at. */
export interface SystemBody {
  readonly conformer: string;
  readonly vertices: readonly {
    readonly atom: number;
    readonly locant: string;
    readonly letters: AtomLetters | null;
    /** Å. */
    readonly at: Vector;
  }[];
  /** Analysed rings, which may lead, then all others, as indices in `vertices` in ring order. */
  readonly rings: readonly (readonly number[])[];
  /** Index in the dossier's rings of each analysed ring, in the order of `rings`, and whether it is a chair here. */
  readonly analysed: readonly { readonly ring: number; readonly isChair: boolean }[];
  /** Ring bonds as pairs of vertices, each once, around one ring after the other; and the ring of its second line. */
  readonly bonds: readonly {
    readonly from: number;
    readonly to: number;
    readonly order: 1 | 2 | 3;
    readonly home: readonly number[];
  }[];
  /** With the places of the attached atoms, Å. */
  readonly branches: readonly (Omit<Branch, "end"> & { readonly end: Vector })[];
}
