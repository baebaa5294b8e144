import { describe, expect, test } from "vitest";
import { chiralityOf } from "../../src/structure/chiralityOf.ts";
import { findOpenCentres } from "../../src/structure/findOpenCentres.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";

async function read(smiles: string) {
  const toolkit = await loadToolkit();
  const answer = toolkit.read(smiles);
  if (!answer.ok) throw new Error(answer.reason);
  return { toolkit, molecule: answer.molecule };
}

describe("Missing configurations are found (common practice)", () => {
  // source: numbers of stereoisomers as in any stereochemistry textbook (common practice): 1,2-dimethylcyclohexane
  // has 3 (meso and a pair), 1,3 has 3, 1,4 has 2, 2-methylcyclohexanol 4, inositol 9.
  test.each([
    ["methylcyclohexane", "CC1CCCCC1", [], 1],
    ["1,1-dimethylcyclohexane", "CC1(C)CCCCC1", [], 1],
    ["1,2-dimethylcyclohexane", "CC1CCCCC1C", [1, 6], 3],
    ["1,3-dimethylcyclohexane", "CC1CCCC(C)C1", [1, 5], 3],
    ["1,4-dimethylcyclohexane", "CC1CCC(C)CC1", [1, 4], 2],
    ["2-methylcyclohexan-1-ol", "CC1CCCCC1O", [1, 6], 4],
    ["2-methoxyoxane", "COC1CCCCO1", [2], 2],
    ["N-methylpiperidine", "CN1CCCCC1", [], 1],
    ["inositol", "OC1C(O)C(O)C(O)C(O)C1O", [1, 2, 4, 6, 8, 10], 9],
    ["4-methylthiane 1-oxide", "CC1CCS(=O)CC1", [1, 4], 2],
    ["sec-butylcyclohexane", "CCC(C)C1CCCCC1", [2], 2],
  ])("%s (%s)", async (_name, smiles, centres, members) => {
    const { toolkit, molecule } = await read(smiles);
    const open = findOpenCentres(molecule, toolkit);
    expect(open.centres).toEqual(centres);
    expect(open.members).toHaveLength(members);
  });

  test("and a structure with every configuration given has none open", async () => {
    const { toolkit, molecule } = await read("C[C@H]1CC[C@@H](O)CC1");
    expect(findOpenCentres(molecule, toolkit)).toMatchObject({ centres: [], complete: true });
  });

  test("and more than eight open centres are listed without trying every combination", async () => {
    const { toolkit, molecule } = await read("CC(O)C(O)C(O)C(O)C(O)C(O)C(O)C(O)C(O)C1CCCCC1");
    expect(findOpenCentres(molecule, toolkit).complete).toBe(false);
  });
});

describe("Chirality of the substance on the time average (common practice)", () => {
  // source: common practice.
  test.each([
    ["trans-1,4-dimethylcyclohexane", "C[C@H]1CC[C@H](C)CC1", "achiral"],
    ["cis-4-methylcyclohexan-1-ol", "C[C@H]1CC[C@@H](O)CC1", "achiral"],
    ["cis-1,2-dimethylcyclohexane", "C[C@H]1CCCC[C@H]1C", "meso"],
    ["cis-1,3-dimethylcyclohexane", "C[C@H]1CCC[C@@H](C)C1", "meso"],
    ["trans-1,2-dimethylcyclohexane", "C[C@H]1CCCC[C@@H]1C", "chiral"],
    ["menthol", "C[C@@H]1CC[C@H]([C@@H](C1)O)C(C)C", "chiral"],
    ["cyclohexane", "C1CCCCC1", "achiral"],
  ] as const)("%s (%s) is %s", async (_name, smiles, chirality) => {
    const { toolkit, molecule } = await read(smiles);
    expect(chiralityOf(molecule, toolkit)).toBe(chirality);
  });
});
