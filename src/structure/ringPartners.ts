import type { Molecule } from "./Molecule.ts";

/** How another ring meets a six-membered ring. */
export interface RingPartner {
  /** Atoms of the other ring in its own order. */
  readonly atoms: readonly number[];
  readonly size: number;
  /** Positions in the six-membered ring of the shared atoms: a walk in ring order; one when spiro, two when fused. */
  readonly shared: readonly number[];
  /** Atoms of the other ring next to the first and the last shared atom, outside the six-membered ring. */
  readonly ends: readonly [number, number];
  /** Atoms of the other ring that are not shared: the length of the bridge when more than two are shared. */
  readonly bridge: number;
}

/**
 * Rings that share atoms with a six-membered ring.
 * @returns null when some ring meets it in two separate places, as only strained cages do.
 */
export function ringPartners(molecule: Molecule, ring: readonly number[]): readonly RingPartner[] | null {
  const partners: RingPartner[] = [];
  for (const other of molecule.rings) {
    const common = other.filter((atom) => ring.includes(atom));
    if (common.length === 0 || common.length === other.length) continue;
    const start = ring.findIndex(
      (atom, i) => common.includes(atom) && !common.includes(ring[(i + ring.length - 1) % ring.length]!),
    );
    if (start < 0) continue;
    const shared: number[] = [];
    for (let k = 0; k < common.length; k++) shared.push((start + k) % ring.length);
    if (!shared.every((position) => common.includes(ring[position]!))) return null;
    const end = (position: number, inward: number) => {
      const at = other.indexOf(ring[position]!);
      const sides = [1, other.length - 1].map((step) => other[(at + step) % other.length]!);
      return sides.find((atom) => !common.includes(atom) && atom !== inward);
    };
    const first = end(shared[0]!, -1);
    const last = end(shared.at(-1)!, shared.length === 1 ? (first ?? -1) : -1);
    if (first === undefined || last === undefined) return null;
    partners.push({
      atoms: other,
      size: other.length,
      shared,
      ends: [first, last],
      bridge: other.length - common.length,
    });
  }
  return partners;
}
