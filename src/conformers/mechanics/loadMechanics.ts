import { createRequire } from "node:module";
import type * as Library from "openchemlib";
import { fromKilocalorie } from "../../quantity/units.ts";
import type { Molecule } from "../../structure/Molecule.ts";
import type { RestrainedPoint } from "../geometry/moleculeRestraints.ts";
import type { Coordinates } from "../geometry/placePoints.ts";
import type { Mechanics } from "./Mechanics.ts";

/** Largest molecule relaxed, atoms with hydrogens; the time grows with the square of it. */
const MAXIMUM_ATOMS = 120;
/** Results kept, so that a site rebuilt after every save relaxes only what has changed. */
const MAXIMUM_KEPT = 4000;

let library: typeof Library | undefined;
const kept = new Map<string, ReturnType<Mechanics["relax"]>>();

/**
 * Molecular mechanics by OpenChemLib (MMFF94s: Halgren, J. Comput. Chem. 1999, 20, 720). The library is started by the
 * first molecule and kept; it minimises from the coordinates that it is given, so that results do not depend on
 * chance, and minima are rounded to 10⁻⁴ Å and 10⁻³ kJ/mol.
 */
export function loadMechanics(): Mechanics {
  return {
    method: "MMFF94s",
    relax: (molecule, points, coordinates) => {
      if (points.length > MAXIMUM_ATOMS) return null;
      const key = keyOf(molecule, points, coordinates);
      const found = kept.get(key);
      if (found !== undefined) return found;
      const result = minimise(molecule, points, coordinates);
      if (kept.size >= MAXIMUM_KEPT) kept.delete(kept.keys().next().value!);
      kept.set(key, result);
      return result;
    },
  };
}

function start(): typeof Library {
  if (library === undefined) {
    library = createRequire(import.meta.url)("openchemlib") as typeof Library;
    library.Resources.registerFromNodejs();
  }
  return library;
}

function minimise(
  molecule: Molecule,
  points: readonly RestrainedPoint[],
  coordinates: Coordinates,
): ReturnType<Mechanics["relax"]> {
  const { Molecule: Target, ForceFieldMMFF94 } = start();
  const target = new Target(points.length, points.length + 8);
  points.forEach((point, i) => {
    const atom = point.atom === null ? null : molecule.atoms[point.atom]!;
    target.addAtom(atom?.atomicNumber ?? 1);
    if (atom !== null && atom.charge !== 0) target.setAtomCharge(i, atom.charge);
    target.setAtomX(i, coordinates[3 * i]!);
    target.setAtomY(i, coordinates[3 * i + 1]!);
    target.setAtomZ(i, coordinates[3 * i + 2]!);
  });
  for (const { from, to, order } of molecule.bonds) target.setBondOrder(target.addBond(from, to), order);
  points.forEach((point, i) => {
    if (point.atom === null) target.addBond(point.parent!, i);
  });
  try {
    const field = new ForceFieldMMFF94(target, ForceFieldMMFF94.MMFF94S);
    field.minimise();
    const energy = field.getTotalEnergy();
    if (!Number.isFinite(energy)) return null;
    const settled = new Float64Array(coordinates.length);
    points.forEach((_, i) => {
      settled[3 * i] = round(target.getAtomX(i));
      settled[3 * i + 1] = round(target.getAtomY(i));
      settled[3 * i + 2] = round(target.getAtomZ(i));
    });
    return { energy_kJ_mol: Math.round(fromKilocalorie(energy) * 1e3) / 1e3, coordinates: settled };
  } catch {
    // The library throws for atoms that the force field does not know.
    return null;
  }
}

function round(value: number): number {
  return Math.round(value * 1e4) / 1e4 + 0;
}

function keyOf(molecule: Molecule, points: readonly RestrainedPoint[], coordinates: Coordinates): string {
  const atoms = points.map(({ element, atom }) =>
    atom === null ? "H" : `${element}${molecule.atoms[atom]!.charge}`,
  );
  const bonds = molecule.bonds.map(({ from, to, order }) => `${from}.${to}.${order}`);
  return `${atoms.join()}|${bonds.join()}|${coordinates.join()}`;
}
