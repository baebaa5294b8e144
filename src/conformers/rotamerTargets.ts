import { isTrigonal } from "../structure/flatAtoms.ts";
import type { Molecule } from "../structure/Molecule.ts";
import type { AnalysedRing } from "../structure/StructureAnalysis.ts";
import type { TorsionTarget } from "./geometry/moleculeRestraints.ts";

/** Staggered positions about a bond to a group, degrees. */
const STAGGERED = [60, 180, -60];
/** Bonds turned; three positions of each in all combinations. */
const MOST_TURNED = 2;

/**
 * The staggered rotamers of a molecule about the bonds from its rings to tetrahedral groups that are not alike all
 * round: three positions for one such bond, nine for two; further bonds stay where they settle.
 * @returns one list of torsions for each rotamer; one empty list where nothing turns.
 */
export function rotamerTargets(
  molecule: Molecule,
  rings: readonly AnalysedRing[],
): readonly (readonly TorsionTarget[])[] {
  const turning = rings
    .flatMap((ring) => ring.substituents.map((group) => ({ ring, group })))
    .flatMap(({ ring, group }) => {
      const first = molecule.atoms[group.atom]!;
      const next = first.neighbours.filter((neighbour) => neighbour !== group.ringAtom);
      if (isTrigonal(molecule, first) || next.length === 0) return [];
      const kinds = new Set(next.map((atom) => leafKind(molecule, atom, group.atom)));
      if (next.length === 3 && kinds.size === 1 && !kinds.has(null)) return [];
      const position = ring.atoms.indexOf(group.ringAtom);
      const before = ring.atoms[(position + 5) % 6]!;
      return [{ atoms: [before, group.ringAtom, group.atom, next[0]!] as const }];
    })
    // A bond between two rings is met from both of them.
    .filter(
      ({ atoms: [, a, b] }, i, all) =>
        all.findIndex(({ atoms: [, c, d] }) => (a === c && b === d) || (a === d && b === c)) === i,
    )
    .slice(0, MOST_TURNED);
  return turning.reduce<readonly (readonly TorsionTarget[])[]>(
    (sets, { atoms }) => sets.flatMap((set) => STAGGERED.map((degrees) => [...set, { atoms, degrees }])),
    [[]],
  );
}

/** What a one-atom end is; null for anything longer. */
function leafKind(molecule: Molecule, atom: number, from: number): string | null {
  const { neighbours, element, hydrogens } = molecule.atoms[atom]!;
  return neighbours.every((neighbour) => neighbour === from) ? `${element}${hydrogens}` : null;
}
