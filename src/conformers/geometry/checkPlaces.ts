import type { Molecule } from "../../structure/Molecule.ts";
import type { RestrainedPoint, TorsionTarget } from "./moleculeRestraints.ts";
import type { Coordinates } from "./placePoints.ts";

/** Torsions smaller than this, in degrees, have no sign to keep. */
const SIGNED = 12;
/** Least volume of three unit vectors along bonds that still counts as tetrahedral; 0.77 is ideal. */
const LEAST_VOLUME = 0.15;

/**
 * Whether coordinates are what was asked for: every torsion within a tolerance and of the right sign, every tetrahedral
 * sense as given.
 * @param tolerance - largest difference of a torsion, degrees.
 */
export function checkPlaces(
  molecule: Molecule,
  points: readonly RestrainedPoint[],
  coordinates: Coordinates,
  torsions: readonly TorsionTarget[],
  tolerance: number,
): boolean {
  const place = new Map(
    points.flatMap(({ atom }, i): [number, number][] => (atom === null ? [] : [[atom, i]])),
  );
  const at = (i: number): Vector => [coordinates[3 * i]!, coordinates[3 * i + 1]!, coordinates[3 * i + 2]!];
  const good = torsions.every(({ atoms, degrees }) => {
    const [a, b, c, d] = atoms.map((atom) => at(place.get(atom)!)) as [Vector, Vector, Vector, Vector];
    const found = torsion(a, b, c, d);
    const off = Math.abs(((((found - degrees + 180) % 360) + 360) % 360) - 180);
    return off <= tolerance && (Math.abs(degrees) < SIGNED || Math.sign(found) === Math.sign(degrees));
  });
  if (!good) return false;
  return points.every((point, i) => {
    if (point.atom === null || point.parent !== null) return true;
    const atom = molecule.atoms[point.atom]!;
    if (atom.stereo === null) return true;
    const hydrogens = points.flatMap(({ atom: other, parent }, j) =>
      other === null && parent === point.atom ? [j] : [],
    );
    const list = [...atom.neighbours.map((neighbour) => place.get(neighbour)!), ...hydrogens];
    if (list.length < 3) return true;
    const bonds = list.map((j) => minus(at(j), at(i)));
    const sense = atom.stereo === "cw" ? 1 : -1;
    // A lone pair stands in fourth place, so that three neighbours run against the sense.
    if (bonds.length === 3) return -sense * handedness(bonds[0]!, bonds[1]!, bonds[2]!) > LEAST_VOLUME;
    // Each bond must stand on its own side of the other three: one triple alone lets the fourth bond fold through.
    return bonds.every((_, left) => {
      const [u, v, w] = bonds.filter((_bond, k) => k !== left) as [Vector, Vector, Vector];
      return (left % 2 === 0 ? sense : -sense) * handedness(u, v, w) > LEAST_VOLUME;
    });
  });
}

type Vector = readonly [number, number, number];
const minus = (a: Vector, b: Vector): Vector => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
const dot = (a: Vector, b: Vector) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
const norm = (a: Vector) => Math.hypot(...a);
const handedness = (u: Vector, v: Vector, w: Vector) => dot(u, cross(v, w)) / (norm(u) * norm(v) * norm(w));

function torsion(a: Vector, b: Vector, c: Vector, d: Vector): number {
  const [u, v, w] = [minus(b, a), minus(c, b), minus(d, c)];
  const n = cross(u, v);
  const m = cross(v, w);
  return (Math.atan2(norm(v) * dot(u, m), dot(n, m)) * 180) / Math.PI;
}
