import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { formatEnergy } from "../../src/quantity/formatEnergy.ts";
import { formatInterval } from "../../src/quantity/formatInterval.ts";
import { formatK } from "../../src/quantity/formatK.ts";
import { formatPopulation } from "../../src/quantity/formatPopulation.ts";
import { formatTemperature } from "../../src/quantity/formatTemperature.ts";
import { roundPopulation } from "../../src/quantity/roundPopulation.ts";
import { roundToUncertainty } from "../../src/quantity/roundToUncertainty.ts";
import { toDecimals } from "../../src/quantity/toDecimals.ts";

/** Ordinary spaces in place of no-break ones, so that expectations can be read. */
const plain = (text: string) => text.replaceAll("\u00a0", " ");

describe("A number with fixed decimals", () => {
  test("rounds halves away from zero on the digits a reader sees", () => {
    expect(toDecimals(2.675, 2)).toBe("2.68");
    expect(toDecimals(-2.675, 2)).toBe("-2.68");
    expect(toDecimals(1.45, 1)).toBe("1.5");
    expect(toDecimals(118, -1)).toBe("120");
  });

  test("is never a negative zero", () => {
    expect(toDecimals(-0.004, 2)).toBe("0.00");
    expect(toDecimals(-0, 0)).toBe("0");
  });

  test("refuses what is not a number", () => {
    expect(() => toDecimals(Number.NaN, 2)).toThrow(RangeError);
  });

  test("differs from the value by no more than half a unit of its last place", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e4, max: 1e4, noNaN: true }),
        fc.integer({ min: 0, max: 4 }),
        (value, decimals) => {
          expect(Math.abs(Number(toDecimals(value, decimals)) - value)).toBeLessThanOrEqual(
            0.5000001 * 10 ** -decimals,
          );
        },
      ),
    );
  });
});

describe("A value with its uncertainty", () => {
  test.each([
    [7.28, 0.25, "7.28", "0.25"],
    [7.28, 0.3, "7.3", "0.3"],
    [14.645, 1.35, "14.6", "1.4"],
    [118, 34, "120", "30"],
    [1.234, 0.096, "1.23", "0.10"],
    [1.234, 0.0299, "1.234", "0.030"],
  ])("%d with u = %d is printed %s ± %s", (value, u, printed, printedU) => {
    expect(roundToUncertainty(value, u)).toMatchObject({ value: printed, u: printedU });
  });

  test("never shows more than two significant digits of the uncertainty", () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1e3, noNaN: true }), (u) => {
        const digits = roundToUncertainty(1, u).u!.replace(".", "").replace(/^0+/, "");
        expect(digits.replace(/0+$/, "").length).toBeLessThanOrEqual(2);
        expect(Number(roundToUncertainty(1, u).u)).toBeGreaterThan(0);
      }),
    );
  });

  test("is exact when the uncertainty is zero or floating-point dust", () => {
    expect(roundToUncertainty(0, 0)).toMatchObject({ value: "0", u: null });
    expect(roundToUncertainty(2.5, 1e-15)).toMatchObject({ value: "2.50", u: null });
  });

  test("refuses a negative uncertainty", () => {
    expect(() => roundToUncertainty(1, -0.1)).toThrow(RangeError);
  });
});

describe("An energy", () => {
  test("is given in kJ/mol first, kcal/mol in brackets, each with its own digits", () => {
    expect(plain(formatEnergy(7.28, 0.25))).toBe("7.28 ± 0.25 kJ/mol (1.74 ± 0.06 kcal/mol)");
  });

  test("has a true minus sign and breaks only before the bracket", () => {
    expect(formatEnergy(-14.6, 1.3)).toMatch(/^\u221214\.6/);
    expect(formatEnergy(-14.6, 1.3).split(" ")).toHaveLength(2);
  });

  test("stands without an uncertainty when it is exact or none is known", () => {
    expect(plain(formatEnergy(0, 0))).toBe("0 kJ/mol (0 kcal/mol)");
    expect(plain(formatEnergy(7.28))).toBe("7.3 kJ/mol (1.74 kcal/mol)");
  });
});

