/** Rings joined by shared atoms: fused, spiro and bridged rings of any size together. */
export interface RingSystem {
  readonly index: number;
  /** All its ring atoms, ascending. */
  readonly atoms: readonly number[];
  /** Every ring of the smallest set that lies in it. */
  readonly rings: readonly (readonly number[])[];
}
