import { HtmlValidate } from "html-validate";
import { describe, expect, test } from "vitest";
import { numberContributions } from "../../src/derivation/numberContributions.ts";
import type { Series } from "../../src/dossier/Collection.ts";
import type { Dossier } from "../../src/dossier/Dossier.ts";
import { cellHtml } from "../../src/tables/cellHtml.ts";
import { contributionStanding } from "../../src/tables/contributionStanding.ts";
import { renderTable } from "../../src/tables/renderTable.ts";
import { SERIES_TABLES } from "../../src/tables/SERIES_TABLES.ts";
import { standingKey } from "../../src/tables/standingKey.ts";
import { standingMark } from "../../src/tables/standingMark.ts";
import { TABLES } from "../../src/tables/TABLES.ts";
import type { CellStanding, TableModel } from "../../src/tables/TableModel.ts";
import { madeDossier, sampleDossier } from "../derivation/madeDossier.ts";

const ROWS = { methyl: [7.28, 0.25], hydroxyl: [2.72, 0.5] } as const;
const PAIR = madeDossier(ROWS, [
  [{ label: "CO_2Me axial", rows: { hydroxyl: 1 } }],
  [
    { label: "CO_2Me axial", rows: { hydroxyl: 1 } },
    { label: "*t*-Bu axial", rows: { methyl: -1 } },
  ],
]);
const EQUAL = madeDossier(
  ROWS,
  [[{ label: "a", rows: { methyl: 1 } }], [{ label: "b", rows: { methyl: 1 } }]],
  {
    relation: "enantiomeric",
  },
);

function seriesOf(...dossiers: Dossier[]): Series {
  const prose = { markdown: "", firstLine: 1 };
  return { slug: "made", title: "Made up", summary: "", notice: null, prose, dossiers };
}

const text = (model: TableModel, row: number, key: string) =>
  model.rows[row]!.cells[model.columns.findIndex((column) => column.key === key)]!.text.replaceAll(
    "\u00a0",
    " ",
  );

describe("The tables of a dossier", () => {
  test.each(Object.entries(TABLES))(
    "%s has as many cells in each row as columns, and is valid HTML",
    async (_, build) => {
      const validator = new HtmlValidate({ extends: ["html-validate:standard"] });
      for (const dossier of [
        sampleDossier(),
        PAIR,
        EQUAL,
        {
          ...PAIR,
          evidence: [],
          sources: [],
          identity: { ...PAIR.identity, stereocentres: [] },
          conformers: [],
          equilibria: [],
        },
      ]) {
        const model = build(dossier);
        for (const row of model.rows) expect(row.cells.length).toBe(model.columns.length);
        const html = renderTable(model, { idPrefix: dossier.slug });
        const report = await validator.validateString(
          `<!DOCTYPE html><html lang="en"><head><title>t</title></head><body>${html}</body></html>`,
        );
        expect(report.results.flatMap(({ messages }) => messages.map(({ message }) => message))).toEqual([]);
        expect(html).not.toMatch(/undefined|NaN|Infinity/);
      }
    },
  );

  test("are found under the names an author writes", () => {
    expect(Object.keys(TABLES)).toEqual([
      "identity",
      "stereocentres",
      "stereoisomers",
      "conformers",
      "shapes",
      "energies",
      "temperature",
      "members",
      "evidence",
      "sources",
    ]);
    for (const [name, build] of Object.entries(TABLES)) expect(build(PAIR).id).toBe(name);
  });

  test("say that evidence is missing rather than leave it out", () => {
    expect(text(TABLES["evidence"]!({ ...PAIR, evidence: [] }), 0, "summary")).toBe(
      "No measured evidence is given.",
    );
  });
});

describe("The energy table", () => {
  const model = TABLES["energies"]!(PAIR);

  test("numbers its rows as the derivation does", () => {
    const numbered = numberContributions(PAIR);
    for (const [index, { number, contribution }] of numbered.entries()) {
      expect(text(model, index, "number")).toBe(String(number));
      expect(text(model, index, "contribution")).toBe(contribution.label);
    }
  });

  test("shows a contribution in every conformer that has it and a dash elsewhere", () => {
    expect(text(model, 0, "conformer-A")).toBe(text(model, 0, "conformer-B"));
    const own = model.rows.findIndex((row) => row.cells[1]!.text.includes("Bu"));
    const inA = PAIR.conformers[0]!.contributions.length === 2;
    expect(text(model, own, inA ? "conformer-B" : "conformer-A")).toBe("–");
    expect(text(model, own, inA ? "conformer-A" : "conformer-B")).toBe("−7.28 (−1.74)");
  });

  test("ends with sum, difference, its uncertainty and the population with its interval", () => {
    const results = model.rows.filter(({ kind }) => kind === "result");
    expect(results.map((row) => row.cells[1]!.text)).toEqual([
      "Sum",
      "ΔG° relative to A",
      "u(ΔG°)",
      "Population",
    ]);
    expect(results[3]!.cells[2]!.text).toMatch(/\(.*%\)$/);
  });

  test("does not repeat in the note why a stand-in was used", () => {
    const [first, second] = sampleDossier().conformers;
    const [contribution] = second!.contributions;
    const why = "No value for X; its class stands in.";
    const standIn = {
      ...contribution!,
      basis: "not available" as const,
      source: why,
      note: `${why} Seen once.`,
    };
    const dossier = { ...sampleDossier(), conformers: [first!, { ...second!, contributions: [standIn] }] };
    expect(text(TABLES["energies"]!(dossier), 0, "source")).toBe(why);
    expect(text(TABLES["energies"]!(dossier), 0, "note")).toBe("Seen once.");
  });

  test("keeps ten conformers readable by writing out the first ones and saying so", () => {
    const many = madeDossier(
      ROWS,
      Array.from({ length: 10 }, (_, i) => [{ label: `s${i}`, rows: { hydroxyl: i } }]),
    );
    const wide = TABLES["energies"]!(many);
    expect(wide.columns.filter(({ key }) => key.startsWith("conformer-"))).toHaveLength(6);
    expect(wide.notes.at(-1)).toContain("Of 10 conformers");
  });
});

