import type { Register } from "../register/Register.ts";
import { bondBetween, type Molecule } from "./Molecule.ts";
import type { Substituent } from "./StructureAnalysis.ts";

/**
 * A bond from a ring atom to an atom of another ring of its system, described as the open-chain group whose contacts
 * it makes: methyl for a ring carbon, methoxy for a ring oxygen and so on, the count of gauche butane units
 * that the trade uses for fused rings (common practice).
 * @param name - printed locant of the atom, for the label.
 */
export function describeBranch(
  molecule: Molecule,
  ringAtom: number,
  atom: number,
  name: string,
  register: Register,
): Substituent {
  const there = molecule.atoms[atom]!;
  const trigonal = there.neighbours.some((n) => bondBetween(molecule, atom, n)!.order > 1) || there.aromatic;
  const [key, groupClass] =
    there.element === "C"
      ? trigonal
        ? [there.aromatic ? "Ph" : "vinyl", there.aromatic ? "aryl" : "alkenyl"]
        : ["Me", "primary-alkyl"]
      : there.element === "O"
        ? ["OMe", "alkoxy"]
        : there.element === "N"
          ? there.charge > 0
            ? ["", "ammonium"]
            : ["NMe2", "dialkylamino"]
          : there.element === "S"
            ? ["SMe", "sulfanyl"]
            : ["", "other"];
  const label = `ring ${there.element}${name}`;
  return {
    ringAtom,
    atom,
    group: register.groups.find((group) => group.key === key) ?? null,
    groupClass,
    label,
    labelReversed: label,
    prefix: "",
    form: label,
    mirrorForm: label,
  };
}
