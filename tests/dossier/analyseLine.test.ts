import { describe, expect, test } from "vitest";
import { analyseLine } from "../../src/dossier/analyseLine.ts";
import { analyseOutput } from "../../src/dossier/analyseSchema.ts";
import { services } from "./demoServices.ts";

const ask = async (line: string) => JSON.parse(analyseLine(line, await services()));

describe("A line of the batch command", () => {
  test("is answered in the published shape", async () => {
    for (const smiles of [
      "CC1CCCCC1",
      "COC1CCCCO1",
      "CC1CCC(C)CC1",
      "CN1CCN(C)CC1",
      "C1CCCCC1C1CCCCC1",
      "O=S1CCCCC1",
    ]) {
      const answer = await ask(JSON.stringify({ id: 7, smiles }));
      expect(analyseOutput.safeParse(answer).error, smiles).toBeUndefined();
      expect(answer.id).toBe(7);
    }
  });

  test("numbers atoms from 0 in input order and names faces by the listed ring", async () => {
    const answer = await ask(JSON.stringify({ id: "x", smiles: "C[C@H]1CC[C@@H](O)CC1" }));
    expect(answer.rings[0].atoms).toEqual([1, 2, 3, 4, 6, 7]);
    // cis: both groups on one face (worked out by hand: the two @ and @@ marks point the same way around the ring).
    expect(new Set(answer.conformers[0].positions.map((p: { face: string }) => p.face)).size).toBe(1);
    expect(answer.identity.stereocentres).toEqual([
      { atom: 1, descriptor: "s" },
      { atom: 4, descriptor: "s" },
    ]);
  });

  test("counts hydrogens written as atoms, as the SMILES does", async () => {
    const answer = await ask(JSON.stringify({ id: "x", smiles: "[H][C@]1(C)CCCC[C@@]1([H])O" }));
    // By hand: H0 C1 C2 C3 C4 C5 C6 C7 H8 O9.
    expect([...answer.rings[0].atoms].sort()).toEqual([1, 3, 4, 5, 6, 7]);
    const groups = answer.conformers[0].positions.map((p: { substituent: number }) => p.substituent);
    expect(groups.sort()).toEqual([2, 9]);
    expect(answer.identity.stereocentres.map((c: { atom: number }) => c.atom)).toEqual([1, 7]);
  });

  test("without a needed configuration lists the centres as unspecified and stops there", async () => {
    const answer = await ask('{"id":"x","smiles":"CC1CCC(C)CC1"}');
    expect(answer.identity.stereocentres.map((c: { descriptor: string }) => c.descriptor)).toEqual([
      "unspecified",
      "unspecified",
    ]);
    expect(answer.conformers).toEqual([]);
    expect(answer.alerts[0]).toMatchObject({ code: "stereo-unspecified", severity: "stop" });
  });

  test.each([
    ["not JSON", "{", "invalid-json"],
    ["a list", "[]", "invalid-line"],
    ["no id", '{"smiles":"C1CCCCC1"}', "invalid-id"],
    ["no smiles", '{"id":"x"}', "invalid-smiles"],
    ["a smiles that is no text", '{"id":"x","smiles":3}', "invalid-smiles"],
    ["an unclosed ring", '{"id":"x","smiles":"C1CCCC"}', "invalid-smiles"],
    ["five bonds on carbon", '{"id":"x","smiles":"CC1(C)(C)CCCCC1"}', "invalid-smiles"],
    ["an empty smiles", '{"id":"x","smiles":""}', "invalid-smiles"],
    ["a wildcard", '{"id":"x","smiles":"*C1CCCCC1"}', "invalid-smiles"],
    ["a temperature below zero", '{"id":"x","smiles":"C1CCCCC1","temperature_K":-5}', "invalid-temperature"],
    ["an unknown solvent", '{"id":"x","smiles":"C1CCCCC1","solvent":"CDCl4"}', "invalid-solvent"],
    ["a misspelt key", '{"id":"x","smile":"C1CCCCC1"}', "invalid-key"],
    ["no ring", '{"id":"x","smiles":"CCO"}', "unsupported-no-six-ring"],
    ["a lactone ring", '{"id":"x","smiles":"O=C1CCCCO1"}', "unsupported-lactone-ring"],
    ["eight inverting rings", `{"id":"x","smiles":"${"C1CCCCC1C(C)".repeat(8)}C"}`, "unsupported-"],
  ])("with %s is refused and says why", async (_what, line, code) => {
    const answer = await ask(line);
    expect(answer.ok).toBe(false);
    expect(answer.error.code.startsWith(code)).toBe(true);
    expect(analyseOutput.safeParse(answer).error).toBeUndefined();
  });

  test("gives the position of a mistake in the SMILES", async () => {
    const answer = await ask('{"id":"x","smiles":"C1CCCCC1)"}');
    expect(answer.error.position).toBe(8);
  });
});
