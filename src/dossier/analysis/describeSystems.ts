import { fusionsOf } from "../../structure/fusionsOf.ts";
import { bondBetween, type Molecule } from "../../structure/Molecule.ts";
import type { AnalysedRing } from "../../structure/StructureAnalysis.ts";
import type { RingSystem } from "../Dossier.ts";

/**
 * The ring systems that hold analysed rings, as the Dossier records them.
 * @param open - atoms whose configuration is not decided: no fusion is stated there.
 */
export function describeSystems(
  molecule: Molecule,
  rings: readonly AnalysedRing[],
  open: ReadonlySet<number>,
): readonly RingSystem[] {
  return [...new Set(rings.map((ring) => ring.system))].map((index) => {
    const members = rings.filter((ring) => ring.system === index);
    const all = allRings(molecule, members);
    const atoms = [...new Set(all.flat())].sort((a, b) => a - b);
    const inRing = (a: number, b: number) =>
      all.some((ring) => {
        const at = ring.indexOf(a);
        return at >= 0 && (ring[(at + 1) % ring.length] === b || ring.at(at - 1) === b);
      });
    const seen = new Set<string>();
    return {
      index,
      rings: members.map((ring) => ring.index),
      atoms,
      bonds: molecule.bonds
        .filter((bond) => inRing(bond.from, bond.to))
        .map(({ from, to }) => {
          const { order, aromatic } = bondBetween(molecule, from, to)!;
          return { from, to, order, aromatic };
        }),
      fusions: members.flatMap((ring) =>
        fusionsOf(ring).flatMap(({ atoms: pair, relation }) => {
          const key = [...pair].sort((a, b) => a - b).join();
          if (seen.has(key) || pair.some((atom) => open.has(atom))) return [];
          seen.add(key);
          const locants = pair.map((atom) => ring.names[ring.atoms.indexOf(atom)]!);
          return [{ atoms: pair, locants: [locants[0]!, locants[1]!] as const, relation }];
        }),
      ),
    };
  });
}

/** Every ring of the smallest set joined to the given ones by shared atoms. */
function allRings(molecule: Molecule, members: readonly AnalysedRing[]): readonly (readonly number[])[] {
  const atoms = new Set(members.flatMap((ring) => ring.atoms));
  const found: (readonly number[])[] = [];
  for (let grown = true; grown; ) {
    grown = false;
    for (const ring of molecule.rings) {
      if (found.includes(ring) || !ring.some((atom) => atoms.has(atom))) continue;
      found.push(ring);
      for (const atom of ring) atoms.add(atom);
      grown = true;
    }
  }
  return found;
}
