/**
 * The part of a molecule whose shape is analysed: its ring systems with the chains that join them. Everything else
 * hangs on it as branches, known only by what superposition has to match.
 */
export interface Body {
  /** Ascending. */
  readonly atoms: readonly number[];
  readonly branches: readonly BodyBranch[];
}

export interface BodyBranch {
  /** Body atom and first atom of the branch. */
  readonly at: number;
  readonly first: number;
  /** Canonical form with senses, and that of the mirror image. */
  readonly form: string;
  readonly mirrorForm: string;
}
