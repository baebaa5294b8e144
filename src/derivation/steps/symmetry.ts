import type { Dossier } from "../../dossier/Dossier.ts";
import type { DerivationStep } from "../DerivationStep.ts";

/** Why chairs that are equal by symmetry need no sum: the statement that replaces it. */
export function symmetry(dossier: Dossier): DerivationStep {
  const reason =
    dossier.relation === "identical"
      ? "The two chairs can be superimposed: ring inversion exchanges atoms but gives the same chair again."
      : dossier.relation === "enantiomeric"
        ? "The two chairs are mirror images of each other, and mirror images have the same energy in an achiral medium."
        : "The conformers are related by symmetry.";
  return {
    id: "symmetry",
    title: "Equal by symmetry",
    words: `${reason} Their free energies are equal exactly, whatever the contributions are worth, and no uncertainty enters.`,
    tex: "",
    where: [],
  };
}
