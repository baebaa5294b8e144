import { describe, expect, test } from "vitest";
import { heightsOf, type Place, puckering } from "../../src/conformers/puckering.ts";
import { nearestShape, RING_SHAPES } from "../../src/conformers/ringShape.ts";
import { torsionAngle } from "../../src/conformers/torsionAngle.ts";

/**
 * Ring puckering in numbers.
 *
 * source: D. Cremer, J. A. Pople, J. Am. Chem. Soc. 1975, 97, 1354 (definition, ideal chair of 0.63 Å, glucopyranose ring
 * of sucrose); J. C. A. Boeyens, J. Cryst. Mol. Struct. 1978, 8, 317 (38 forms); JCBN, Pure Appl. Chem. 1981, 53, 1901
 * (symbols). All values from memory. A hexagon of radius r with heights z reproduces a shape exactly, since only heights
 * enter.
 */
const SOURCE = "(source: Cremer & Pople 1975, from memory)";

function hexagon(heights: readonly number[], radius = 1.4652): Place[] {
  // The numbering runs clockwise seen from +z, as the definition has the positive side.
  return heights.map((z, j) => ({
    x: radius * Math.cos((Math.PI / 3) * j),
    y: -radius * Math.sin((Math.PI / 3) * j),
    z,
  }));
}
const ring = (q2: number, phi: number, q3: number) => hexagon(heightsOf(q2, phi, q3));
const rad = Math.PI / 180;

describe(`Puckering of published rings ${SOURCE}`, () => {
  test("the tetrahedral chair with bonds of 1.54 Å has Q = r/√6 = 0.629 Å, printed as 0.63 Å, and θ = 0", () => {
    // Heights of ± r/6 · cos-projection: a tetrahedral chair has z = ± 1.54/6.
    const z = 1.54 / 6;
    const { Q, theta, phi } = puckering(hexagon([z, -z, z, -z, z, -z], 1.4519));
    expect(Math.abs(Q - 0.63)).toBeLessThan(0.005);
    expect(Math.abs(Q - 0.6287)).toBeLessThan(0.00005);
    expect(theta).toBeCloseTo(0, 9);
    expect(phi).toBeNull();
  });

  test("cyclohexane by electron diffraction (C–C 1.536 Å, C–C–C 111.4°) has Q = 0.565 Å and torsions of ±54.9°", () => {
    const z = 0.2305;
    const places = hexagon([z, -z, z, -z, z, -z], 1.4652);
    expect(Math.abs(puckering(places).Q - 0.5646)).toBeLessThan(0.0001);
    // From the angle alone: cos ω = −cos α/(1 + cos α).
    const alpha = 111.4 * rad;
    const omega = Math.acos(-Math.cos(alpha) / (1 + Math.cos(alpha))) / rad;
    places.forEach((_, k) => {
      const at = (step: number) => places[(k + step) % 6]!;
      const torsion = torsionAngle(at(0), at(1), at(2), at(3));
      expect(Math.abs(Math.abs(torsion) - omega)).toBeLessThan(0.1);
      const next = torsionAngle(at(1), at(2), at(3), at(4));
      expect(Math.sign(torsion)).toBe(-Math.sign(next));
    });
  });

  test("the glucopyranose ring of sucrose: Q = 0.556 Å, θ = 5.2°, φ = 183.7°, and back from its heights", () => {
    const heights = [0.197, -0.2099, 0.2389, -0.2551, 0.2422, -0.2132];
    const found = puckering(hexagon(heights));
    expect(found.Q.toFixed(3)).toBe("0.556");
    expect(found.theta.toFixed(1)).toBe("5.2");
    // Heights to 0.0001 Å fix the phase to about 0.2° at this small q2.
    expect(Math.abs(found.phi! - 183.7)).toBeLessThan(0.2);
    const q2 = 0.556 * Math.sin(5.2 * rad);
    const q3 = 0.556 * Math.cos(5.2 * rad);
    for (const [j, z] of heightsOf(q2, 183.7, q3).entries())
      expect(Math.abs(z - heights[j]!)).toBeLessThan(0.00006);
    expect(nearestShape(found.theta, found.phi).shape.symbol).toBe("^4C_1");
  });

  test("a ring in general orientation: Q 0.6000 Å, θ 70.00°, φ 25.00°, q2 0.5638, q3 0.2052", () => {
    const places = [
      [-0.2677, 2.7775, 2.8146],
      [1.1695, 3.2794, 2.252],
      [2.2404, 2.7357, 3.1601],
      [2.1197, 1.3983, 3.7289],
      [0.9643, 0.5617, 3.2568],
      [-0.2262, 1.2474, 2.7877],
    ].map(([x, y, z]) => ({ x: x!, y: y!, z: z! }));
    const found = puckering(places);
    expect(found.Q.toFixed(4)).toBe("0.6000");
    expect(found.theta.toFixed(2)).toBe("70.00");
    expect(found.phi!.toFixed(2)).toBe("25.00");
    expect(found.q2.toFixed(4)).toBe("0.5638");
    expect(found.q3.toFixed(4)).toBe("0.2052");
    const expected = [0.3788, -0.3504, 0.0554, 0.2113, -0.1829, -0.1121];
    for (const [j, z] of found.heights.entries()) expect(z.toFixed(4)).toBe(expected[j]!.toFixed(4));
  });
});

