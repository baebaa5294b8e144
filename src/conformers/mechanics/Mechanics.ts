import type { Molecule } from "../../structure/Molecule.ts";
import type { RestrainedPoint } from "../geometry/moleculeRestraints.ts";
import type { Coordinates } from "../geometry/placePoints.ts";

/** What the program asks of a molecular mechanics library; one adapter implements it. */
export interface Mechanics {
  /** Force field, as printed: `MMFF94s`. */
  readonly method: string;
  /**
   * The nearest minimum of the force field's energy.
   * @param points - all atoms of the molecule, then all hydrogens.
   * @param coordinates - where they start, Å.
   * @returns energy in kJ/mol and coordinates in Å; null when an atom has no type in the force field.
   */
  relax(
    molecule: Molecule,
    points: readonly RestrainedPoint[],
    coordinates: Coordinates,
  ): { readonly energy_kJ_mol: number; readonly coordinates: Coordinates } | null;
}
