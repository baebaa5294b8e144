/** One step of a derivation, as data: what a page, a document or an archive sets in its own way. */
export interface DerivationStep {
  /** Stable kebab-case word, unique within a derivation. */
  readonly id: string;
  readonly title: string;
  /** What is done and why, in whole sentences; label markup allowed. */
  readonly words: string;
  /** Display formula in TeX, built from numbers and escaped labels only; empty when words suffice. */
  readonly tex: string;
  /** What the numbers in brackets or the indices of the formula stand for, in order. */
  readonly where: readonly DerivationKey[];
}

/** Explains one symbol of a formula. */
export interface DerivationKey {
  /** As printed in the formula, in plain text: `(3)`, `u1`. */
  readonly symbol: string;
  /** Label markup allowed. */
  readonly meaning: string;
  /** Register row or stand-in that the symbol stands for, for a link to the register. */
  readonly row?: string;
}