describe(`Puckering depends on the order of the atoms as its definition says ${SOURCE}`, () => {
  const places = ring(0.3, 40, 0.45);
  const { theta, phi, Q } = puckering(places);
  const turn = (degrees: number) => ((degrees % 360) + 360) % 360;

  test("ring inversion takes θ to 180° − θ and φ to φ + 180°", () => {
    const inverted = puckering(places.map(({ x, y, z }) => ({ x, y, z: -z })));
    expect(inverted.Q).toBeCloseTo(Q, 9);
    expect(inverted.theta).toBeCloseTo(180 - theta, 9);
    expect(inverted.phi).toBeCloseTo(turn(phi! + 180), 9);
  });

  test("starting one atom later takes φ to φ + 120° and θ to 180° − θ", () => {
    const later = puckering([...places.slice(1), places[0]!]);
    expect(later.theta).toBeCloseTo(180 - theta, 9);
    expect(later.phi).toBeCloseTo(turn(phi! + 120), 9);
  });

  test("walking backwards from the same atom takes φ to 180° − φ and θ to 180° − θ", () => {
    const back = puckering([places[0]!, ...places.slice(1).reverse()]);
    expect(back.theta).toBeCloseTo(180 - theta, 9);
    expect(back.phi).toBeCloseTo(turn(180 - phi!), 9);
  });
});

describe("The 38 canonical forms and their symbols (source: Boeyens 1978; JCBN 1981, from memory)", () => {
  test("are 2 chairs, 6 boats, 6 skews, 12 half-chairs and 12 envelopes, all different", () => {
    const count = (word: string) => RING_SHAPES.filter((shape) => shape.word === word).length;
    expect(["chair", "boat", "twist-boat", "half-chair", "envelope"].map(count)).toEqual([2, 6, 6, 12, 12]);
    expect(new Set(RING_SHAPES.map(({ symbol }) => symbol)).size).toBe(38);
  });

  test.each([
    [0, 0, "^4C_1"],
    [180, 0, "^1C_4"],
    [90, 0, "^3^,^OB"],
    [90, 60, "B_1_,_4"],
    [90, 120, "^2^,^5B"],
    [90, 180, "B_3_,_O"],
    [90, 240, "^1^,^4B"],
    [90, 300, "B_2_,_5"],
    [90, 30, "^3S_1"],
    [90, 90, "^5S_1"],
    [90, 150, "^2S_O"],
    [90, 210, "^1S_3"],
    [90, 270, "^1S_5"],
    [90, 330, "^OS_2"],
    [54.7, 0, "^OE"],
    [125.3, 300, "E_2"],
    [50.8, 30, "^OH_1"],
    [50.8, 210, "^4H_3"],
    [129.2, 90, "^5H_4"],
    [129.2, 150, "^5H_O"],
    [129.2, 330, "^3H_2"],
  ])("θ %s°, φ %s° is %s", (theta, phi, symbol) => {
    const { shape, distance } = nearestShape(theta, phi);
    expect(shape.symbol).toBe(symbol);
    expect(distance).toBeLessThan(0.1);
  });
});
