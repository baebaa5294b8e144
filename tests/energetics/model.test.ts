import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { combine, type LinearEnergy } from "../../src/energetics/LinearEnergy.ts";
import { populations } from "../../src/energetics/populations.ts";
import { rowParameter } from "../../src/energetics/rowParameter.ts";
import { standIn } from "../../src/energetics/standIn.ts";
import { kelvin } from "../../src/quantity/units.ts";
import { readRegister } from "../../src/site/readRegister.ts";
import { analyse, kcal } from "../dossier/demoServices.ts";

const energy = (...parts: [string, number, number, number][]): LinearEnergy =>
  new Map(
    parts.map(([id, value, u, coefficient]) => [id, { parameter: standIn(id, value, u, ""), coefficient }]),
  );

describe("Uncertainty of a difference", () => {
  test("a parameter used alike in both conformers cancels, value and uncertainty", () => {
    const a = energy(["x", 1, 0.3, 1], ["y", 2, 0.4, 1]);
    const b = energy(["x", 1, 0.3, 1]);
    const { value, u } = combine(
      [
        { energy: a, weight: 1 },
        { energy: b, weight: -1 },
      ],
      298.15,
    );
    expect(kcal(value)).toBeCloseTo(2, 12);
    expect(kcal(u)).toBeCloseTo(0.4, 12);
  });

  test("a parameter used twice counts twice before it is squared", () => {
    const { u } = combine([{ energy: energy(["x", 1, 0.3, 2]), weight: 1 }], 298.15);
    expect(kcal(u)).toBeCloseTo(0.6, 12);
  });
});

describe("Populations", () => {
  const some = fc.array(
    fc.array(fc.tuple(fc.constantFrom("a", "b", "c", "d"), fc.double({ min: -2, max: 2, noNaN: true })), {
      maxLength: 4,
    }),
    { minLength: 1, maxLength: 8 },
  );
  const values: Record<string, [number, number]> = {
    a: [1.7, 0.1],
    b: [0.4, 0.3],
    c: [-0.9, 0.2],
    d: [3.7, 0.6],
  };
  const build = (parts: readonly (readonly [string, number])[]) =>
    energy(...parts.map(([id, factor]): [string, number, number, number] => [id, ...values[id]!, factor]));

  test("sum to one and lie inside their intervals, which lie between 0 and 1", () => {
    fc.assert(
      fc.property(some, fc.double({ min: 80, max: 600, noNaN: true }), (list, temperature) => {
        const shares = populations(list.map(build), kelvin(temperature));
        expect(shares.reduce((sum, share) => sum + share.population, 0)).toBeCloseTo(1, 9);
        for (const { population, population95 } of shares) {
          expect(population95[0]).toBeGreaterThanOrEqual(0);
          expect(population95[1]).toBeLessThanOrEqual(1);
          expect(population95[0]).toBeLessThanOrEqual(population + 1e-12);
          expect(population95[1]).toBeGreaterThanOrEqual(population - 1e-12);
        }
      }),
      { seed: 20261201, numRuns: 300 },
    );
  });

  test("of two conformers have the interval that transforming the ends of the free energy gives", () => {
    const [first] = populations([energy(), energy(["x", 1.0, 0.2, 1])], kelvin(298.15));
    const RT = 8.314462618e-3 * 298.15;
    const end = (deltaG: number) => 1 / (1 + Math.exp(-(deltaG * 4.184) / RT));
    expect(first!.population95[0]).toBeCloseTo(end(1.0 - 1.959964 * 0.2), 6);
    expect(first!.population95[1]).toBeCloseTo(end(1.0 + 1.959964 * 0.2), 6);
  });

  test("are exactly one half for equal energies at any temperature", () => {
    for (const temperature of [100, 298.15, 400]) {
      const shares = populations([energy(["x", 1, 0.5, 1]), energy(["x", 1, 0.5, 1])], kelvin(temperature));
      expect(shares.map(({ population }) => population)).toEqual([0.5, 0.5]);
      expect(shares[0]!.population95).toEqual([0.5, 0.5]);
    }
  });
});

