import type { RingSystem } from "../dossier/Dossier.ts";
import type { SystemBody } from "./SystemBody.ts";

/**
 * The ring bonds of a system, each once: around its first ring, then around the others. The second line of a double
 * bond belongs into one ring; where two share the bond, into the one with more such bonds.
 *
 * @param atoms - atom of each vertex.
 * @param rings - every ring as vertices in ring order.
 */
export function systemBonds(
  system: RingSystem,
  atoms: readonly number[],
  rings: readonly (readonly number[])[],
): SystemBody["bonds"] {
  const orders = new Map(
    system.bonds.map(({ from, to, order }) => [keyOf(atoms.indexOf(from), atoms.indexOf(to)), order]),
  );
  const bondsOf = (ring: readonly number[]) =>
    ring.map((from, index) => [from, ring[(index + 1) % ring.length]!] as const);
  const unsaturation = (ring: readonly number[]) =>
    bondsOf(ring).filter(([from, to]) => (orders.get(keyOf(from, to)) ?? 1) > 1).length;
  const drawn = new Map<string, SystemBody["bonds"][number]>();
  for (const [from, to] of rings.flatMap(bondsOf)) {
    const key = keyOf(from, to);
    if (drawn.has(key)) continue;
    const [home] = rings
      .filter((ring) => ring.includes(from) && ring.includes(to))
      .sort((a, b) => unsaturation(b) - unsaturation(a));
    drawn.set(key, { from, to, order: orders.get(key) ?? 1, home: home! });
  }
  return [...drawn.values()];
}

function keyOf(a: number, b: number): string {
  return a < b ? `${a}-${b}` : `${b}-${a}`;
}
