import { describe, expect, test } from "vitest";
import { equilibriumConstant } from "../../src/energetics/equilibriumConstant.ts";
import { formatK } from "../../src/quantity/formatK.ts";
import { roundPopulation } from "../../src/quantity/roundPopulation.ts";
import { roundSignificant } from "../../src/quantity/roundSignificant.ts";
import { fromKilocalorie, kelvin, kilojoulePerMole } from "../../src/quantity/units.ts";

const ROOM = kelvin(298.15);

describe("Equilibrium constants as printed", () => {
  // Source: Clayden, Greeves, Warren, Organic Chemistry, 2nd ed. 2012, ch. 16, table of equatorial preferences,
  // from memory. ΔG° is printed to 0.1 kJ/mol and K to two figures, which together allow about 5 % in K.
  test.each([
    { compound: "methylcyclohexane", deltaG: 7.3, printed: "19" },
    { compound: "methoxycyclohexane", deltaG: 2.5, printed: "2.7" },
  ])(
    "$compound: $deltaG kJ/mol is K = $printed (source: clayden-2012, ch. 16, from memory)",
    ({ deltaG, printed }) => {
      const K = equilibriumConstant(kilojoulePerMole(-deltaG), ROOM);
      expect(formatK(K)).toBe(printed);
      expect(Math.abs(K / Number(printed) - 1)).toBeLessThan(0.05);
    },
  );
});

describe("Populations every chemist knows", () => {
  test.each([
    { words: "1.0 kcal/mol is 84 : 16", deltaG: 1.0, major: "84", minor: "16" },
    { words: "methyl, 1.74 kcal/mol, is 95 : 5", deltaG: 1.74, major: "95", minor: "5" },
    { words: "no difference is 50 : 50", deltaG: 0, major: "50", minor: "50" },
  ])("$words (common practice)", ({ deltaG, major, minor }) => {
    const K = equilibriumConstant(fromKilocalorie(deltaG), ROOM);
    const share = K / (1 + K);
    // An interval of ten per cent either way asks for whole per cents, as the trade quotes them.
    const whole = (fraction: number) => roundPopulation(fraction, [fraction - 0.05, fraction + 0.05]).value;
    expect([whole(1 - share), whole(share)]).toEqual([major, minor]);
  });

  test("1.36 kcal/mol is a factor of ten (common practice)", () => {
    expect(roundSignificant(equilibriumConstant(fromKilocalorie(-1.36), ROOM), 2)).toEqual({
      mantissa: "9.9",
      exponent: 0,
    });
    expect(equilibriumConstant(fromKilocalorie(-1.364), ROOM)).toBeCloseTo(10, 1);
  });
});
