import { fileURLToPath } from "node:url";
import { describe, expect, test } from "vitest";
import { buildCollection } from "../../src/dossier/buildCollection.ts";
import { readConfigurationClaim } from "../../src/dossier/claim/readConfigurationClaim.ts";
import { readContent } from "../../src/dossier/content/readContent.ts";
import { readContentFolder } from "../../src/site/readContentFolder.ts";
import { services } from "./demoServices.ts";

const MENTHOL = "C[C@@H]1CC[C@@H](C(C)C)[C@H](O)C1";
const MYO_INOSITOL = "O[C@H]1[C@H](O)[C@@H](O)[C@H](O)[C@H](O)[C@@H]1O";

/** Problems of one claim, as message, suggestion and column. */
async function problems(smiles: string, claim: string) {
  const ready = await services();
  const text = `---\ncode: X-01\nname: x\nstructure: ${JSON.stringify(smiles)}\nclaim:\n  configuration: ${claim}\n---\n`;
  const file = {
    path: "series/one/x.md",
    shownPath: "content/series/one/x.md",
    text,
    sha256: "0".repeat(64),
  };
  const { diagnostics } = buildCollection(readContent([file], [], ready.register), ready);
  return diagnostics.filter(({ code }) => code === "claim-contradicts-structure");
}

describe("A claimed configuration that fits the structure (common practice)", () => {
  // source: (−)-menthol is (1R,2S,5R); trans-4-methylcyclohexan-1-ol is 1r,4r; myo-inositol is (1R,2S,3r,4R,5S,6s):
  // names of the trade, from memory.
  test.each([
    [MENTHOL, "1R,2S,5R"],
    [MENTHOL, "(1R, 2S, 5R)"],
    [MENTHOL, "2S"],
    [MENTHOL, "rel-(1R,2S,5R)"],
    [MENTHOL, "rel-(1S,2R,5S)"],
    [MENTHOL, "rac-(1S,2R,5S)"],
    [MENTHOL, "1R*,2S*,5R*"],
    [MENTHOL, "1RS,2SR,5RS"],
    [MENTHOL, "trans-1,2"],
    [MENTHOL, "cis-5,1"],
    [MENTHOL, "r-1,t-2,c-5"],
    [MENTHOL, "as drawn by the supplier"],
    [MENTHOL, "cis"],
    ["C[C@H]1CC[C@H](O)CC1", "trans"],
    ["C[C@H]1CC[C@H](O)CC1", "1r,4r"],
    ["C[C@H]1CCCC[C@H]1C", "1R,2S"],
    ["C[C@H]1CCCC[C@H]1C", "1S,2R"],
    [MYO_INOSITOL, "(1R,2S,3r,4R,5S,6s)"],
    ["C1CC[C@H]2CCCC[C@@H]2C1", "trans"],
    ["C1CC[C@H]2CCCC[C@@H]2C1", "trans-4a,8a"],
    ["C/C=C/C1CCCCC1", "E"],
    ["C/C=C/C1CCCCC1", "(1E)"],
    ["C[S@](=O)C1CCCCC1", "S"],
  ])("%s, %s, is no problem", async (smiles, claim) => {
    expect(await problems(smiles, claim)).toEqual([]);
  });

  test.each([
    ["an open centre", "CC1CCCCC1O", "1R,2S"],
    ["a side chain, whose locants the dossier does not know", "CC[C@H](C)C1CCCCC1", "2R"],
  ])("is not judged at %s", async (_what, smiles, claim) => {
    expect(await problems(smiles, claim)).toEqual([]);
  });
});

describe("A claimed configuration that the structure contradicts", () => {
  test("names locant, claimed and found, and points at the descriptor", async () => {
    const [first, ...more] = await problems(MENTHOL, "(1R,2R,5R)");
    expect(more).toEqual([]);
    expect(first).toMatchObject({
      severity: "error",
      message: "The claim says 2R, but the centre at 2 of the structure is S.",
      suggestion: "2S",
      place: { line: 6, column: 22 },
    });
  });

  test("at an atom that is no centre lists the centres and the nearest", async () => {
    const [first, ...more] = await problems(MENTHOL, "(1R,3S)");
    expect(more).toEqual([]);
    expect(first!.message).toContain("no stereocentre at 3; its centres are 1R, 2S, 5R.");
    expect(first!.suggestion).toBe("2S");
  });

  test("relative to the other centres is taken as given or inverted, whichever fits better", async () => {
    expect(await problems(MENTHOL, "rel-(1S,2R,5R)")).toMatchObject([{ suggestion: "5S" }]);
    expect(await problems(MENTHOL, "1S,2R,5S")).toHaveLength(3);
  });

  test.each([
    ["C[C@H]1CC[C@H](O)CC1", "cis", "trans"],
    ["C[C@H]1CC[C@H](O)CC1", "cis-1,4", "trans-1,4"],
    [MENTHOL, "r-1,c-2,c-5", "trans-1,2"],
    ["C1CC[C@H]2CCCC[C@@H]2C1", "cis", "trans"],
    ["C[C@H]1CC[C@H](O)CC1", "4R", "4r"],
    ["C[C@H]1CCCC[C@H]1C", "1R,2R", "2S"],
    ["C/C=C/C1CCCCC1", "Z", "E"],
    ["C[S@](=O)C1CCCCC1", "R", "S"],
  ])("%s, %s, has a suggestion", async (smiles, claim, suggestion) => {
    expect(await problems(smiles, claim)).toMatchObject([{ suggestion }]);
  });

  test("is reported at every marked line of the fixtures and nowhere else", async () => {
    const ready = await services();
    const folder = fileURLToPath(new URL("../fixtures/mistakes/claims/", import.meta.url));
    const { files, attached } = await readContentFolder(folder);
    const { diagnostics } = buildCollection(readContent(files, attached, ready.register), ready);
    const marked = files.flatMap(({ path, text }) =>
      text.split("\n").flatMap((line, index) => {
        const codes = /# expect: (.+)$/.exec(line)?.[1]?.trim().split(/\s+/) ?? [];
        return codes.map((code) => `${path}:${index + 1} ${code}`);
      }),
    );
    const told = diagnostics
      .filter(({ severity }) => severity === "error")
      .map(({ code, place }) => `${place.file.replace(/^.*claims\//, "")}:${place.line} ${code}`);
    expect(marked.length).toBeGreaterThan(9);
    expect(told.sort()).toEqual(marked.sort());
  });
});

describe("Reading a claimed configuration", () => {
  test.each([
    "",
    "R,",
    "cis-",
    "(1R",
    "1R)",
    "1R;2S",
    "racemic",
    "r-1",
    "trans-1",
    "1R or 1S",
    "D",
    "x-1,c-2",
  ])("leaves %j as free text", (text) => {
    expect(readConfigurationClaim(text)).toBeNull();
  });

  test("takes primes of either kind and letters in locants", () => {
    expect(readConfigurationClaim("1'R,4aS,2′s")).toMatchObject({
      relative: false,
      descriptors: [
        { locant: "1′", descriptor: "R", start: 0 },
        { locant: "4a", descriptor: "S", start: 4 },
        { locant: "2′", descriptor: "s", start: 8 },
      ],
    });
  });
});
