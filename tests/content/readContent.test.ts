import { describe, expect, it } from "vitest";
import { readContent } from "../../src/dossier/content/readContent.ts";
import { contentFile } from "./contentFile.ts";
import { SMALL_REGISTER } from "./smallRegister.ts";

const SERIES = contentFile(
  "---\ntitle: Tern oxanes\nsummary: A summary.\nnotice: Invented.\ndefaults:\n" +
    "  conditions: { temperature: 25 °C, solvent: chloroform-d }\n  stereoisomers: enumerate\n" +
    "  claim: { basis: syn, statement: From the route. }\n---\nSeries prose.\n",
  "series/tern/index.md",
);
const compound = (front: string, path?: string) =>
  contentFile(`---\ncode: TN-01\nname: a compound\nstructure: C1CCCCC1\n${front}---\nProse.\n`, path);
const read = (...files: ReturnType<typeof contentFile>[]) => readContent(files, [], SMALL_REGISTER);

describe("a compound", () => {
  it("inherits conditions, stereoisomers and claim from its series, and overrides them key by key", () => {
    const inherited = read(SERIES, compound("")).compounds[0];
    expect(inherited).toMatchObject({
      series: "tern",
      slug: "tn-01",
      temperature_K: 298.15,
      temperatureStated: true,
      solvent: "CDCl3",
      enumerateStereoisomers: true,
      claim: { configuration: null, basis: "syn", statement: "From the route." },
    });
    const own = read(
      SERIES,
      compound(
        "conditions: { temperature: 213 K }\nstereoisomers: refuse\nclaim: { configuration: trans, basis: ad }\n",
      ),
    ).compounds[0];
    expect(own).toMatchObject({
      temperature_K: 213,
      solvent: "CDCl3",
      enumerateStereoisomers: false,
      claim: { configuration: "trans", basis: "ad", statement: "From the route." },
    });
  });

  it("is taken at 298.15 K in an unstated solvent when nobody says otherwise, and this is remembered", () => {
    expect(read(compound("")).compounds[0]).toMatchObject({
      temperature_K: 298.15,
      temperatureStated: false,
      solvent: null,
      enumerateStereoisomers: false,
      claim: null,
    });
  });

  it("states its evidence in plain words, with value and uncertainty as the author gave them", () => {
    const { compounds, diagnostics } = readContent(
      [
        SERIES,
        compound(
          "evidence:\n" +
            "  - coupling: { between: [H1, H2up], observed: 10.90 Hz, uncertainty: 0.3 Hz }\n" +
            "    conditions: { temperature: 298 K, solvent: cdcl3 }\n    source: page 14\n    note: second order\n" +
            "  - population: { chair: '1e,4e', observed: 97 % }\n" +
            "  - exchange: { coalescence: -60 °C, separation: 96 Hz, nucleus: 13C }\n" +
            "  - contact: { between: [H1, H3up], observed: absent }\n" +
            "  - geometry: { file: tn-01.cif }\n" +
            "  - observation: Melts sharply.\n    file: tn-01.cif\n",
        ),
      ],
      [{ path: "series/tern/tn-01.cif", sha256: "abc" }],
      SMALL_REGISTER,
    );
    expect(diagnostics).toEqual([]);
    const file = { path: "series/tern/tn-01.cif", sha256: "abc" };
    const rest = { conditions: null, source: null, file: null };
    expect(
      compounds[0]?.evidence.map((item) => ({ ...item, summary: item.summary.replaceAll("\u00A0", " ") })),
    ).toEqual([
      {
        kind: "coupling",
        summary: "Coupling between H1 and H2up: 10.90 ± 0.3 Hz. Note: second order",
        conditions: "298\u00A0K, CDCl3",
        source: "page 14",
        file: null,
        line: 6,
      },
      { kind: "population", summary: "Population of chair 1e,4e: 97 %", ...rest, line: 10 },
      {
        kind: "exchange",
        summary: "Exchange seen in 13C: coalescence at \u221260 °C, signals 96 Hz apart",
        ...rest,
        line: 11,
      },
      { kind: "contact", summary: "Contact through space between H1 and H3up: absent", ...rest, line: 12 },
      { kind: "geometry", summary: "Geometry in tn-01.cif", ...rest, file, line: 13 },
      { kind: "observation", summary: "Melts sharply.", ...rest, file, line: 14 },
    ]);
  });

  it("written with ring and groups becomes a SMILES whose atoms at locants 1 to 6 are known", () => {
    const bench =
      "---\ncode: TN-02\nname: x\nstructure:\n  ring: Tetrahydropyran\n  groups: { 2: { up: methoxy, down: H }, 5: { down: tBu } }\n---\n";
    const { compounds, diagnostics } = read(SERIES, contentFile(bench));
    expect(diagnostics).toEqual([]);
    const { smiles, ringLocants } = compounds[0]!.structure;
    expect(smiles).toMatch(/^O1\[C@@?H\]\(OC\)CC\[C@@?H\]\(C\(C\)\(C\)C\)C1$/);
    expect(ringLocants).toEqual([0, 1, 4, 5, 6, 11]);
  });

  it("is handed on in spite of other mistakes, so that its structure is judged in the same run", () => {
    const { compounds, diagnostics } = read(
      SERIES,
      contentFile("---\nnmae: x\nstructure: C1CC\nconditions: { temperature: 25 }\n---\n"),
    );
    expect(compounds.map(({ code, structure }) => [code, structure.smiles])).toEqual([["tn-01", "C1CC"]]);
    expect(diagnostics.map(({ code }) => code)).toEqual(["missing-key", "unknown-key", "bad-temperature"]);
  });

  it("keeps its review entries in the author's order", () => {
    const front =
      "review:\n  - { by: B, on: 2026-11-21, as: reviewer, meaning: checked }\n  - { by: A, on: 2026-11-20, as: author }\n";
    expect(read(SERIES, compound(front)).compounds[0]?.review).toEqual([
      { by: "B", on: "2026-11-21", as: "reviewer", meaning: "checked" },
      { by: "A", on: "2026-11-20", as: "author", meaning: null },
    ]);
  });
});