describe("A register row as a parameter", () => {
  const row = readRegister().rows.find(({ id }) => id === "axial/cyclohexane/i-Pr")!;

  test("has its printed value at its own temperature and follows the published entropy elsewhere", () => {
    const parameter = rowParameter({ row, match: "any medium" });
    expect(kcal(parameter.at(300).value)).toBeCloseTo(2.21, 9);
    // ΔS = −2.31 cal/(mol K): at 200 K the value falls by 0.231 kcal/mol.
    expect(kcal(parameter.at(200).value)).toBeCloseTo(2.21 - 0.231, 9);
  });

  test("is less certain away from its temperature and in another medium", () => {
    const own = rowParameter({ row, match: "any medium" });
    const other = rowParameter({ row, match: "nearest medium" });
    expect(own.at(200).u).toBeGreaterThan(own.at(300).u);
    expect(other.at(300).u).toBeGreaterThan(own.at(300).u);
  });
});

describe("Structures", () => {
  test("that mirror each other have the same energies", async () => {
    for (const [a, b] of [
      ["CC[C@H]1CCCC[C@H]1C", "CC[C@@H]1CCCC[C@@H]1C"],
      ["C[C@@H]1CC[C@H]([C@@H](C1)O)C(C)C", "C[C@H]1CC[C@@H]([C@H](C1)O)C(C)C"],
      ["CO[C@@H]1CCCCO1", "CO[C@H]1CCCCO1"],
    ] as const) {
      const pick = (answer: Awaited<ReturnType<typeof analyse>>) =>
        answer.conformers.map(({ label, deltaG_kJ_mol, u_kJ_mol }) => ({ label, deltaG_kJ_mol, u_kJ_mol }));
      expect(pick(await analyse(a))).toEqual(pick(await analyse(b)));
    }
  });

  test("with a group the register lacks get a visible stand-in, never zero", async () => {
    const { conformers, alerts } = await analyse("CCCCCCCC1CCCCC1");
    const charge = conformers[1]!.contributions[0]!;
    expect(charge.basis).toBe("not available");
    expect(charge.value_kJ_mol).toBeGreaterThan(5);
    expect(charge.u_kJ_mol).toBeGreaterThan(0.8);
    expect(alerts.map(({ code }) => code)).toContain("value-not-available");
  });

  test("with N-methyl list the places of the methyl as conformers, equatorial first", async () => {
    const { conformers } = await analyse("CN1CCC(C)CC1");
    expect(conformers.map(({ label }) => label)).toEqual(["1e,4e", "1e,4a", "1a,4e", "1a,4a"]);
  });
});

describe("Where a heteroring has no row for a group", () => {
  const axialCharge = async (smiles: string, solvent?: string) => {
    const { conformers } = await analyse(smiles, solvent === undefined ? {} : { solvent });
    return conformers
      .flatMap(({ contributions }) => contributions)
      .find(({ kind }) => kind === "axial group" || kind === "anomeric")!;
  };

  test("a group of the same class at the same place stands in, anomeric effect and all", async () => {
    const charge = await axialCharge("CCOC1CCCCO1", "CCl4");
    expect(charge).toMatchObject({ kind: "anomeric", basis: "not available" });
    expect(charge.value_kJ_mol).toBeLessThan(0);
    expect(charge.source).toContain("that of OMe");
  });

  test("then the group in another state of the nitrogen", async () => {
    expect((await axialCharge("OC1CCN(C)CC1")).source).toContain("that of piperidine/NH");
  });

  test("but never across a charge for a polar group, whose doubt is then wide", async () => {
    const charge = await axialCharge("FC1CC[NH2+]CC1", "D2O");
    expect(charge.source).toContain("cyclohexane value");
    expect(kcal(charge.u_kJ_mol)).toBeGreaterThanOrEqual(1);
  });

  test("then the cyclohexane value, for carbon groups scaled as methyl is", async () => {
    const charge = await axialCharge("CC(C)C1CCCOC1");
    expect(charge.source).toContain("ratio for methyl");
    // Methyl at C3 of oxane is 1.43 against 1.74 kcal/mol in cyclohexane.
    expect(kcal(charge.value_kJ_mol)).toBeLessThan(2.21);
  });
});
