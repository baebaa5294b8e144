import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { readContent } from "../../src/dossier/content/readContent.ts";
import { readContentFolder } from "../../src/site/readContentFolder.ts";
import { SMALL_REGISTER } from "./smallRegister.ts";

const folder = fileURLToPath(new URL("../fixtures/ten-mistakes/", import.meta.url));

describe("a folder with ten different mistakes", () => {
  it("has nine of them reported by reading alone, in one run, with suggestions where one exists", async () => {
    const { files, attached, problems } = await readContentFolder(folder);
    const { diagnostics } = readContent(files, attached, SMALL_REGISTER);
    const told = diagnostics.map(({ code, place, suggestion }) => [
      `${place.file.split("/").at(-1)}:${place.line}:${place.column}`,
      code,
      suggestion ?? null,
    ]);
    expect(problems).toEqual([]);
    expect(told).toEqual([
      ["dn-01-group.md:8:16", "unknown-group", "t-Bu"],
      ["dn-03-locant.md:7:5", "wrong-locant", null],
      ["dn-04-key.md:5:1", "unknown-key", "conditions"],
      ["dn-05-code.md:2:7", "duplicate-code", null],
      ["dn-06-temperature.md:7:28", "bad-temperature", "298 K"],
      ["dn-07-yaml.md:3:7", "broken-yaml", null],
      ["dn-08-directive.md:10:1", "unknown-directive", "::figure[equilibrium]"],
      ["dn-09-evidence.md:11:23", "missing-evidence-file", "dn-09.cif"],
      ["dn-10-script.md:1:1", "executable-front-matter", "---"],
    ]);
  });

  it("hands the impossible SMILES on with its place, for the structure's reader to refuse", async () => {
    const { files, attached } = await readContentFolder(folder);
    const { compounds } = readContent(files, attached, SMALL_REGISTER);
    const impossible = compounds.find(({ code }) => code === "DN-02");
    expect(impossible?.place(["structure"])).toMatchObject({ line: 4, column: 12, length: 20 });
    expect(impossible?.structure.smiles).toBe("CC1CCC(C)(C)(C)CC1");
  });
});
