import { describe, expect, test } from "vitest";
import { constitutionalSymmetry } from "../../src/structure/constitutionalSymmetry.ts";
import { enumerateStereoisomers } from "../../src/structure/enumerateStereoisomers.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";
import type { Molecule } from "../../src/structure/Molecule.ts";

async function list(smiles: string, possible?: (molecule: Molecule) => boolean) {
  const toolkit = await loadToolkit();
  const read = toolkit.read(smiles);
  if (!read.ok) throw new Error(read.reason);
  return { toolkit, molecule: read.molecule, ...enumerateStereoisomers(read.molecule, toolkit, possible) };
}

/** Stereoisomers, and how many of them are their own mirror images; the rest are pairs. */
const COUNTS: readonly (readonly [name: string, smiles: string, all: number, achiral: number])[] = [
  // Single rings: counted by hand from up and down at each centre under the symmetry of the flat ring.
  ["methylcyclohexane", "CC1CCCCC1", 1, 1],
  ["1,2-dimethylcyclohexane", "CC1CCCCC1C", 3, 1],
  ["1,3-dimethylcyclohexane", "CC1CCCC(C)C1", 3, 1],
  ["1,4-dimethylcyclohexane", "CC1CCC(C)CC1", 2, 2],
  ["1,3-dimethylcyclobutane", "CC1CC(C)C1", 2, 2],
  ["cyclohexane-1,3,5-triol", "OC1CC(O)CC(O)C1", 2, 2],
  ["1,2,3-trimethylcyclohexane", "CC1C(C)CCCC1C", 4, 2],
  ["1,2,4,5-tetramethylcyclohexane", "CC1CC(C)C(C)CC1C", 7, 3],
  ["menthol (5-methyl-2-isopropylcyclohexan-1-ol)", "CC1CCC(C(C)C)C(O)C1", 8, 0],
  ["inositol: seven meso forms and one pair", "OC1C(O)C(O)C(O)C(O)C1O", 9, 7],
  ["aldohexopyranose", "OCC1OC(O)C(O)C(O)C1O", 32, 0],
  // Fused rings. Perhydroanthracene: five diastereomers, two of them pairs; perhydrophenanthrene: six, four of them pairs.
  ["decalin", "C1CCC2CCCCC2C1", 2, 2],
  ["hydrindane: cis is meso, trans a pair", "C1CCC2CCCC2C1", 3, 1],
  ["2-decalol: four pairs", "OC1CCC2CCCCC2C1", 8, 0],
  ["perhydroanthracene", "C1CCC2CC3CCCCC3CC2C1", 7, 3],
  ["perhydrophenanthrene", "C1CCC2C(C1)CCC1CCCCC12", 10, 2],
  ["5-androstane nucleus without groups", "CC12CCCC1C1CCC3CCCCC3(C)C1CC2", 64, 0],
  // Bridges and spiro atoms.
  ["adamantane", "C1C2CC3CC1CC(C2)C3", 1, 1],
  ["norbornan-2-ol: exo and endo, each a pair", "OC1CC2CCC1C2", 4, 0],
  ["camphor", "CC1(C)C2CCC1(C)C(=O)C2", 2, 0],
  ["tropine", "CN1C2CCC1CC(O)C2", 2, 2],
  ["spiro[5.5]undecane", "C1CCC2(CC1)CCCCC2", 1, 1],
  // Chains.
  ["tartaric acid", "OC(=O)C(O)C(O)C(=O)O", 3, 1],
  ["pentane-2,3,4-triol with its pseudoasymmetric centre", "CC(O)C(O)C(O)C", 4, 2],
  // Sulfur, nitrogen, phosphorus, double bonds.
  ["4-methylthiane 1-oxide", "CC1CCS(=O)CC1", 2, 2],
  ["1-ethyl-1,4-dimethylpiperidinium", "CC[N+]1(C)CCC(C)CC1", 2, 2],
  ["1-ethyl-1,2-dimethylpiperidinium", "CC[N+]1(C)CCCCC1C", 4, 0],
  ["1,2-dimethylpiperidine, whose nitrogen inverts", "CN1CCCCC1C", 2, 0],
  ["4-methyl-1-phenylphosphinane", "CC1CCP(c2ccccc2)CC1", 2, 2],
  ["1-methyl-4-(prop-1-enyl)cyclohexane", "CC=CC1CCC(C)CC1", 4, 4],
  ["4-methylcyclohexanone oxime, a pair by its axis", "CC1CCC(=NO)CC1", 2, 0],
  ["cyclohexene, whose bond can only be Z", "C1CCC=CC1", 1, 1],
];

