import { describe, expect, test } from "vitest";
import { analyse, kcal } from "../dossier/demoServices.ts";

/**
 * Facts every worker in the field agrees on, through the whole pipeline. source: common practice, no single source;
 * energies to the digits in which they are commonly quoted.
 */
describe("Facts of the trade (common practice)", () => {
  test("an unsubstituted ring spends half its time in either chair", async () => {
    const { conformers, relation } = await analyse("C1CCCCC1");
    expect(relation).toBe("identical");
    expect(conformers.map(({ population }) => population)).toEqual([0.5, 0.5]);
  });

  test("methyl is equatorial about 95 % of the time and axial about 5 %", async () => {
    const { conformers } = await analyse("CC1CCCCC1", { temperature_K: 298.15 });
    expect(conformers.map(({ label }) => label)).toEqual(["1e", "1a"]);
    // Quoted to one per cent.
    expect(Math.abs(conformers[0]!.population - 0.95)).toBeLessThan(0.01);
    const [low, high] = conformers[0]!.population95;
    expect(low).toBeLessThan(conformers[0]!.population);
    expect(high).toBeGreaterThan(conformers[0]!.population);
    expect(conformers[1]!.contributions[0]!.source).not.toBe("");
  });

  test("with two alkyl groups on one carbon the less bulky one goes axial, ethyl being the bulkier beside methyl", async () => {
    const { conformers } = await analyse("CCC1(C)CCCCC1");
    expect(conformers[0]!.label).toBe("1a(Me),1e(Et)");
    // A small preference: methyl and ethyl differ by a few hundredths of a kcal/mol.
    expect(kcal(conformers[1]!.deltaG_kJ_mol)).toBeGreaterThan(0);
    expect(kcal(conformers[1]!.deltaG_kJ_mol)).toBeLessThan(0.3);
  });

  test("methyl is bulkier than chlorine: cis-1-chloro-2-methylcyclohexane keeps methyl equatorial", async () => {
    const { conformers } = await analyse("C[C@H]1CCCC[C@H]1Cl");
    const methyl = conformers[0]!.positions.find(({ substituent }) => substituent === 0)!;
    expect(methyl.orientation).toBe("equatorial");
  });

  test("and its trans isomer has both groups equatorial", async () => {
    const { conformers } = await analyse("C[C@H]1CCCC[C@@H]1Cl");
    expect(conformers[0]!.positions.map(({ orientation }) => orientation)).toEqual([
      "equatorial",
      "equatorial",
    ]);
  });

  test.each([
    ["trans-1,2", "C[C@H]1CCCC[C@@H]1C", "1e,2e", 2.6],
    ["cis-1,3", "C[C@H]1CCC[C@@H](C)C1", "1e,3e", 5.4],
    ["trans-1,4", "C[C@H]1CC[C@H](C)CC1", "1e,4e", 3.5],
  ])("%s-dimethylcyclohexane (%s) prefers %s by about %f kcal/mol", async (_name, smiles, label, gap) => {
    const { conformers, relation } = await analyse(smiles);
    expect(relation).toBe("diastereomeric");
    expect(conformers[0]!.label).toBe(label);
    // Quoted to 0.1 kcal/mol by sums whose parts differ by a few tenths between textbooks.
    expect(Math.abs(kcal(conformers[1]!.deltaG_kJ_mol) - gap)).toBeLessThan(0.3);
  });

  test.each([
    ["cis-1,2", "C[C@H]1CCCC[C@H]1C", "enantiomeric"],
    ["trans-1,3", "C[C@H]1CCC[C@H](C)C1", "identical"],
    ["cis-1,4", "C[C@H]1CC[C@@H](C)CC1", "identical"],
  ])("%s-dimethylcyclohexane (%s) has two equally stable chairs, %s", async (_name, smiles, relation) => {
    const answer = await analyse(smiles);
    expect(answer.relation).toBe(relation);
    expect(answer.conformers.map(({ population }) => population)).toEqual([0.5, 0.5]);
  });

  test("a tert-butyl group holds the ring: either 4-tert-butylcyclohexan-1-ol keeps it equatorial", async () => {
    for (const smiles of ["CC(C)(C)[C@H]1CC[C@H](O)CC1", "CC(C)(C)[C@H]1CC[C@@H](O)CC1"]) {
      const { conformers } = await analyse(smiles);
      const bulky = conformers[0]!.positions.find(({ substituent }) => substituent === 1)!;
      expect(bulky.orientation).toBe("equatorial");
      expect(conformers[0]!.population).toBeGreaterThan(0.99);
    }
  });

  test("one chair written from another side is still the same chair", async () => {
    const one = await analyse("C[C@H]1CC[C@@H](O)CC1");
    const other = await analyse("O[C@@H]1CC[C@H](C)CC1");
    expect(other.identity.canonicalSmiles).toBe(one.identity.canonicalSmiles);
    expect(other.conformers.map(({ label, deltaG_kJ_mol }) => ({ label, deltaG_kJ_mol }))).toEqual(
      one.conformers.map(({ label, deltaG_kJ_mol }) => ({ label, deltaG_kJ_mol })),
    );
  });

  test("the axial methyl's cost is two gauche contacts: it is listed as one axial group and nothing else", async () => {
    const { conformers } = await analyse("CC1CCCCC1");
    expect(conformers[1]!.contributions.map(({ kind }) => kind)).toEqual(["axial group"]);
    // Twice the gauche contact of butane as it is charged between neighbours, 0.87 kcal/mol.
    expect(Math.abs(kcal(conformers[1]!.contributions[0]!.value_kJ_mol) - 2 * 0.87)).toBeLessThan(0.1);
  });
});

describe("2-Methoxyoxane (source: Lemieux et al. 1969 for the solvent series, from memory; 73 % axial on a public reference page)", () => {
  test("prefers the axial methoxy group in a non-polar solvent", async () => {
    const { conformers } = await analyse("COC1CCCCO1", { solvent: "CCl4" });
    expect(conformers[0]!.label).toBe("2a");
    // The series runs from 83 % in tetrachloromethane to 52 % in water at 313 K.
    expect(conformers[0]!.population).toBeGreaterThan(0.7);
    expect(conformers[0]!.population).toBeLessThan(0.9);
  });

  test("and holds less of it in water", async () => {
    const water = await analyse("COC1CCCCO1", { solvent: "water" });
    const axial = water.conformers.find(({ label }) => label === "2a")!;
    expect(axial.population).toBeLessThan(0.65);
  });
});
