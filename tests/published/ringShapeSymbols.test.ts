import { describe, expect, test } from "vitest";
import { nearestShape, RING_SHAPES } from "../../src/conformers/ringShape.ts";

/**
 * All 38 forms of a six-membered ring and their symbols, against the map on the sphere of forms and against the rules
 * read backwards: each symbol is taken apart, and a hexagon built here must have the plane and the sides it states.
 *
 * source: J. C. A. Boeyens, J. Cryst. Mol. Struct. 1978, 8, 317 (the map); JCBN, Pure Appl. Chem. 1981, 53, 1901, and
 * 2-Carb-7 (the symbols, the choice of plane); D. Cremer, J. A. Pople, J. Am. Chem. Soc. 1975, 97, 1354 (heights from
 * θ and φ). All from memory.
 */
const SOURCE = "(source: Boeyens 1978; JCBN 1981, from memory)";

type Vector = readonly [number, number, number];

/** Order of the places: ring oxygen, C1 to C5. */
const PLACES = ["O", "1", "2", "3", "4", "5"];

/** The map for φ = 0, 30 … 330°, as printed, exoplanar atoms before and after the letter. */
const NORTH = "O|E O|H|1 E|1 2|H|1 2|E 2|H|3 E|3 4|H|3 4|E 4|H|5 E|5 O|H|5";
const EQUATOR = "3O|B 3|S|1 B|14 5|S|1 25|B 2|S|O B|3O 1|S|3 14|B 1|S|5 B|25 O|S|2";
const SOUTH = "3|E 3|H|4 E|4 5|H|4 5|E 5|H|O E|O 1|H|O 1|E 1|H|2 E|2 3|H|2";

interface Reading {
  readonly letter: string;
  readonly above: readonly string[];
  readonly below: readonly string[];
}

function readMap(entry: string): Reading {
  const letter = /[A-Z](?=\||$)/.exec(entry.replaceAll(/O/g, "o"))![0];
  const [above, below] = entry.split(letter).map((part) => [...part.replaceAll("|", "")].sort());
  return { letter, above: above!, below: below! };
}

/** Takes the markup of a symbol apart without the parser of the program. */
function readSymbol(symbol: string): Reading {
  const marks = (sign: string) =>
    [...symbol.matchAll(new RegExp(`\\${sign}([O1-5])`, "g"))].map(([, place]) => place!).sort();
  return {
    letter: symbol.replaceAll(/[\^_][O1-5,]/g, ""),
    above: marks("^"),
    below: marks("_"),
  };
}

const rad = Math.PI / 180;

/** A hexagon of radius 1 with small heights from θ and φ; its numbering runs clockwise seen from +z. */
function hexagon(theta: number, phi: number): Vector[] {
  return [0, 1, 2, 3, 4, 5].map((j) => {
    const boat = Math.sin(theta * rad) * Math.sqrt(1 / 3) * Math.cos(phi * rad + (2 * Math.PI * j) / 3);
    const chair = Math.cos(theta * rad) * Math.sqrt(1 / 6) * (-1) ** j;
    return [Math.sin((j * Math.PI) / 3), Math.cos((j * Math.PI) / 3), boat + chair];
  });
}

/**
 * Six times the volume of the tetrahedron of four atoms. Positive: the last lies on the side from which the first three
 * run clockwise.
 */
function volume([a, b, c, d]: readonly Vector[]): number {
  const [u, v, w] = [b, c, d].map((p) => p!.map((value, k) => value - a![k]!)) as number[][];
  return -(
    u![0]! * (v![1]! * w![2]! - v![2]! * w![1]!) -
    u![1]! * (v![0]! * w![2]! - v![2]! * w![0]!) +
    u![2]! * (v![0]! * w![1]! - v![1]! * w![0]!)
  );
}

/** Pairs of atoms that may lie outside a plane of four: across the ring, neighbours, one atom between. */
const APART: Record<string, number> = { C: 3, B: 3, H: 1, S: 2 };

