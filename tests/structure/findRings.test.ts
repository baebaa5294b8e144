import { describe, expect, test } from "vitest";
import { findRings } from "../../src/structure/findRings.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";

async function search(smiles: string) {
  const toolkit = await loadToolkit();
  const read = toolkit.read(smiles);
  if (!read.ok) throw new Error(`${smiles}: ${read.reason}`);
  return findRings(read.molecule);
}

describe("A saturated six-membered ring is analysed, alone or beside others", () => {
  test.each([
    ["cyclohexane", "C1CCCCC1", 1],
    ["oxane", "C1CCOCC1", 1],
    ["1,3-dithiane", "C1CSCSC1", 1],
    ["N-methylpiperidine", "CN1CCCCC1", 1],
    ["morpholinium", "C1COCC[NH2+]1", 1],
    ["thiane 1-oxide", "O=S1CCCCC1", 1],
    ["two linked rings", "C1CCCCC1C1CCCCC1", 2],
    ["a ring beside a benzene ring", "C1CCCCC1c1ccccc1", 1],
    ["a ring beside a cyclopropane", "C1CCCCC1C1CC1", 1],
    ["three rings on one phosphorus", "C1CCCCC1P(C1CCCCC1)C1CCCCC1", 3],
  ])("%s (%s): %i ring(s)", async (_name, smiles, count) => {
    const found = await search(smiles);
    expect(found.ok && found.rings.length).toBe(count);
  });
});

describe("Every six-membered ring has its kind of states", () => {
  test.each([
    ["trans-decalin", "C1CC[C@@H]2CCCC[C@H]2C1", ["chair", "chair"]],
    ["hydrindane", "C1CCC2CCCC2C1", ["chair"]],
    ["spiro[5.5]undecane", "C1CCC2(CC1)CCCCC2", ["chair", "chair"]],
    ["an ethylene ketal of a cyclohexanone", "C1CCC2(CC1)OCCO2", ["chair"]],
    ["adamantane", "C1C2CC3CC1CC(C2)C3", ["chair", "chair", "chair", "chair"]],
    ["bicyclo[3.3.1]nonane", "C1CC2CCCC(C1)C2", ["chair", "chair"]],
    ["bicyclo[3.2.1]octane", "C1CC2CCC(C1)C2", ["chair"]],
    ["norbornane, whose bridge holds a boat", "C1CC2CCC1C2", ["boat"]],
    ["bicyclo[2.2.2]octane", "C1CC2CCC1CC2", ["boat", "boat", "boat"]],
    ["cyclohexanone", "O=C1CCCCC1", ["chair"]],
    ["cyclohexane-1,3-dione", "O=C1CCCC(=O)C1", ["chair"]],
    ["cyclohexene", "C1=CCCCC1", ["half-chair"]],
    ["cyclohexene oxide", "C1CCC2OC2C1", ["half-chair"]],
    ["methylenecyclohexane", "C=C1CCCCC1", ["chair"]],
    ["tetralin", "c1ccc2CCCCc2c1", ["half-chair"]],
    ["N-acetylpiperidine", "CC(=O)N1CCCCC1", ["chair"]],
    ["an N-sulfonylpiperidine", "CS(=O)(=O)N1CCCCC1", ["chair"]],
    ["N,N′-diacetylpiperazine", "CC(=O)N1CCN(C(C)=O)CC1", ["chair"]],
    ["a free ring beside a fused pair", "C1CCCCC1C1CCC2CCCCC2C1", ["chair", "chair", "chair"]],
    ["the saturated rings of a steroid enone", "CC12CCC3C(CCC4=CC(=O)CCC34C)C1CCC2O", ["chair", "chair"]],
  ])("%s (%s): %j (common practice)", async (_name, smiles, kinds) => {
    const found = await search(smiles);
    expect(found.ok && found.rings.map((ring) => ring.kind)).toEqual(kinds);
  });
});

describe("Everything else is refused by name", () => {
  test.each([
    ["a lactone", "O=C1CCCCO1", "unsupported-lactone-ring"],
    ["a cyclic carbonate", "O=C1OCCCO1", "unsupported-lactone-ring"],
    ["a lactam", "O=C1CCCCN1", "unsupported-lactam-ring"],
    ["an imide", "O=C1CCCC(=O)N1", "unsupported-lactam-ring"],
    ["cyclohex-2-enone", "O=C1C=CCCC1", "unsupported-unsaturated-ring"],
    ["cyclohexa-1,3-diene", "C1=CC=CCC1", "unsupported-unsaturated-ring"],
    ["cyclohexa-1,4-diene", "C1=CCC=CC1", "unsupported-unsaturated-ring"],
    ["cyclohexane-1,4-dione", "O=C1CCC(=O)CC1", "unsupported-flat-corners"],
    ["cyclohexane-1,2-dione", "O=C1CCCCC1=O", "unsupported-flat-corners"],
    ["N-acetylpiperidin-4-one", "CC(=O)N1CCC(=O)CC1", "unsupported-flat-corners"],
    ["bicyclo[3.1.1]heptane", "C1CC2CC(C1)C2", "unsupported-bridged-ring"],
    ["a boracycle", "B1CCCCC1", "unsupported-ring-element"],
    ["benzene", "c1ccccc1", "unsupported-no-six-ring"],
    ["hexane", "CCCCCC", "unsupported-no-six-ring"],
    ["cyclopentane", "C1CCCC1", "unsupported-no-six-ring"],
    ["cubane", "C12C3C4C1C5C2C3C45", "unsupported-no-six-ring"],
  ])("%s (%s): %s", async (_name, smiles, code) => {
    const found = await search(smiles);
    expect(found.ok).toBe(false);
    if (!found.ok) expect(found.refusal.code).toBe(code);
  });
});
