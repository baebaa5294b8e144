import type { Dossier, RingSystem } from "../dossier/Dossier.ts";
import { shortestCycles } from "./shortestCycles.ts";

/** Every ring of a system as atoms in ring order: the analysed ones first, then the others, of any size and kind. */
export function systemRings(dossier: Dossier, system: RingSystem): readonly (readonly number[])[] {
  const analysed = dossier.rings
    .filter((ring) => system.rings.includes(ring.index))
    .map((ring) => ring.atoms);
  const keyOf = (ring: readonly number[]) => [...ring].sort((a, b) => a - b).join();
  const known = new Set(analysed.map(keyOf));
  const index = (atom: number) => system.atoms.indexOf(atom);
  const others = shortestCycles(
    system.atoms.length,
    system.bonds.map(({ from, to }) => [index(from), index(to)] as const),
  )
    .map((ring) => ring.map((each) => system.atoms[each]!))
    .filter((ring) => !known.has(keyOf(ring)));
  return [...analysed, ...others];
}
