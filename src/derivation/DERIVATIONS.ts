import type { Dossier } from "../dossier/Dossier.ts";
import type { DerivationStep } from "./DerivationStep.ts";
import { equilibriumDerivation } from "./equilibriumDerivation.ts";

/** Derivations by the name an author writes in `::derivation[name]`. */
export const DERIVATIONS: Readonly<Record<string, (dossier: Dossier) => readonly DerivationStep[]>> = {
  equilibrium: equilibriumDerivation,
};
