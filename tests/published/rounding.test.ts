import { describe, expect, test } from "vitest";
import { formatEnergy } from "../../src/quantity/formatEnergy.ts";
import { formatPopulation } from "../../src/quantity/formatPopulation.ts";
import { formatTemperature } from "../../src/quantity/formatTemperature.ts";
import { roundToUncertainty } from "../../src/quantity/roundToUncertainty.ts";

describe("Rounding to the uncertainty", () => {
  // Source: JCGM 100:2008 (GUM), 7.2.6; wording seen in stored pages that quote the clause.
  test("gives 10.058 Ω for y = 10.057 62 Ω with u = 27 mΩ (source: JCGM 100:2008, 7.2.6)", () => {
    expect(roundToUncertainty(10.05762, 0.027)).toMatchObject({ value: "10.058", u: "0.027" });
  });

  test("rounds u = 28.05 kHz down to 28 kHz (source: JCGM 100:2008, 7.2.6)", () => {
    expect(roundToUncertainty(0, 28.05).u).toBe("28");
  });

  // Source: CODATA 2018 recommended values, from memory; printed there with two digits of uncertainty.
  test.each([
    { quantity: "G / 10⁻¹¹ m³ kg⁻¹ s⁻²", y: 6.674302, u: 0.0001499, value: "6.67430", printed: "0.00015" },
    {
      quantity: "electron mass / 10⁻³¹ kg",
      y: 9.10938370152,
      u: 2.801e-9,
      value: "9.1093837015",
      printed: "0.0000000028",
    },
    {
      quantity: "inverse fine-structure constant",
      y: 137.0359990843,
      u: 2.1e-8,
      value: "137.035999084",
      printed: "0.000000021",
    },
  ])("prints $quantity as CODATA does (source: CODATA 2018, from memory)", ({ y, u, value, printed }) => {
    expect(roundToUncertainty(y, u)).toMatchObject({ value, u: printed });
  });
});

describe("Numbers with units", () => {
  // Source: SI Brochure (BIPM), 8th edition 2006, 5.3.3, seen: a space always separates number and unit, °C included.
  test("have a space before the unit, °C included (source: SI Brochure, 8th ed., 5.3.3)", () => {
    expect(formatEnergy(7.28, 0.25)).toMatch(/\d\u00a0kJ\/mol .*\d\u00a0kcal\/mol/);
    expect(formatTemperature(298.15, { celsius: true })).toBe("298.15\u00a0K (25\u00a0°C)");
  });

  test("have a space before the per cent sign (source: SI Brochure, 9th ed., 5.4.7, from memory)", () => {
    expect(formatPopulation(0.95, [0.941, 0.957])).toMatch(/^95\.0\u00a0%/);
  });
});
