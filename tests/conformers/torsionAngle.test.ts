import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Place } from "../../src/conformers/puckering.ts";
import { torsionAngle } from "../../src/conformers/torsionAngle.ts";

const at = (x: number, y: number, z: number): Place => ({ x, y, z });
const rad = Math.PI / 180;

/** Four atoms seen from the first bond's near end: the near bond points up the page, the far one turned clockwise. */
function turned(clockwise: number): [Place, Place, Place, Place] {
  // The viewer looks along −z, x to the right, y up the page.
  const far = at(Math.sin(clockwise * rad), Math.cos(clockwise * rad), -1.9);
  return [at(0, 1, 0.4), at(0, 0, 0), at(0, 0, -1.5), far];
}

describe("The torsion angle", () => {
  test.each([0, 30, 60, 90, 120, 150, 179, -30, -60, -90, -150, -179])(
    "is %s° when the far bond is turned clockwise by that (source: Klyne & Prelog 1960, sign; from memory)",
    (angle) => {
      expect(torsionAngle(...turned(angle))).toBeCloseTo(angle, 9);
    },
  );

  test("is 180° in size when the bonds are antiperiplanar", () => {
    expect(Math.abs(torsionAngle(...turned(180)))).toBeCloseTo(180, 9);
  });

  const coordinate = fc.integer({ min: -300, max: 300 }).map((n) => n / 100);
  const place = fc.record({ x: coordinate, y: coordinate, z: coordinate });

  test("is the same read from either end, and changes sign in the mirror", () => {
    fc.assert(
      fc.property(fc.tuple(place, place, place, place), ([a, b, c, d]) => {
        const forward = torsionAngle(a, b, c, d);
        // Where three atoms are in line there is no torsion, and at 180° the sign is arbitrary.
        fc.pre(thick(a, b, c) && thick(b, c, d) && Math.abs(forward) < 179.99);
        expect(torsionAngle(d, c, b, a)).toBeCloseTo(forward, 6);
        const mirror = ({ x, y, z }: Place) => at(x, y, -z);
        expect(torsionAngle(mirror(a), mirror(b), mirror(c), mirror(d))).toBeCloseTo(-forward, 6);
      }),
      { seed: 20261201, numRuns: 300 },
    );
  });
});

function thick(a: Place, b: Place, c: Place): boolean {
  const [u, v] = [at(b.x - a.x, b.y - a.y, b.z - a.z), at(c.x - b.x, c.y - b.y, c.z - b.z)];
  return Math.hypot(u.y * v.z - u.z * v.y, u.z * v.x - u.x * v.z, u.x * v.y - u.y * v.x) > 0.05;
}
