import type { Structure } from "../dossier/Dossier.ts";
import { atomLetters } from "./atomLetters.ts";

/** Short names of the trade for the commonest groups, by their formula. */
const SHORT: Readonly<Record<string, readonly [string, string]>> = {
  CH_3: ["Me", "Me"],
  C_2H_5: ["Et", "Et"],
  OCH_3: ["OMe", "MeO"],
};

/**
 * Letters for a group that no analysed ring lists, on an atom of a five-membered or aromatic ring: a single atom with
 * its hydrogens, else its formula, the attached element first.
 */
export function bareLabel(
  structure: Structure,
  ringAtom: number,
  first: number,
): { readonly label: string; readonly labelReversed: string } {
  const group = branchAtoms(structure, ringAtom, first);
  const head = structure.atoms[first]!;
  const plain = group.every((atom) => structure.atoms[atom]!.charge === 0);
  if (group.length === 1 && (head.element !== "C" || !plain)) {
    const { element, hydrogens, charge } = atomLetters(head, true);
    return {
      label: `${element}${hydrogens}${charge}`,
      labelReversed: `${charge}${hydrogens}${element}`,
    };
  }
  const counts = new Map<string, number>();
  const add = (element: string, count: number) =>
    count > 0 && counts.set(element, (counts.get(element) ?? 0) + count);
  for (const atom of group) {
    const { element, hydrogens } = structure.atoms[atom]!;
    if (atom !== first || element === "C") add(element, 1);
    add("H", hydrogens);
  }
  const rest = [...counts.keys()].filter((element) => element !== "C" && element !== "H").sort();
  const body = ["C", "H", ...rest]
    .filter((element) => counts.has(element))
    .map((element) => (counts.get(element) === 1 ? element : `${element}_${counts.get(element)}`))
    .join("");
  const formula = head.element === "C" ? body : head.element + body;
  const [label, labelReversed] = SHORT[formula] ?? [formula, formula];
  return { label, labelReversed };
}

/** Atoms on the far side of the bond from a ring atom to a group, from its first atom. */
function branchAtoms(structure: Structure, ringAtom: number, first: number): readonly number[] {
  const found = [first];
  for (const atom of found) {
    for (const { from, to } of structure.bonds) {
      const next = from === atom ? to : to === atom ? from : null;
      if (next === null || next === ringAtom || found.includes(next)) continue;
      found.push(next);
    }
  }
  return found;
}