describe("The stereoisomers of a constitution (common practice)", () => {
  // source: textbook counts of stereoisomers (common practice), each worked out by hand by counting the arrangements
  // that rotations of the flat formula leave alone (Burnside's lemma).
  test.each(COUNTS)("of %s (%s) are %i, %i of them achiral", async (_name, smiles, all, achiral) => {
    const { isomers, complete } = await list(smiles);
    expect(complete).toBe(true);
    expect(isomers).toHaveLength(all);
    expect(isomers.filter(({ superimposable }) => superimposable)).toHaveLength(achiral);
  });

  test("of the 7 perhydroanthracenes and 10 perhydrophenanthrenes are 5 and 6 diastereomers", async () => {
    for (const [smiles, diastereomers] of [
      ["C1CCC2CC3CCCCC3CC2C1", 5],
      ["C1CCC2C(C1)CCC1CCCCC12", 6],
    ] as const) {
      const { isomers } = await list(smiles);
      const achiral = isomers.filter(({ superimposable }) => superimposable).length;
      expect(achiral + (isomers.length - achiral) / 2).toBe(diastereomers);
    }
  });
});

describe("The list of stereoisomers", () => {
  test("starts with the compound as given, then its mirror image, then the diastereomers by canonical SMILES", async () => {
    const { isomers, toolkit, molecule } = await list("C[C@@H]1CC[C@@H](C(C)C)[C@H](O)C1");
    expect(isomers.map(({ relation }) => relation)).toEqual([
      "same",
      "enantiomer",
      ...Array<string>(6).fill("diastereomer"),
    ]);
    expect(isomers[0]!.canonicalSmiles).toBe(toolkit.canonicalSmiles(molecule));
    const rest = isomers.slice(2).map(({ canonicalSmiles }) => canonicalSmiles);
    expect(rest).toEqual([...rest].sort());
  });

  test("names no mirror image of a meso compound (common practice)", async () => {
    const { isomers } = await list("C[C@H]1CCCC[C@H]1C");
    expect(isomers.map(({ relation, superimposable }) => [relation, superimposable])).toEqual([
      ["same", true],
      ["diastereomer", false],
      ["diastereomer", false],
    ]);
  });

  test("calls everything that an open structure may stand for the same", async () => {
    const { isomers } = await list("C[C@H]1CCCCC1C");
    expect(isomers.map(({ relation }) => relation).sort()).toEqual(["enantiomer", "same", "same"]);
  });

  test("leaves out what cannot exist, but never the compound as given", async () => {
    const none = await list("C[C@H]1CC[C@H](O)CC1", () => false);
    expect(none.isomers.map(({ relation }) => relation)).toEqual(["same"]);
  });

  test("stops at eight elements with an upper bound", async () => {
    const { isomers, complete, upTo } = await list("CC(C)CCCC(C)C1CCC2C1(C)CCC1C2CCC2CC(O)CCC12C");
    expect({ isomers, complete, upTo }).toEqual({ isomers: [], complete: false, upTo: 512 });
  });

  test.each(COUNTS.filter(([name]) => !name.includes("axis")))(
    "of %s agrees with canonical SMILES and InChI: all differ, and all have one constitution",
    async (_name, smiles) => {
      const { isomers, toolkit, molecule } = await list(smiles);
      const inchis = new Set(isomers.map((isomer) => toolkit.inchi(isomer.molecule)));
      expect(new Set(isomers.map(({ canonicalSmiles }) => canonicalSmiles)).size).toBe(isomers.length);
      expect(inchis.size).toBe(isomers.length);
      const flat = (made: Molecule) =>
        toolkit.canonicalSmiles({
          ...made,
          atoms: made.atoms.map((atom) => ({ ...atom, stereo: null })),
          bonds: made.bonds.map((bond) => ({ ...bond, stereo: null })),
        });
      for (const isomer of isomers.slice(0, 8)) {
        expect(flat(isomer.molecule)).toBe(flat(molecule));
        for (const arrangement of isomer.arrangements.slice(0, 8))
          expect(toolkit.canonicalSmiles(arrangement)).toBe(isomer.canonicalSmiles);
      }
    },
  );
});

describe("The symmetry of a constitution (common practice)", () => {
  // source: order of the permutation group of the heavy atoms, counted by hand (common practice).
  test.each([
    ["cyclohexane", "C1CCCCC1", 12],
    ["methylcyclohexane", "CC1CCCCC1", 2],
    ["4-methylcyclohexan-1-ol", "CC1CCC(O)CC1", 2],
    ["menthol, by its isopropyl group", "CC1CCC(C(C)C)C(O)C1", 2],
    ["adamantane", "C1C2CC3CC1CC(C2)C3", 24],
    ["tert-butylbenzene", "CC(C)(C)c1ccccc1", 12],
    ["2-methylcyclohexan-1-ol", "CC1CCCCC1O", 1],
  ])("%s (%s) has order %i", async (_name, smiles, order) => {
    const { molecule } = await list(smiles);
    const generators = constitutionalSymmetry(molecule)!;
    const start = molecule.atoms.map(({ index }) => index);
    const group = new Map([[start.join(), start]]);
    for (const element of group.values())
      for (const generator of generators) {
        const next = element.map((atom) => generator[atom]!);
        group.set(next.join(), next);
      }
    expect(group.size).toBe(order);
  });
});
