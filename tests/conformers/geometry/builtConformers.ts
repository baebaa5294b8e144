import { type Arrangement, enumerateConformers } from "../../../src/conformers/enumerateConformers.ts";
import type { RestrainedPoint } from "../../../src/conformers/geometry/moleculeRestraints.ts";
import type { Coordinates } from "../../../src/conformers/geometry/placePoints.ts";
import { torsionAngle } from "../../../src/conformers/torsionAngle.ts";
import { analyseRings } from "../../../src/structure/analyseRings.ts";
import { findOpenCentres } from "../../../src/structure/findOpenCentres.ts";
import { findRings } from "../../../src/structure/findRings.ts";
import { bareServices } from "../bareServices.ts";

/** Every conformer of a SMILES as the pipeline lists them, its open senses filled in as there. */
export async function arrangementsOf(smiles: string): Promise<readonly Arrangement[]> {
  const services = await bareServices();
  const read = services.toolkit.read(smiles);
  if (!read.ok) throw new Error(`${smiles}: ${read.reason}`);
  const { molecule } = findOpenCentres(read.molecule, services.toolkit).members[0]!;
  const search = findRings(molecule);
  if (!search.ok) throw new Error(`${smiles}: ${search.refusal.message}`);
  const rings = analyseRings(molecule, search.rings, { ring: null, atoms: new Map() }, services);
  return enumerateConformers(molecule, rings) ?? [];
}

export const placeOf = (coordinates: Coordinates, i: number) => ({
  x: coordinates[3 * i]!,
  y: coordinates[3 * i + 1]!,
  z: coordinates[3 * i + 2]!,
});

/** Dihedral angle in degrees of four input atoms in built coordinates. */
export function torsionOf(
  points: readonly RestrainedPoint[],
  coordinates: Coordinates,
  atoms: readonly number[],
): number {
  const [a, b, c, d] = atoms.map((atom) =>
    placeOf(
      coordinates,
      points.findIndex((point) => point.atom === atom),
    ),
  );
  return torsionAngle(a!, b!, c!, d!);
}
