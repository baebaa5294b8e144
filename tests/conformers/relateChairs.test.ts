import { describe, expect, test } from "vitest";
import { enumerateConformers } from "../../src/conformers/enumerateConformers.ts";
import { relateConformers } from "../../src/conformers/relateConformers.ts";
import { analyseRings } from "../../src/structure/analyseRings.ts";
import { describeBody } from "../../src/structure/describeBody.ts";
import { findOpenCentres } from "../../src/structure/findOpenCentres.ts";
import { findRings } from "../../src/structure/findRings.ts";
import { bareServices } from "./bareServices.ts";

async function relationOf(smiles: string): Promise<string> {
  const services = await bareServices();
  const read = services.toolkit.read(smiles);
  if (!read.ok) throw new Error(read.reason);
  const search = findRings(read.molecule);
  if (!search.ok) throw new Error(search.refusal.message);
  const [member] = findOpenCentres(read.molecule, services.toolkit).members;
  const { molecule } = member!;
  const rings = analyseRings(molecule, search.rings, { ring: null, atoms: new Map() }, services);
  const sets = enumerateConformers(molecule, rings)!;
  expect(sets).toHaveLength(2);
  return relateConformers(describeBody(molecule, rings, services.toolkit), sets[0]!, sets[1]!);
}

describe("The two chairs of a ring (common practice)", () => {
  // source: common practice, as in any stereochemistry textbook (Eliel, Wilen, Mander 1994, ch. 11, from memory).
  test.each([
    ["cyclohexane", "C1CCCCC1", "identical"],
    ["methylcyclohexane", "CC1CCCCC1", "diastereomeric"],
    ["1,1-dimethylcyclohexane", "CC1(C)CCCCC1", "identical"],
    ["1-ethyl-1-methylcyclohexane", "CCC1(C)CCCCC1", "diastereomeric"],
    ["cis-1,2-dimethylcyclohexane", "C[C@H]1CCCC[C@H]1C", "enantiomeric"],
    ["trans-1,2-dimethylcyclohexane", "C[C@H]1CCCC[C@@H]1C", "diastereomeric"],
    ["cis-1,3-dimethylcyclohexane", "C[C@H]1CCC[C@@H](C)C1", "diastereomeric"],
    ["trans-1,3-dimethylcyclohexane", "C[C@H]1CCC[C@H](C)C1", "identical"],
    ["cis-1,4-dimethylcyclohexane", "C[C@H]1CC[C@@H](C)CC1", "identical"],
    ["trans-1,4-dimethylcyclohexane", "C[C@H]1CC[C@H](C)CC1", "diastereomeric"],
    ["cis-1-ethyl-2-methylcyclohexane", "CC[C@H]1CCCC[C@H]1C", "diastereomeric"],
    ["oxane", "C1CCOCC1", "identical"],
    ["1,4-dioxane", "C1COCCO1", "identical"],
    ["cis-2,5-dimethyl-1,4-dioxane", "C[C@H]1CO[C@@H](C)CO1", "identical"],
    ["cis-2,3-dimethyl-1,4-dioxane", "C[C@H]1OCCO[C@H]1C", "enantiomeric"],
    ["cis-3,5-dimethylpiperidine", "C[C@H]1CNC[C@@H](C)C1", "diastereomeric"],
    ["trans-3,5-dimethylpiperidine", "C[C@H]1CNC[C@H](C)C1", "identical"],
    ["cis-decalin", "C1CC[C@H]2CCCC[C@H]2C1", "enantiomeric"],
    [
      "cis-decalin-4a,8a-diol, whose two conformers are mirror images",
      "C1CC[C@]2(O)CCCC[C@]2(O)C1",
      "enantiomeric",
    ],
    ["cyclohexene", "C1CCC=CC1", "enantiomeric"],
    ["cyclohexanone", "O=C1CCCCC1", "identical"],
    ["1,4-dioxaspiro[4.5]decane", "C1CCC2(CC1)OCCO2", "identical"],
    ["cis-1,2-dibromocyclohexane", "Br[C@H]1CCCC[C@H]1Br", "enantiomeric"],
  ])("of %s (%s) are %s", async (_name, smiles, relation) => {
    expect(await relationOf(smiles)).toBe(relation);
  });

  // source: symmetry (common practice): scyllo-inositol has six equatorial or six axial groups, cis-inositol three
  // of each in either chair. The marks were worked out by hand: at the first and the last atom of such a ring
  // SMILES the ring-closure digit changes places with a neighbour, so the same face needs the opposite mark there.
  test.each([
    ["scyllo-inositol", "O[C@@H]1[C@@H](O)[C@H](O)[C@@H](O)[C@H](O)[C@H]1O", "diastereomeric"],
    ["cis-inositol (all on one face)", "O[C@@H]1[C@H](O)[C@H](O)[C@H](O)[C@H](O)[C@@H]1O", "identical"],
  ])("of %s are %s", async (_name, smiles, relation) => {
    expect(await relationOf(smiles)).toBe(relation);
  });

  test("keep their relation when the molecule is mirrored and when the SMILES starts elsewhere", async () => {
    for (const [a, b] of [
      ["CC[C@H]1CCCC[C@H]1C", "CC[C@@H]1CCCC[C@@H]1C"],
      ["C[C@H]1CCCC[C@H]1C", "C1CC[C@@H](C)[C@@H](C)C1"],
    ]) {
      expect(await relationOf(a!)).toBe(await relationOf(b!));
    }
  });
});
