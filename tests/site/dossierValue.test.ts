import { describe, expect, test } from "vitest";
import { DIRECTIVES } from "../../src/dossier/content/Directive.ts";
import type { Dossier } from "../../src/dossier/Dossier.ts";
import { formatPopulation } from "../../src/quantity/formatPopulation.ts";
import { dossierValue } from "../../src/site/pages/dossierValue.ts";
import { sampleDossier } from "../derivation/madeDossier.ts";

const MADE = sampleDossier();

/** The same dossier with another share of its first conformer. */
function withPopulation(population: number, population95: readonly [number, number]): Dossier {
  const [first, ...others] = MADE.conformers;
  return { ...MADE, conformers: [{ ...first!, population, population95 }, ...others] };
}

describe("A value in a sentence", () => {
  test("exists for every name that an author may write, also where nothing was analysed", () => {
    const bare: Dossier = { ...MADE, conformers: [], equilibria: [], relation: null };
    for (const dossier of [MADE, bare])
      for (const name of DIRECTIVES.compound.value) expect(dossierValue(dossier, name), name).not.toBe("");
  });

  test("gives an interval with the digits of the tables, and never claims certainty", () => {
    for (const [population, low, high] of [
      [0.9991, 0.9961, 0.9998],
      [0.95, 0.939, 0.958],
      [0.0004, 0.0001, 0.002],
      [0.6, 0.4, 0.77],
    ] as const) {
      const dossier = withPopulation(population, [low, high]);
      const interval = dossierValue(dossier, "interval.major");
      expect(formatPopulation(population, [low, high])).toContain(`(${interval})`);
      expect(interval).not.toMatch(/(?<![\d.])100(?![\d.])/);
    }
    expect(dossierValue(withPopulation(0.5, [0.5, 0.5]), "interval.major")).toContain("exact by symmetry");
  });

  test("sets a name as the headings do", () => {
    expect(dossierValue({ ...MADE, name: "cis-2-phenyl-1,3-dioxan-5-ol" }, "name")).toBe(
      "*cis*-2-phenyl-1,3-dioxan-5-ol",
    );
  });
});
