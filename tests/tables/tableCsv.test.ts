import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { TABLES } from "../../src/tables/TABLES.ts";
import type { TableModel } from "../../src/tables/TableModel.ts";
import { tableCsv } from "../../src/tables/tableCsv.ts";
import { madeDossier, sampleDossier } from "../derivation/madeDossier.ts";

/** Reads CSV by the grammar of RFC 4180, independently of the writer. */
function parseCsv(csv: string): string[][] {
  const rows: string[][] = [[]];
  const field = /("(?:[^"]|"")*"|[^",\r\n]*)(,|\r\n)/gy;
  for (const [, raw, end] of csv.matchAll(field)) {
    rows.at(-1)!.push(raw!.startsWith('"') ? raw!.slice(1, -1).replaceAll('""', '"') : raw!);
    if (end === "\r\n") rows.push([]);
  }
  rows.pop();
  return rows;
}

const words = (text: string): TableModel => ({
  id: "t",
  caption: "t",
  columns: [{ key: "a", title: "A", align: "left" }],
  rows: [{ cells: [{ text }] }],
  notes: [],
});

describe("CSV", () => {
  test("ends every line with CRLF and quotes breaks, commas and quotes (source: RFC 4180, section 2, from memory)", () => {
    const csv = tableCsv({
      ...words(""),
      columns: ["aaa", "bbb", "ccc"].map((title) => ({ key: title, title, align: "left" as const })),
      rows: [
        { cells: [{ text: "aaa" }, { text: "b\r\nbb" }, { text: "ccc" }] },
        { cells: [{ text: 'b"bb' }, { text: "x,y" }, { text: "" }] },
      ],
    });
    expect(csv).toBe('aaa,bbb,ccc\r\naaa,"b\r\nbb",ccc\r\n"b""bb","x,y",\r\n');
  });

  test.each(Object.keys(TABLES))("of table %s has the same number of fields in every line", (name) => {
    const rows = parseCsv(tableCsv(TABLES[name]!(sampleDossier())));
    expect(new Set(rows.map((row) => row.length)).size).toBe(1);
  });

  test("gives plain numbers with the unit in the heading, negative ones with an ASCII hyphen", () => {
    const dossier = madeDossier({ anomeric: [-3.5, 0.4] }, [
      [{ label: "OMe axial", rows: { anomeric: 1 } }],
      [],
    ]);
    const [head, first] = parseCsv(tableCsv(TABLES["energies"]!(dossier)));
    const at = head!.indexOf("A / kJ/mol");
    expect(first![at]).toBe("-3.5");
    expect(Number(first![at + 1])).toBeCloseTo(-3.5 / 4.184, 8);
    expect(head).toContain("u / kcal/mol");
  });

  test("gives populations with both ends of their interval in per cent", () => {
    const [head, first] = parseCsv(tableCsv(TABLES["conformers"]!(sampleDossier())));
    const at = head!.indexOf("Population / %");
    const [value, low, high] = first!.slice(at, at + 3).map(Number);
    expect(low).toBeLessThan(value!);
    expect(high).toBeGreaterThan(value!);
    expect(high).toBeLessThan(100);
  });

  test.each(["=1+1", "+A1", "-2", "@SUM(A1)", "\tx"])("keeps text %j from running as a formula", (text) => {
    expect(parseCsv(tableCsv(words(text)))[1]).toEqual([`'${text}`]);
  });

  test("guards what an author wrote in a real table", () => {
    const csv = tableCsv(TABLES["identity"]!({ ...sampleDossier(), name: '=HYPERLINK("x")' }));
    expect(csv).toContain(`"'=HYPERLINK(""x"")"`);
  });

  test("leaves out marks and markup", () => {
    const csv = tableCsv(TABLES["identity"]!(sampleDossier()));
    expect(csv).toContain("Molecular formula,C7H14O");
    expect(csv).not.toMatch(/[●■◇◌<>]/);
  });

  test("brings any text back when it is read", () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        if (text === "\u2013") return;
        const [, row] = parseCsv(tableCsv(words(text)));
        expect(row![0]!.replace(/^'(?='*[=+\-@\t\r\n])/, "")).toBe(text);
      }),
    );
  });
});
