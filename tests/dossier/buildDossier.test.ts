import { describe, expect, test } from "vitest";
import { buildCollection } from "../../src/dossier/buildCollection.ts";
import { canonicalJson } from "../../src/dossier/canonicalJson.ts";
import { readContent } from "../../src/dossier/content/readContent.ts";
import { sha256 } from "../../src/dossier/sha256.ts";
import { services } from "./demoServices.ts";

async function collect(...texts: readonly string[]) {
  const ready = await services();
  const files = texts.map((text, i) => ({
    path: `series/one/x-${i}.md`,
    shownPath: `content/series/one/x-${i}.md`,
    text,
    sha256: sha256(text),
  }));
  return buildCollection(readContent(files, [], ready.register), ready);
}

const compound = (lines: string) => `---\ncode: X-01\nname: x\n${lines}\n---\nProse.\n`;
const only = async (lines: string) => (await collect(compound(lines))).series[0]!.dossiers[0]!;

describe("A dossier", () => {
  test("carries the digest of its input and of its own canonical form", async () => {
    const text = compound('structure: "CC1CCCCC1"');
    const dossier = (await collect(text)).series[0]!.dossiers[0]!;
    expect(dossier.input.sha256).toBe(sha256(text));
    expect(dossier.resultSha256).toBe(sha256(canonicalJson({ ...dossier, resultSha256: "" })));
  });

  test("is frozen all the way down and the same every time", async () => {
    const [a, b] = [await only('structure: "CC1CCCCC1"'), await only('structure: "CC1CCCCC1"')];
    expect(JSON.stringify(a)).toBe(JSON.stringify(b));
    expect(Object.isFrozen(a.conformers[0]!.contributions)).toBe(true);
    expect(Object.isFrozen(a.identity.stereocentres)).toBe(true);
  });

  test("says the same whether the structure is a SMILES or a ring with groups", async () => {
    const smiles = await only('structure: "C[C@H]1CC[C@H](O)CC1"');
    const bench = await only("structure:\n  ring: cyclohexane\n  groups: { 1: { up: OH }, 4: { down: Me } }");
    expect(bench.identity.inchikey).toBe(smiles.identity.inchikey);
    const results = ({ conformers, relation }: typeof smiles) => ({
      relation,
      conformers: conformers.map(({ label, deltaG_kJ_mol, population }) => ({
        label,
        deltaG_kJ_mol,
        population,
      })),
    });
    expect(results(bench)).toEqual(results(smiles));
  });

  test("keeps the author's numbering in the bench notation", async () => {
    const dossier = await only(
      "structure:\n  ring: cyclohexane\n  groups: { 1: { up: Me }, 4: { down: OH } }",
    );
    expect(dossier.conformers[0]!.positions.map(({ locant, group }) => `${locant} ${group}`)).toEqual([
      "1 Me",
      "4 OH",
    ]);
  });

  test("moves with temperature and solvent", async () => {
    const warm = await only('structure: "CC(C)C1CCCCC1"\nconditions: { temperature: 350 K, solvent: CDCl3 }');
    const cold = await only('structure: "CC(C)C1CCCCC1"\nconditions: { temperature: 200 K, solvent: CDCl3 }');
    expect(warm.conformers[0]!.population).not.toBe(cold.conformers[0]!.population);
    expect(warm.temperatures.map(({ temperature_K }) => temperature_K)).toContain(350);
    const dry = await only('structure: "OC1CCCCC1"\nconditions: { solvent: CCl4 }');
    const wet = await only('structure: "OC1CCCCC1"\nconditions: { solvent: water }');
    expect(wet.conformers[0]!.population).toBeGreaterThan(dry.conformers[0]!.population);
  });

  test("with an impossible structure is an error at its place, in the file's own words", async () => {
    const { diagnostics, series } = await collect(compound('structure: "CC1CCCC(C)(C)(C)C1"'));
    const [error] = diagnostics.filter(({ severity }) => severity === "error");
    expect(error).toMatchObject({
      code: "invalid-smiles",
      place: { file: "content/series/one/x-0.md", line: 4 },
    });
    expect(series[0]!.dossiers).toEqual([]);
  });

  test("contradicted by its own claim is an error", async () => {
    const { diagnostics } = await collect(
      compound('structure: "C[C@H]1CC[C@H](O)CC1"\nclaim: { configuration: cis }'),
    );
    expect(diagnostics.find(({ code }) => code === "claim-contradicts-structure")).toMatchObject({
      severity: "error",
      suggestion: "trans",
    });
  });

  test("with open stereochemistry draws no conclusion, and lists the members where the author allows it", async () => {
    const refused = await only('structure: "CC1CCC(O)CC1"');
    expect(refused.conformers).toEqual([]);
    expect(refused.alerts[0]).toMatchObject({ severity: "stop", code: "stereo-unspecified" });
    const listed = await only('structure: "CC1CCC(O)CC1"\nstereoisomers: enumerate');
    expect(listed.members.map(({ description }) => description.split(" ")[0]).sort()).toEqual([
      "cis-1,4",
      "trans-1,4",
    ]);
    expect(listed.rings[0]!.configuration).toEqual([]);
  });

  test("of a ring that is refused shows its identity and says why it is not analysed", async () => {
    const dossier = await only('structure: "O=C1CCCCO1"');
    expect(dossier.identity.formula).toBe("C5H8O2");
    expect(dossier.conformers).toEqual([]);
    expect(dossier.conclusion).toContain("lactone or carbonate ring");
  });

  test("of two fused rings names the fusion and says how its conformers are related (common practice)", async () => {
    const trans = await only('structure: "C1CC[C@@H]2CCCC[C@H]2C1"');
    expect(trans.conformers).toHaveLength(1);
    expect(trans.systems[0]?.fusions).toMatchObject([{ locants: ["8a", "4a"], relation: "trans" }]);
    const cis = await only('structure: "C1CC[C@H]2CCCC[C@H]2C1"');
    expect(cis.conformers).toHaveLength(2);
    expect(cis.systems[0]?.fusions).toMatchObject([{ relation: "cis" }]);
    expect(cis.kinship).toEqual({
      distinct: 2,
      distinctUpToMirror: 1,
      pairs: [{ first: "A", second: "B", relation: "enantiomeric" }],
    });
  });
});

describe("The conclusion", () => {
  test.each([
    ["a resolved equilibrium", 'structure: "CC1CCCCC1"', "prefers one form"],
    ["an unresolved one", 'structure: "FC1CCCCC1"', "unresolved"],
    ["identical chairs", 'structure: "FC1(F)CCCCC1"', "superimposable chairs"],
    ["mirror-image chairs", 'structure: "O[C@H]1CCCC[C@H]1O"', "mirror-image chairs"],
    ["a missing value", 'structure: "CCCCCCCC1CCCCC1"', "stand-in"],
    ["a bulky axial group", 'structure: "CC(C)(C)[C@H]1CC[C@H](C(C)(C)C)CC1"', "review"],
  ])("changes with %s", async (_what, lines, words) => {
    const { conclusion } = await only(lines);
    expect(conclusion).toContain(words);
    expect(conclusion).toContain("Draft for qualified review");
  });
});
