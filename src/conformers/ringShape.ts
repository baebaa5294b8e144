import { heightsOf } from "./puckering.ts";

/** One of the 38 canonical forms of a six-membered ring. */
export interface RingShape {
  /** chair, boat, twist-boat, half-chair or envelope. */
  readonly word: string;
  /** IUPAC symbol for the order O, C1 … C5, label markup: `^4C_1`, `^{2,5}B` as `^2^,^5B`. */
  readonly symbol: string;
  /** Degrees on the sphere of forms; phi is 0 for chairs, where it has no meaning. */
  readonly theta: number;
  readonly phi: number;
}

/** Names of the places in sugar numbering, ring oxygen first. */
const PLACES = ["O", "1", "2", "3", "4", "5"];
/** Polar angles of the intermediate forms on a regular hexagon: envelopes and half-chairs, degrees. */
const ENVELOPE = 54.7356;
const HALF_CHAIR = 50.7685;
/** Heights this close, as a share of the largest, are in one plane; the forms are exact, so it only absorbs rounding. */
const IN_PLANE = 1e-3;

/**
 * The canonical forms with their IUPAC symbols (2-Carb-7; JCBN, Pure Appl. Chem. 1981, 53, 1901; rules from memory).
 * Four or five atoms span the reference plane; the others are exoplanar: above, on the side from which the numbering
 * runs clockwise, they are left superscripts, below right subscripts. Where several planes qualify, the one that
 * leaves the lowest-numbered carbon exoplanar is taken.
 */
export const RING_SHAPES: readonly RingShape[] = [
  { word: "chair", symbol: "^4C_1", theta: 0, phi: 0 },
  { word: "chair", symbol: "^1C_4", theta: 180, phi: 0 },
  ...[0, 60, 120, 180, 240, 300].flatMap((phi) => [
    shape("boat", "B", 90, phi),
    shape("twist-boat", "S", 90, phi + 30),
    shape("envelope", "E", ENVELOPE, phi),
    shape("envelope", "E", 180 - ENVELOPE, phi),
    shape("half-chair", "H", HALF_CHAIR, phi + 30),
    shape("half-chair", "H", 180 - HALF_CHAIR, phi + 30),
  ]),
];

/**
 * The canonical form nearest to a shape, and its angular distance on the sphere of forms, degrees.
 * @param theta - degrees, 0 to 180.
 * @param phi - degrees; null where it has no meaning.
 */
export function nearestShape(
  theta: number,
  phi: number | null,
): { readonly shape: RingShape; readonly distance: number } {
  const rad = Math.PI / 180;
  const distance = (form: RingShape) => {
    const cosine =
      Math.cos(theta * rad) * Math.cos(form.theta * rad) +
      Math.sin(theta * rad) * Math.sin(form.theta * rad) * Math.cos(((phi ?? 0) - form.phi) * rad);
    return Math.acos(Math.max(-1, Math.min(1, cosine))) / rad;
  };
  const best = [...RING_SHAPES].sort((a, b) => distance(a) - distance(b))[0]!;
  return { shape: best, distance: distance(best) };
}

function shape(word: string, letter: string, theta: number, phi: number): RingShape {
  const planar = letter === "E" ? 5 : 4;
  const z = heightsOf(Math.sin((theta * Math.PI) / 180), phi, Math.cos((theta * Math.PI) / 180));
  const points = z.map((height, j) => [Math.cos((Math.PI / 3) * j), -Math.sin((Math.PI / 3) * j), height]);
  const planes = subsets(planar).filter((set) => coplanar(points, set) && allowed(letter, set));
  // The lowest-numbered carbon outside the plane comes first; the ring oxygen counts last.
  const rank = (set: readonly number[]) => [1, 2, 3, 4, 5, 0].findIndex((place) => !set.includes(place));
  const plane = [...planes].sort((a, b) => rank(a) - rank(b))[0]!;
  const outside = [0, 1, 2, 3, 4, 5].filter((place) => !plane.includes(place));
  const above = outside.filter((place) => heightOver(points, plane, place) > 0);
  const below = outside.filter((place) => !above.includes(place));
  const order = (list: readonly number[]) =>
    [...list].sort((a, b) => (a || 9) - (b || 9)).map((p) => PLACES[p]!);
  const mark = (list: readonly number[], sign: string) =>
    order(list)
      .map((place) => `${sign}${place}`)
      .join(`${sign},`);
  return { word, symbol: `${mark(above, "^")}${letter}${mark(below, "_")}`, theta, phi };
}

/** Reference planes: four atoms in two pairs for boats, four in a row for half-chairs, a row of three and one apart for skews. */
function allowed(letter: string, set: readonly number[]): boolean {
  const outside = [0, 1, 2, 3, 4, 5].filter((place) => !set.includes(place));
  if (outside.length === 1) return true;
  const apart = Math.min(outside[1]! - outside[0]!, 6 - (outside[1]! - outside[0]!));
  return apart === { B: 3, H: 1, S: 2 }[letter];
}

function subsets(size: number): readonly (readonly number[])[] {
  const all: number[][] = [];
  for (let code = 0; code < 64; code++) {
    const set = [0, 1, 2, 3, 4, 5].filter((bit) => (code >> bit) & 1);
    if (set.length === size) all.push(set);
  }
  return all;
}

function normalOf(points: readonly (readonly number[])[], set: readonly number[]): readonly number[] {
  const [a, b, c] = set.map((i) => points[i]!) as [readonly number[], readonly number[], readonly number[]];
  const u = b.map((value, k) => value - a[k]!);
  const v = c.map((value, k) => value - a[k]!);
  const n = [u[1]! * v[2]! - u[2]! * v[1]!, u[2]! * v[0]! - u[0]! * v[2]!, u[0]! * v[1]! - u[1]! * v[0]!];
  const length = Math.hypot(...n) * (n[2]! < 0 ? -1 : 1);
  return n.map((value) => value / length);
}

/** Height of an atom over the plane of a set, towards the side from which the numbering runs clockwise. */
function heightOver(points: readonly (readonly number[])[], set: readonly number[], place: number): number {
  const normal = normalOf(points, set);
  const origin = points[set[0]!]!;
  return points[place]!.reduce((sum, value, k) => sum + (value - origin[k]!) * normal[k]!, 0);
}

function coplanar(points: readonly (readonly number[])[], set: readonly number[]): boolean {
  return set.every((place) => Math.abs(heightOver(points, set, place)) < IN_PLANE);
}
