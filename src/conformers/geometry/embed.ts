import type { Molecule } from "../../structure/Molecule.ts";
import type { Arrangement } from "../enumerateConformers.ts";
import { checkPlaces } from "./checkPlaces.ts";
import { facedMolecule } from "./facedMolecule.ts";
import { moleculeRestraints, type RestrainedPoint, type TorsionTarget } from "./moleculeRestraints.ts";
import { type Coordinates, placePoints } from "./placePoints.ts";

/** Starts that are tried before an arrangement is given up. */
const STARTS = 12;
/** Largest difference of a ring torsion from what was asked, degrees. */
const TOLERANCE = 35;

/** Coordinates (Å) of points, three numbers each. */
export interface Embedded {
  readonly points: readonly RestrainedPoint[];
  readonly coordinates: Coordinates;
  readonly torsions: readonly TorsionTarget[];
}

/**
 * Three-dimensional coordinates of a conformer from its graph, senses and ring states alone, the same on every run.
 * @param cutOut - ring atoms of one system, for an ideal drawing of it; null for the whole molecule with hydrogens.
 * @param rotamer - torsions about bonds to groups, where one rotamer is wanted.
 * @returns null when no start leads to coordinates that fulfil the senses and torsions.
 */
export function embed(
  arrangement: Arrangement,
  cutOut: ReadonlySet<number> | null,
  rotamer: readonly TorsionTarget[] = [],
): Embedded | null {
  const molecule = facedMolecule(arrangement);
  const torsions = torsionTargets(arrangement, cutOut);
  const { points, restraints } = moleculeRestraints(molecule, [...torsions, ...rotamer], { cutOut });
  let best: { coordinates: Coordinates; penalty: number } | null = null;
  let good = 0;
  for (let seed = 1; seed <= STARTS; seed++) {
    const { coordinates, penalty } = placePoints(restraints, seed);
    if (!checkPlaces(molecule, points, coordinates, torsions, TOLERANCE)) continue;
    if (best === null || penalty < best.penalty) best = { coordinates, penalty };
    // A clean result needs no second; a strained one is tried again for a better.
    good += 1;
    if (best.penalty < 0.02 * points.length || good >= 3) break;
  }
  return best === null ? null : { points, coordinates: best.coordinates, torsions };
}

/** The endocyclic torsions of a conformer's rings; chairs of a drawing stand on the diamond lattice. */
export function torsionTargets(
  { molecule, chairs }: { readonly molecule: Molecule; readonly chairs: Arrangement["chairs"] },
  cutOut: ReadonlySet<number> | null,
): readonly TorsionTarget[] {
  const analysed = chairs
    .filter(({ ring }) => cutOut === null || ring.atoms.every((atom) => cutOut.has(atom)))
    .flatMap(({ ring, torsions, form }) =>
      torsions.map((degrees, k): TorsionTarget => {
        const at = (step: number) => ring.atoms[(k + step + 6) % 6]!;
        const ideal = cutOut !== null && form === "chair" ? Math.sign(degrees) * 60 : degrees;
        return { atoms: [at(-1), at(0), at(1), at(2)], degrees: ideal };
      }),
    );
  const aromatic = molecule.rings
    .filter((ring) => ring.length > 3 && ring.every((atom) => molecule.atoms[atom]!.aromatic))
    .filter((ring) => cutOut === null || ring.every((atom) => cutOut.has(atom)))
    .flatMap((ring) =>
      ring.map((_, k): TorsionTarget => {
        const at = (step: number) => ring[(k + step + ring.length) % ring.length]!;
        return { atoms: [at(-1), at(0), at(1), at(2)], degrees: 0 };
      }),
    );
  return [...analysed, ...aromatic];
}
