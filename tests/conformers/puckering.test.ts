import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { heightsOf, type Place, puckering } from "../../src/conformers/puckering.ts";

const rad = Math.PI / 180;

/** A regular hexagon of radius 1.45 Å with these heights, its numbering clockwise seen from +z. */
function hexagon(heights: readonly number[]): Place[] {
  return heights.map((z, j) => ({
    x: 1.45 * Math.sin((j * Math.PI) / 3),
    y: 1.45 * Math.cos((j * Math.PI) / 3),
    z,
  }));
}

/** Turned about x by a and then about z by b, degrees, and moved. */
function moved(ring: readonly Place[], a: number, b: number): Place[] {
  const [ca, sa, cb, sb] = [Math.cos(a * rad), Math.sin(a * rad), Math.cos(b * rad), Math.sin(b * rad)];
  return ring.map(({ x, y, z }) => {
    const [y1, z1] = [ca * y - sa * z, sa * y + ca * z];
    return { x: cb * x - sb * y1 + 3.1, y: sb * x + cb * y1 - 7.7, z: z1 + 0.9 };
  });
}

const shapes = fc.record({
  Q: fc.integer({ min: 20, max: 90 }).map((n) => n / 100),
  theta: fc.integer({ min: 15, max: 165 }),
  phi: fc.integer({ min: 0, max: 359 }),
  a: fc.integer({ min: 0, max: 359 }),
  b: fc.integer({ min: 0, max: 359 }),
});

describe("Puckering of a six-membered ring", () => {
  test("comes back from the heights it gives, however the ring lies in space", () => {
    fc.assert(
      fc.property(shapes, ({ Q, theta, phi, a, b }) => {
        const heights = heightsOf(Q * Math.sin(theta * rad), phi, Q * Math.cos(theta * rad));
        const found = puckering(moved(hexagon(heights), a, b));
        expect(found.Q).toBeCloseTo(Q, 9);
        expect(found.theta).toBeCloseTo(theta, 7);
        const off = Math.abs(found.phi! - phi);
        expect(Math.min(off, 360 - off)).toBeLessThan(1e-6);
        for (const [j, z] of found.heights.entries()) expect(z).toBeCloseTo(heights[j]!, 9);
      }),
      { seed: 20261201, numRuns: 300 },
    );
  });

  test("has heights that sum to zero, also with the weights of the mean plane, for any six atoms", () => {
    const coordinate = fc.integer({ min: -20, max: 20 }).map((n) => n / 100);
    const jitter = fc.array(fc.record({ x: coordinate, y: coordinate, z: coordinate }), {
      minLength: 6,
      maxLength: 6,
    });
    fc.assert(
      fc.property(jitter, (shifts) => {
        const ring = hexagon([0.25, -0.25, 0.25, -0.25, 0.25, -0.25]).map((place, j) => ({
          x: place.x + shifts[j]!.x,
          y: place.y + shifts[j]!.y,
          z: place.z + shifts[j]!.z,
        }));
        const { heights, Q, q2, q3 } = puckering(ring);
        for (const weight of [() => 1, Math.cos, Math.sin]) {
          const sum = heights.reduce((total, z, j) => total + z * weight((Math.PI / 3) * j), 0);
          expect(sum).toBeCloseTo(0, 9);
        }
        expect(heights.reduce((total, z) => total + z * z, 0)).toBeCloseTo(Q * Q, 9);
        expect(q2 * q2 + q3 * q3).toBeCloseTo(Q * Q, 9);
      }),
      { seed: 20261201, numRuns: 300 },
    );
  });

  test("gives no phase below q2 = 0.05 Å and one above", () => {
    expect(puckering(hexagon(heightsOf(0.049, 120, 0.55))).phi).toBeNull();
    expect(puckering(hexagon(heightsOf(0.051, 120, 0.55))).phi).toBeCloseTo(120, 6);
  });

  test("is refused for anything but six atoms", () => {
    expect(() => puckering(hexagon([0, 0, 0, 0, 0]))).toThrow("six atoms");
  });
});
