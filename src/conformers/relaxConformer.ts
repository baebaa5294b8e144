import type { Arrangement } from "./enumerateConformers.ts";
import { checkPlaces } from "./geometry/checkPlaces.ts";
import { embed } from "./geometry/embed.ts";
import type { RestrainedPoint, TorsionTarget } from "./geometry/moleculeRestraints.ts";
import type { Coordinates } from "./geometry/placePoints.ts";
import type { Mechanics } from "./mechanics/Mechanics.ts";
import { rotamerTargets } from "./rotamerTargets.ts";
import { torsionAngle } from "./torsionAngle.ts";

/** Largest change of a ring torsion by relaxation, degrees, with its sign kept. */
const TOLERANCE = 45;
/** Rotamers closer in energy than this, kJ/mol, are taken for one. */
const SAME = 0.05;

export interface RelaxedConformer {
  readonly method: string;
  readonly points: readonly RestrainedPoint[];
  /** Å, three numbers for each point. */
  readonly coordinates: Coordinates;
  /** Energy of the force field, kJ/mol; only differences between forms of one molecule mean anything. */
  readonly energy_kJ_mol: number;
  /** Distinct rotamers found, lowest first: torsions in degrees, and energy above the lowest, kJ/mol. */
  readonly rotamers: readonly {
    readonly torsions: readonly TorsionTarget[];
    readonly energy_kJ_mol: number;
  }[];
}

/**
 * The lowest rotamer of a conformer, built from its graph and states and relaxed by mechanics with its ring states and
 * senses kept.
 * @returns null when it cannot be built, when the force field lacks a type, or when relaxation leaves the form.
 */
export function relaxConformer(arrangement: Arrangement, mechanics: Mechanics): RelaxedConformer | null {
  const { molecule, chairs } = arrangement;
  const found: (Omit<RelaxedConformer, "rotamers" | "method"> & { torsions: readonly TorsionTarget[] })[] =
    [];
  for (const rotamer of rotamerTargets(
    molecule,
    chairs.map(({ ring }) => ring),
  )) {
    const built = embed(arrangement, null, rotamer);
    if (built === null) continue;
    const settled = mechanics.relax(molecule, built.points, built.coordinates);
    if (settled === null) return null;
    if (!checkPlaces(molecule, built.points, settled.coordinates, built.torsions, TOLERANCE)) continue;
    const at = (atom: number) => ({
      x: settled.coordinates[3 * atom]!,
      y: settled.coordinates[3 * atom + 1]!,
      z: settled.coordinates[3 * atom + 2]!,
    });
    // What was asked for at the start may have turned; what is recorded is what was found.
    const torsions = rotamer.map(({ atoms }) => ({
      atoms,
      degrees: Math.round(torsionAngle(at(atoms[0]), at(atoms[1]), at(atoms[2]), at(atoms[3])) * 10) / 10 + 0,
    }));
    found.push({ points: built.points, torsions, ...settled });
  }
  found.sort((a, b) => a.energy_kJ_mol - b.energy_kJ_mol);
  const [best] = found;
  if (best === undefined) return null;
  const distinct = found.filter(
    ({ energy_kJ_mol }, i) => i === 0 || energy_kJ_mol - found[i - 1]!.energy_kJ_mol > SAME,
  );
  return {
    method: mechanics.method,
    points: best.points,
    coordinates: best.coordinates,
    energy_kJ_mol: best.energy_kJ_mol,
    rotamers: distinct.map(({ torsions, energy_kJ_mol }) => ({
      torsions,
      energy_kJ_mol: energy_kJ_mol - best.energy_kJ_mol,
    })),
  };
}