describe("Standing", () => {
  test.each([
    ["published", "confirmed", "published", "published"],
    ["published", "memory", "published", "published, from memory"],
    ["published", "estimate", "estimated", "estimated"],
    ["computed", null, "computed", "computed"],
    ["not available", null, "estimated", "not available, stand-in"],
  ] as const)("of basis %s, register mark %s is %s with the words %s", (basis, standing, mark, words) => {
    expect(contributionStanding({ basis, standing })).toEqual({ standing: mark, words });
  });

  test("has a mark of its own for each kind, always with a word", () => {
    const all: CellStanding[] = ["measured", "published", "computed", "estimated", "symmetry"];
    const marks = all.map((standing) => /aria-hidden="true">(.)</.exec(standingMark(standing))![1]);
    expect(marks.slice(0, 4)).toEqual(["●", "■", "◇", "◌"]);
    expect(new Set(marks).size).toBe(marks.length);
    for (const standing of all) expect(standingMark(standing)).toMatch(/visually-hidden">[a-z]/);
    expect(standingKey().match(/<li>/g)).toHaveLength(all.length);
  });
});

describe("A rendered table", () => {
  test("escapes everything and sets label markup only where it is one", () => {
    const hostile = { ...PAIR, name: '<script>alert("x")</script> a_2', code: "X<1" };
    const html = renderTable(TABLES["identity"]!(hostile));
    expect(html).not.toContain("<script>");
    expect(html).toContain("a_2");
    expect(html).toContain("C<sub>7</sub>H<sub>14</sub>O");
  });

  test("has a caption, scoped headings, and scrolls by keyboard in a named region", () => {
    const html = renderTable(TABLES["energies"]!(PAIR), { idPrefix: "sx-01", number: "Table 2." });
    expect(html).toContain('role="region" tabindex="0" aria-label="Table 2. Contributions');
    expect(html).toContain('<span class="caption-number">Table 2.</span>');
    expect(html).toContain('<th scope="col"');
    expect(html).toContain('<th scope="row"');
    expect(html).toContain('id="sx-01-table-energies-row-1"');
    expect(html).toContain("<i>t</i>-Bu axial");
  });

  test("links a citation key without cutting label markup beside it", () => {
    const cell = { text: "EW94 for C_6H_11, EW94b", markup: true, sourceKeys: ["EW94"] };
    expect(cellHtml(cell, { sourceHref: (key) => `#${key}` })).toBe(
      '<a href="#EW94">EW94</a> for C<sub>6</sub>H<sub>11</sub>, EW94b',
    );
  });

  test("links citation keys and register rows where the caller knows their place", () => {
    const html = renderTable(TABLES["energies"]!(sampleDossier()), {
      sourceHref: (key) => (key === "EG69" ? "../references/index.html#EG69" : undefined),
      rowHref: (row) => `../register/index.html#${row}`,
    });
    expect(html).toContain('ABR93, <a href="../references/index.html#EG69">EG69</a>, EW94');
    expect(html).toContain('<a href="../register/index.html#axial/cyclohexane/Me">published</a>');
  });
});

describe("The comparison of a series", () => {
  test("has a line for each member with values that can be ordered", () => {
    const model = SERIES_TABLES["comparison"]!(
      seriesOf(sampleDossier(), EQUAL),
      ({ slug }) => `${slug}/index.html`,
    );
    expect(model.rows).toHaveLength(2);
    expect(model.rows[0]!.cells[0]).toMatchObject({ href: "sx-01/index.html" });
    expect(text(model, 0, "configuration")).toBe("cis-1,3");
    expect(text(model, 0, "checks")).toBe("1");
    expect(text(model, 1, "major")).toContain("(equal by symmetry)");
    expect(text(model, 1, "population")).toBe("50 % (exact by symmetry)");
    expect(renderTable(model)).toMatch(/data-sort="0\.997/);
  });

  test("lists a member that could not be analysed", () => {
    const model = SERIES_TABLES["comparison"]!(seriesOf({ ...PAIR, conformers: [], equilibria: [] }));
    expect(text(model, 0, "major")).toBe("not analysed");
  });
});
