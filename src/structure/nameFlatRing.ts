import type { Register } from "../register/Register.ts";
import type { FoundRing } from "./findRings.ts";
import { bondBetween, type Molecule } from "./Molecule.ts";
import { compareLists, nameRing, type RingName } from "./nameRing.ts";

/**
 * Names a ring with its flat parts and keeps the numberings that give them the lowest locants (IUPAC P-31.1.4):
 * cyclohexene, 3,4-didehydrooxane, cyclohexanone, methylenecyclohexane. A saturated ring keeps its name.
 */
export function nameFlatRing(molecule: Molecule, found: FoundRing, register: Register): RingName {
  const { parent, numberings } = nameRing(molecule, found.atoms, register);
  const double = found.flatBonds.map((k) => [found.atoms[k]!, found.atoms[(k + 1) % 6]!] as const);
  const carbons = found.flatAtoms
    .map((position) => found.atoms[position]!)
    .filter((atom) => molecule.atoms[atom]!.element === "C");
  if (found.kind === "boat" || (double.length === 0 && carbons.length === 0)) return { parent, numberings };
  const locantsOf = (numbering: readonly number[]) =>
    (double.length > 0 ? double.flat() : carbons)
      .map((atom) => numbering.indexOf(atom) + 1)
      .sort((a, b) => a - b);
  const scores = numberings.map((numbering) => ({ numbering, score: locantsOf(numbering) }));
  const best = scores.map(({ score }) => score).sort(compareLists)[0]!;
  const kept = scores
    .filter(({ score }) => compareLists(score, best) === 0)
    .map(({ numbering }) => numbering);
  return { parent: flatName(molecule, parent, carbons, double.length > 0, best), numberings: kept };
}

function flatName(
  molecule: Molecule,
  parent: string,
  carbons: readonly number[],
  double: boolean,
  locants: readonly number[],
): string {
  const carbocycle = parent === "cyclohexane";
  if (double) return carbocycle ? "cyclohexene" : `${locants.join(",")}-didehydro${parent}`;
  // In a heteroring the =O or =C group is named as a substituent of the saturated parent.
  if (!carbocycle) return parent;
  const oxo = carbons.every((atom) =>
    molecule.atoms[atom]!.neighbours.some(
      (n) => molecule.atoms[n]!.element === "O" && bondBetween(molecule, atom, n)!.order === 2,
    ),
  );
  if (carbons.length > 1) return oxo ? `cyclohexane-${locants.join(",")}-dione` : "cyclohexane";
  return oxo ? "cyclohexanone" : "methylenecyclohexane";
}
