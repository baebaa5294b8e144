import type { Molecule } from "./Molecule.ts";
import type { RingSystem } from "./RingSystem.ts";

/** The ring systems of a molecule, by lowest atom; a single ring is a system of its own. */
export function findRingSystems(molecule: Molecule): readonly RingSystem[] {
  const groups: { atoms: Set<number>; rings: (readonly number[])[] }[] = [];
  for (const ring of molecule.rings) {
    const touching = groups.filter((group) => ring.some((atom) => group.atoms.has(atom)));
    const merged = {
      atoms: new Set([...touching.flatMap((group) => [...group.atoms]), ...ring]),
      rings: [...touching.flatMap((group) => group.rings), ring],
    };
    for (const group of touching) groups.splice(groups.indexOf(group), 1);
    groups.push(merged);
  }
  return groups
    .map(({ atoms, rings }) => ({ atoms: [...atoms].sort((a, b) => a - b), rings }))
    .sort((a, b) => a.atoms[0]! - b.atoms[0]!)
    .map((system, index) => ({ index, ...system }));
}
