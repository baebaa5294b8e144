import { describe, expect, test } from "vitest";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";

describe("The geometry of a double bond (common practice)", () => {
  // source: E has the groups of higher priority on opposite sides (IUPAC P-93.4.2.1); labels by hand.
  test.each([
    ["(E)-prop-1-enylcyclohexane", "C/C=C/C1CCCCC1", "E", "/b6-2+"],
    ["(Z)-prop-1-enylcyclohexane", "C/C=C\\C1CCCCC1", "Z", "/b6-2-"],
    ["(E)-3-methylcyclohexan-1-one oxime", "CC1CCC/C(=N\\O)C1", "E", null],
  ])("of %s survives reading and is labelled", async (_name, smiles, label, layer) => {
    const toolkit = await loadToolkit();
    const read = toolkit.read(smiles);
    if (!read.ok) throw new Error(read.reason);
    const { molecule } = read;
    expect(toolkit.descriptors(molecule).bonds.map(({ descriptor }) => descriptor)).toEqual([label]);
    expect(toolkit.canonicalSmiles(molecule)).toMatch(/[/\\]/);
    if (layer !== null) expect(toolkit.inchi(molecule)).toContain(layer);
  });
});