describe("a series", () => {
  it("has title, summary, notice and prose from its file", () => {
    expect(read(SERIES).series[0]).toMatchObject({
      slug: "tern",
      title: "Tern oxanes",
      summary: "A summary.",
      notice: "Invented.",
      prose: { markdown: "Series prose.\n", firstLine: 10 },
    });
  });

  it("without a file gets a title from its folder name and a caution", () => {
    const { series, diagnostics } = read(compound("", "series/little-tern/a.md"));
    expect(series.map(({ slug, title }) => [slug, title])).toEqual([["little-tern", "Little tern"]]);
    expect(diagnostics.map(({ code, severity }) => [code, severity])).toEqual([
      ["missing-series-file", "caution"],
    ]);
  });

  it("may be empty", () => {
    expect(read()).toMatchObject({ title: "Conformer dossiers", series: [], compounds: [], diagnostics: [] });
  });
});

describe("the site's own file", () => {
  it("gives the title, and may be prose alone", () => {
    expect(read(contentFile("---\ntitle: Our rings\n---\nHello.\n", "index.md"))).toMatchObject({
      title: "Our rings",
      prose: { markdown: "Hello.\n", firstLine: 4 },
    });
    expect(read(contentFile("Hello.\n", "index.md"))).toMatchObject({
      title: "Conformer dossiers",
      prose: { markdown: "Hello.\n", firstLine: 1 },
      diagnostics: [],
    });
  });
});

describe("codes", () => {
  const named = (code: string, path: string) =>
    contentFile(`---\ncode: ${code}\nname: x\nstructure: C1CCCCC1\n---\n`, path);

  it("that are equal, or equal but for case or punctuation, are reported with both places", () => {
    const { diagnostics } = read(
      SERIES,
      named("TN-01", "series/tern/a.md"),
      named("tn-01", "series/tern/b.md"),
      named("TN_01", "series/tern/c.md"),
      named("TN-01", "series/tern/d.md"),
    );
    expect(diagnostics.map(({ code, place }) => [code, place.file, place.line])).toEqual(
      ["b", "c", "d"].map((name) => ["duplicate-code", `content/series/tern/${name}.md`, 2]),
    );
    for (const { message } of diagnostics) expect(message).toContain("content/series/tern/a.md:2");
  });

  it("are told apart whatever the order in which files are given", () => {
    const files = [
      SERIES,
      named("B", "series/tern/b.md"),
      named("A", "series/tern/a.md"),
      named("a", "series/tern/c.md"),
    ];
    const plain = (input: ReturnType<typeof read>) => JSON.stringify(input);
    expect(plain(read(...[...files].reverse()))).toBe(plain(read(...files)));
  });
});
