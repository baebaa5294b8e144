import { describe, expect, test } from "vitest";
import { buildCollection } from "../../src/dossier/buildCollection.ts";
import { readContent } from "../../src/dossier/content/readContent.ts";
import { stereoisomerSentences } from "../../src/dossier/stereoisomerSentences.ts";
import { services } from "./demoServices.ts";

async function dossier(smiles: string) {
  const ready = await services();
  const text = `---\ncode: X-01\nname: x\nstructure: ${JSON.stringify(smiles)}\n---\n`;
  const file = {
    path: "series/one/x.md",
    shownPath: "content/series/one/x.md",
    text,
    sha256: "0".repeat(64),
  };
  return buildCollection(readContent([file], [], ready.register), ready).series[0]!.dossiers[0]!;
}

describe("What a text may say of the stereoisomers (common practice)", () => {
  test.each([
    ["methylcyclohexane", "CC1CCCCC1", "one stereoisomer only"],
    [
      "trans-1,2-dimethylcyclohexane",
      "C[C@H]1CCCC[C@@H]1C",
      "Three stereoisomers share this constitution: this one, its enantiomer, and one diastereomer (meso).",
    ],
    [
      "cis-1,2-dimethylcyclohexane",
      "C[C@H]1CCCC[C@H]1C",
      "Three stereoisomers share this constitution: this one (meso, its own mirror image) and two diastereomers (one pair of enantiomers).",
    ],
    [
      "trans-4-methylcyclohexan-1-ol",
      "C[C@H]1CC[C@H](O)CC1",
      "Two stereoisomers share this constitution: this one (its own mirror image) and one diastereomer (achiral).",
    ],
    [
      "trans-2-methylcyclohexan-1-ol",
      "C[C@H]1CCCC[C@@H]1O",
      "Four stereoisomers share this constitution: this one, its enantiomer, and two diastereomers (one pair of enantiomers).",
    ],
    [
      "myo-inositol",
      "O[C@H]1[C@H](O)[C@@H](O)[C@H](O)[C@H](O)[C@@H]1O",
      "Nine stereoisomers share this constitution: this one (meso, its own mirror image) and eight diastereomers (one pair of enantiomers, four meso, and two achiral).",
    ],
    [
      "an open 2-methylcyclohexan-1-ol",
      "CC1CCCCC1O",
      "Four stereoisomers share this constitution, and the structure as written may stand for any of them.",
    ],
    ["a chain of ten centres", "CC(O)C(O)C(O)C(O)C(O)C(O)C(O)C(O)C(O)C1CCCCC1", "at most 512 stereoisomers"],
    [
      "17-hydroxyandrostane",
      "CC12CCC(O)C1C1CCC3CCCCC3(C)C1CC2",
      "128 stereoisomers; they are too many to list",
    ],
  ])("%s (%s)", async (_name, smiles, sentence) => {
    expect(stereoisomerSentences(await dossier(smiles))[0]).toContain(sentence);
  });

  test("a claim of one enantiomer needs an absolute configuration", async () => {
    expect(stereoisomerSentences(await dossier("C[C@H]1CCCC[C@@H]1O"))[1]).toContain("only an absolute");
    expect(stereoisomerSentences(await dossier("C[C@H]1CC[C@H](O)CC1"))).toContain(
      "A relative configuration singles this one out.",
    );
  });

  test("an axis that no notation records is said to be one", async () => {
    expect(stereoisomerSentences(await dossier("CC1CCC(=NO)CC1")).join(" ")).toContain("sense of an axis");
  });
});

describe("The stereoisomers of a dossier (common practice)", () => {
  // source: the four 2-methylcyclohexan-1-ols: cis is (1R,2S) and (1S,2R), trans (1R,2R) and (1S,2S) (common practice).
  test("carry descriptors and relative configurations with the locants of the compound", async () => {
    const { stereoisomers, stereoisomerCount } = await dossier("C[C@H]1CCCC[C@@H]1O");
    expect(stereoisomerCount).toEqual({ distinct: 4, upTo: 4 });
    const said = stereoisomers.map(({ descriptors, configuration }) => `${configuration} ${descriptors}`);
    expect([...said].sort()).toEqual([
      "cis-1,2 1R,2S",
      "cis-1,2 1S,2R",
      "trans-1,2 1R,2R",
      "trans-1,2 1S,2S",
    ]);
    const [own, mirror] = stereoisomers;
    expect([own, mirror].map((entry) => entry?.configuration)).toEqual(["trans-1,2", "trans-1,2"]);
  });

  test("name fusions", async () => {
    const { stereoisomers } = await dossier("C1CC[C@H]2CCCC[C@@H]2C1");
    expect(stereoisomers.map(({ configuration }) => configuration)).toEqual(["trans-4a,8a", "cis-4a,8a"]);
  });
});