function inOnePlane(points: readonly Vector[], set: readonly number[]): boolean {
  const [a, b, c, ...rest] = set.map((i) => points[i]!);
  return rest.every((d) => Math.abs(volume([a!, b!, c!, d])) < 1e-3);
}

function planesOfFour(points: readonly Vector[], letter: string): number[][] {
  const pairs = [0, 1, 2, 3, 4, 5].flatMap((i) => [0, 1, 2, 3, 4, 5].map((j) => [i, j] as const));
  return pairs
    .filter(([i, j]) => i < j && Math.min(j - i, 6 - j + i) === APART[letter])
    .map(([i, j]) => [0, 1, 2, 3, 4, 5].filter((place) => place !== i && place !== j))
    .filter((set) => inOnePlane(points, set));
}

describe(`Symbols of the 38 forms ${SOURCE}`, () => {
  test("stand where the published map has them: θ of envelopes 54.7°, of half-chairs 50.8°, φ every 30°", () => {
    const rows = [
      { entries: NORTH, theta: { E: 54.7, H: 50.8 } as Record<string, number> },
      { entries: EQUATOR, theta: { B: 90, S: 90 } as Record<string, number> },
      { entries: SOUTH, theta: { E: 125.3, H: 129.2 } as Record<string, number> },
    ];
    const seen = rows.flatMap(({ entries, theta }) =>
      entries.split(" ").map((entry, k) => {
        const expected = readMap(entry);
        const { shape, distance } = nearestShape(theta[expected.letter]!, 30 * k);
        expect(readSymbol(shape.symbol)).toEqual(expected);
        // Half of the last printed digit of θ.
        expect(distance).toBeLessThan(0.051);
        return shape.symbol;
      }),
    );
    expect(new Set([...seen, "^4C_1", "^1C_4"]).size).toBe(38);
  });

  test.each(RING_SHAPES)(
    "$symbol at θ $theta°, φ $phi° has the plane and the sides that it states",
    (shape) => {
      const points = hexagon(shape.theta, shape.phi);
      const { letter, above, below } = readSymbol(shape.symbol);
      const out = [...above, ...below].map((name) => PLACES.indexOf(name));
      const plane = [0, 1, 2, 3, 4, 5].filter((place) => !out.includes(place));
      expect(plane).toHaveLength(letter === "E" ? 5 : 4);
      expect(inOnePlane(points, plane)).toBe(true);
      for (const place of out) {
        const side = volume([...plane.slice(0, 3), place].map((i) => points[i]!));
        expect(side > 0 ? "above" : "below").toBe(above.includes(PLACES[place]!) ? "above" : "below");
        expect(Math.abs(side)).toBeGreaterThan(0.1);
      }
    },
  );

  test.each(RING_SHAPES.filter(({ word }) => word !== "envelope"))(
    "$symbol takes, of the planes that qualify, the one that leaves the lowest-numbered carbon outside",
    (shape) => {
      const { letter, above, below } = readSymbol(shape.symbol);
      const planes = planesOfFour(hexagon(shape.theta, shape.phi), letter);
      // Three planes in a chair, two in a skew, one in the others (common practice).
      expect(planes).toHaveLength({ C: 3, S: 2 }[letter] ?? 1);
      const lowest = (set: readonly number[]) => [1, 2, 3, 4, 5].find((carbon) => !set.includes(carbon)) ?? 9;
      const stated = [...above, ...below].map((name) => PLACES.indexOf(name));
      const chosen = lowest([0, 1, 2, 3, 4, 5].filter((place) => !stated.includes(place)));
      expect(chosen).toBe(Math.min(...planes.map(lowest)));
    },
  );

  test("change into those of the mirror image with the sides exchanged", () => {
    for (const shape of RING_SHAPES) {
      const mirrored = nearestShape(180 - shape.theta, (shape.phi + 180) % 360).shape;
      const [own, other] = [readSymbol(shape.symbol), readSymbol(mirrored.symbol)];
      expect(other).toEqual({ letter: own.letter, above: own.below, below: own.above });
    }
  });
});