describe("A population", () => {
  test.each([
    [0.95, [0.941, 0.957], "95.0 % (94.1–95.7 %)"],
    [0.95, [0.777, 0.99], "95 % (78–99 %)"],
    [0.624, [0.054, 0.98], "62 % (5–98 %)"],
    [0.9998, [0.995, 0.99999], ">99.9 % (99.5 to >99.9 %)"],
    [0.0002, [0.00001, 0.005], "<0.1 % (<0.1 to 0.5 %)"],
    [0.99999, [0.9999, 0.999999], ">99.9 % (>99.9 %)"],
    [0.5, [0.5, 0.5], "50 % (exact by symmetry)"],
    [1, [1, 1], ">99.9 % (>99.9 %)"],
    [1e-20, [1e-21, 1e-19], "<0.1 % (<0.1 %)"],
    [1 / 3, [1 / 3, 1 / 3], "33.3 % (exact by symmetry)"],
  ] as const)("of %d within %j is printed %s", (population, interval, printed) => {
    expect(plain(formatPopulation(population, interval))).toBe(printed);
  });

  test("is never printed as 0 or 100 % unless it is exact, and always with its interval", () => {
    const logit = fc.double({ min: -40, max: 40, noNaN: true });
    const half = fc.double({ min: 1e-3, max: 20, noNaN: true });
    fc.assert(
      fc.property(logit, half, (middle, width) => {
        const p = (x: number) => 1 / (1 + Math.exp(-x));
        const interval = [p(middle - width), p(middle + width)] as const;
        const text = plain(formatPopulation(p(middle), interval));
        expect(text).not.toMatch(/(^|[^\d.>])(100(\.0)?|0(\.0)?)( %|–)/);
        expect(text).toMatch(/\(.+ %\)$/);
      }),
    );
  });

  test("and its complement add up to 100 in print when both are closed", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 0.95, noNaN: true }), (population) => {
        const interval = [population - 0.004, population + 0.004] as const;
        const one = Number(roundPopulation(population, interval).value);
        const other = Number(roundPopulation(1 - population, [1 - interval[1], 1 - interval[0]]).value);
        expect(Math.abs(one + other - 100)).toBeLessThan(0.1001);
      }),
    );
  });
});

describe("An interval", () => {
  test("is joined by an en dash, or by a word where a minus would stand beside it", () => {
    expect(plain(formatInterval([12.254, 17.546], "kJ/mol"))).toBe("12.3–17.5 kJ/mol");
    expect(plain(formatInterval([-1.23, 3.41], "kJ/mol"))).toBe("−1.2 to 3.4 kJ/mol");
    expect(plain(formatInterval([-3.41, -1.23]))).toBe("−3.4 to −1.2");
  });
});

describe("An equilibrium constant", () => {
  test.each([
    [19.02, undefined, "19"],
    [0.00245, undefined, "2.5 × 10⁻³"],
    [999.6, [990, 1010], "1.00 × 10³ (990 to 1.01 × 10³)"],
    [0.0529, [0.045, 0.062], "0.053 (0.045–0.062)"],
    [1, [1, 1], "1 (exact by symmetry)"],
  ] as const)("of %d within %j is printed %s", (K, interval, printed) => {
    expect(plain(interval === undefined ? formatK(K) : formatK(K, interval))).toBe(printed);
  });
});

describe("A temperature", () => {
  test("drops decimals that are zero", () => {
    expect(plain(formatTemperature(298.15))).toBe("298.15 K");
    expect(plain(formatTemperature(300))).toBe("300 K");
    expect(plain(formatTemperature(173.15, { celsius: true }))).toBe("173.15 K (−100 °C)");
  });
});
