import type { MediumClass, Register } from "../register/Register.ts";

/** Where the energies are looked up: the register and the medium of the dossier. */
export interface EnergyContext {
  readonly register: Register;
  /** Register key of the solvent, or null when none is stated. */
  readonly solvent: string | null;
  readonly medium: MediumClass;
}
