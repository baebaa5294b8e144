import { describe, expect, test } from "vitest";
import { nearestShape } from "../../src/conformers/ringShape.ts";

describe("The nearest form and its distance", () => {
  test("is a chair at θ whatever φ, and at θ from the pole where φ has no meaning", () => {
    for (const phi of [null, 0, 77, 183.7, 359]) {
      const near = nearestShape(5.2, phi);
      expect(near.shape.symbol).toBe("^4C_1");
      expect(near.distance).toBeCloseTo(5.2, 9);
      expect(nearestShape(174.8, phi).shape.symbol).toBe("^1C_4");
    }
  });

  test("counts φ round the circle: 355° lies 5° from 0° on the equator", () => {
    const { shape, distance } = nearestShape(90, 355);
    expect(shape.word).toBe("boat");
    expect(shape.phi).toBe(0);
    expect(distance).toBeCloseTo(5, 6);
  });
});
