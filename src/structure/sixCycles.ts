import type { Molecule } from "./Molecule.ts";

/**
 * Every six-membered ring that may have a shape of its own, each as atoms in ring order: those of the smallest set
 * of rings, and the ring around a one-atom bridge that the smallest rings hide, as in bicyclo[2.2.1]heptane.
 */
export function sixCycles(molecule: Molecule): readonly (readonly number[])[] {
  const listed = molecule.rings.filter((ring) => ring.length === 6);
  const fives = molecule.rings.filter((ring) => ring.length === 5);
  const hidden = fives.flatMap((a, i) =>
    fives.slice(i + 1).flatMap((b) => {
      const common = a.filter((atom) => b.includes(atom));
      return common.length === 3 ? aroundBridge(molecule, a, b, common) : [];
    }),
  );
  const seen = new Set(listed.map(keyOf));
  return [
    ...listed,
    ...hidden.filter((ring) => !seen.has(keyOf(ring)) && seen.add(keyOf(ring)) !== undefined),
  ];
}

function keyOf(ring: readonly number[]): string {
  return [...ring].sort((a, b) => a - b).join();
}

/** The six atoms left when the middle of the three common atoms is taken out, in ring order. */
function aroundBridge(
  molecule: Molecule,
  a: readonly number[],
  b: readonly number[],
  common: readonly number[],
): readonly (readonly number[])[] {
  const joined = (x: number, y: number) => molecule.atoms[x]!.neighbours.includes(y);
  const bridge = common.find((atom) => common.every((other) => other === atom || joined(atom, other)));
  if (bridge === undefined) return [];
  const rest = [...new Set([...a, ...b])].filter((atom) => atom !== bridge);
  const ring = [rest[0]!];
  while (ring.length < 6) {
    const next = rest.find((atom) => !ring.includes(atom) && joined(ring.at(-1)!, atom));
    if (next === undefined) return [];
    ring.push(next);
  }
  return joined(ring[5]!, ring[0]!) ? [ring] : [];
}
