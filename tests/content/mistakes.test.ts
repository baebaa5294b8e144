import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { printDiagnostic } from "../../src/diagnostics/printDiagnostic.ts";
import { readContent } from "../../src/dossier/content/readContent.ts";
import { readContentFolder } from "../../src/site/readContentFolder.ts";
import { sourceFiles } from "../sourceFiles.ts";
import { SMALL_REGISTER } from "./smallRegister.ts";

const fixtures = fileURLToPath(new URL("../fixtures/mistakes/", import.meta.url));

/** `path:line code` for every mark in the fixtures and every line of the side list. */
async function expected(): Promise<string[]> {
  const { files } = await readContentFolder(`${fixtures}content`);
  const marked = files.flatMap(({ path, text }) =>
    text.split("\n").flatMap((line, index) => {
      const codes = /# expect: (.+)$/.exec(line)?.[1]?.trim().split(/\s+/) ?? [];
      return codes.map((code) => `${path}:${index + 1} ${code}`);
    }),
  );
  const listed = readFileSync(`${fixtures}expected.txt`, "utf8")
    .split("\n")
    .filter((line) => line !== "" && !line.startsWith("#"))
    .map((line) => line.replace(/^(.+) (\d+) (\S+)$/, "$1:$2 $3"));
  return [...marked, ...listed].sort();
}

describe("mistakes in content", () => {
  it("are all reported in one run, each at its line, and nothing else is", async () => {
    const { files, attached, problems } = await readContentFolder(`${fixtures}content`);
    const { diagnostics } = readContent(files, attached, SMALL_REGISTER);
    if (process.env["SHOW"] !== undefined) console.log(diagnostics.map(printDiagnostic).join("\n\n"));
    const shown = diagnostics.map(
      ({ code, place }) => `${place.file.replace(/^.*mistakes\/content\//, "")}:${place.line} ${code}`,
    );
    expect(problems).toEqual([]);
    expect(shown.sort()).toEqual(await expected());
  });

  it("have a fixture for every code that the reader of content can give", async () => {
    const sources = sourceFiles(["src/dossier/content"], /\.ts$/);
    const given = sources.flatMap(({ text }) =>
      [...text.matchAll(/(?:code: |problem\(\s*|report\(\s*|code:\s*\| )"([a-z]+(?:-[a-z]+)+)"/g)].map(
        (match) => match[1]!,
      ),
    );
    const shown = new Set((await expected()).map((line) => line.replace(/^.* /, "")));
    // Files with these would be unwieldy; `parseFrontMatter.test.ts` makes them.
    const made = ["nul-character", "file-too-large"];
    expect(given.length).toBeGreaterThan(30);
    expect([...new Set(given)].filter((code) => !shown.has(code) && !made.includes(code))).toEqual([]);
  });
});
