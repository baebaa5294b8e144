import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { printDiagnostic } from "../../src/diagnostics/printDiagnostic.ts";
import { readContent } from "../../src/dossier/content/readContent.ts";
import { contentFile } from "./contentFile.ts";
import { SMALL_REGISTER } from "./smallRegister.ts";

const VALID =
  "---\ncode: TN-01\nname: a compound\nstructure:\n  ring: oxane\n  groups: { 2: { up: Me }, 4: { down: OH } }\n" +
  "conditions: { temperature: 298.15 K, solvent: CDCl3 }\nclaim: { configuration: trans, basis: syn }\nevidence:\n" +
  "  - coupling: { between: [H1, H2up], observed: 10.9 Hz }\n  - geometry: { file: x.cif }\n" +
  "review: [{ by: A, on: 2026-11-20, as: author }]\n---\nProse `code` :value[name]\n\n::figure[chair]{conformer=B}\n";

const TOKENS = [
  ..."---|\n|: |- |{|}|[|]|,|'|\"|&a |*a|!!js/function |!x |# |<<: |? |%YAML 9|\t|  |\r\n|\0|\uFEFF|~|null|1e999|.nan|0x1F|\\|`|```|<b>|::|:value[|::figure[".split(
    "|",
  ),
  ..."code|name|structure|ring|groups|up|down|conditions|temperature|298 K|evidence|coupling|between|review|__proto__|constructor|toString|hasOwnProperty|defaults|title|7|-0|CC1".split(
    "|",
  ),
];
const anyText = fc.oneof(
  fc.string({ unit: "binary", maxLength: 200 }),
  fc.array(fc.constantFrom(...TOKENS), { maxLength: 60 }).map((tokens) => `---\n${tokens.join("")}\n---\n`),
  fc.json({ maxDepth: 5 }).map((json) => `---\n${json}\n---\n`),
  fc
    .array(
      fc.tuple(
        fc.nat(VALID.length),
        fc.nat(6),
        fc.oneof(fc.constantFrom(...TOKENS), fc.string({ unit: "binary", maxLength: 3 })),
      ),
      {
        minLength: 1,
        maxLength: 5,
      },
    )
    .map((edits) =>
      edits.reduce((text, [at, cut, put]) => text.slice(0, at) + put + text.slice(at + cut), VALID),
    ),
);
const anyPath = fc.constantFrom(
  "index.md",
  "series/tern/index.md",
  "series/tern/a.md",
  "series/A b/c.md",
  "x.md",
);
const anyPlace = fc.array(
  fc.oneof(fc.nat(6), fc.constantFrom("structure", "groups", "up", "evidence", "__proto__")),
  {
    maxLength: 4,
  },
);

describe("reading content", () => {
  it("never throws, and every problem has a place within its file", () => {
    fc.assert(
      fc.property(
        fc.uniqueArray(fc.tuple(anyPath, anyText), { selector: ([path]) => path, maxLength: 4 }),
        anyPlace,
        (entries, path) => {
          const files = entries.map(([at, text]) => contentFile(text, at));
          const { diagnostics, compounds } = readContent(files, [], SMALL_REGISTER);
          for (const diagnostic of diagnostics) {
            const file = files.find(({ shownPath }) => shownPath === diagnostic.place.file);
            const lines = (file?.text ?? "").replace(/^\uFEFF/, "").split("\n");
            expect(diagnostic.place.line).toBeLessThanOrEqual(lines.length);
            expect(diagnostic.place.column).toBeLessThanOrEqual(lines[diagnostic.place.line - 1]!.length + 1);
            expect(diagnostic.place.column).toBeGreaterThanOrEqual(1);
            expect(diagnostic.place.length ?? 1).toBeGreaterThanOrEqual(1);
            expect(diagnostic.message).toMatch(/[.?]$/);
            expect(printDiagnostic(diagnostic)).not.toMatch(/[^\P{Cc}\n\t]/u);
          }
          for (const compound of compounds) expect(compound.place(path).line).toBeGreaterThanOrEqual(1);
          expect(({} as Record<string, unknown>)["polluted"]).toBeUndefined();
        },
      ),
      { seed: 2, numRuns: 500 },
    );
  });

  it("takes the file that the others are bent from as right", () => {
    const { diagnostics, compounds } = readContent(
      [contentFile(VALID)],
      [{ path: "series/tern/x.cif", sha256: "" }],
      SMALL_REGISTER,
    );
    expect(diagnostics.map(({ code }) => code)).toEqual(["missing-series-file"]);
    expect(compounds).toHaveLength(1);
  });
});
