import { describe, expect, test } from "vitest";
import { findRings } from "../../src/structure/findRings.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";

async function search(smiles: string) {
  const toolkit = await loadToolkit();
  const read = toolkit.read(smiles);
  if (!read.ok) throw new Error(`${smiles}: ${read.reason}`);
  return findRings(read.molecule);
}

describe("A saturated six-membered ring that stands alone is analysed", () => {
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

describe("Everything else is refused by name", () => {
  test.each([
    ["trans-decalin", "C1CC[C@@H]2CCCC[C@H]2C1", "unsupported-fused-ring"],
    ["hydrindane", "C1CCC2CCCC2C1", "unsupported-fused-ring"],
    ["spiro[5.5]undecane", "C1CCC2(CC1)CCCCC2", "unsupported-spiro-ring"],
    ["an ethylene ketal of a cyclohexanone", "C1CCC2(CC1)OCCO2", "unsupported-spiro-ring"],
    ["adamantane", "C1C2CC3CC1CC(C2)C3", "unsupported-bridged-ring"],
    ["norbornane", "C1CC2CCC1C2", "unsupported-bridged-ring"],
    ["cyclohexanone", "O=C1CCCCC1", "unsupported-unsaturated-ring"],
    ["cyclohexene", "C1=CCCCC1", "unsupported-unsaturated-ring"],
    ["methylenecyclohexane", "C=C1CCCCC1", "unsupported-unsaturated-ring"],
    ["tetralin", "c1ccc2CCCCc2c1", "unsupported-unsaturated-ring"],
    ["N-acetylpiperidine", "CC(=O)N1CCCCC1", "unsupported-planar-nitrogen"],
    ["an N-sulfonylpiperidine", "CS(=O)(=O)N1CCCCC1", "unsupported-planar-nitrogen"],
    ["benzene", "c1ccccc1", "unsupported-no-six-ring"],
    ["hexane", "CCCCCC", "unsupported-no-six-ring"],
    ["cyclopentane", "C1CCCC1", "unsupported-no-six-ring"],
    ["a free ring beside a fused one", "C1CCCCC1C1CCC2CCCCC2C1", "unsupported-fused-ring"],
  ])("%s (%s): %s", async (_name, smiles, code) => {
    const found = await search(smiles);
    expect(found.ok).toBe(false);
    if (!found.ok) expect(found.refusal.code).toBe(code);
  });
});
