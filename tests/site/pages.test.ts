import { readFileSync } from "node:fs";
import path from "node:path";
import { HtmlValidate } from "html-validate";
import { beforeAll, describe, expect, test } from "vitest";
import { buildCollection } from "../../src/dossier/buildCollection.ts";
import { readContent } from "../../src/dossier/content/readContent.ts";
import { PALETTE } from "../../src/drawing/palette.ts";
import { loadServices } from "../../src/site/loadServices.ts";
import { siteAssets } from "../../src/site/pages/siteAssets.ts";
import { sitePages } from "../../src/site/pages/sitePages.ts";

const HOSTILE = `<script>alert(1)</script>"'><img src=x onerror=alert(2)>{{ 7*7 }}\${1}`;

function file(name: string, text: string) {
  return { path: name, shownPath: `content/${name}`, text, sha256: "0".repeat(64) };
}

const FILES = [
  file("index.md", "---\ntitle: A & B <i>site</i>\n---\nText with <b>raw</b> HTML and {{ 7*7 }}.\n"),
  file(
    "series/one/index.md",
    `---\ntitle: ${JSON.stringify(HOSTILE)}\nsummary: "a <b>summary</b>"\nnotice: "<u>notice</u>"\n---\nScope.\n\n::table[comparison]\n`,
  ),
  file(
    "series/one/x-01.md",
    `---\ncode: X-01\nname: ${JSON.stringify(HOSTILE)}\nstructure: "C[C@H]1CC[C@@H](O)CC1"\nevidence:\n  - observation: ${JSON.stringify(HOSTILE)}\n    source: ${JSON.stringify(HOSTILE)}\nclaim: { configuration: cis, statement: ${JSON.stringify(HOSTILE)} }\nreview: [ { by: ${JSON.stringify(HOSTILE)}, on: 2026-11-20, as: author } ]\n---\n${HOSTILE}\n\n[link](javascript:alert(3)) and $x^2$ and :value[population.major].\n\n::figure[chair]{conformer=B}\n`,
  ),
  file("series/one/x-02.md", '---\ncode: X-02\nname: plain\nstructure: "CN1CCC(C)CC1"\n---\n'),
  file("series/one/x-03.md", '---\ncode: X-03\nname: lactone\nstructure: "O=C1CCCCO1"\n---\n'),
  file(
    "series/one/x-04.md",
    '---\ncode: X-04\nname: open\nstructure: "CC1CCC(O)CC1"\nstereoisomers: enumerate\n---\n',
  ),
  file(
    "series/one/x-05.md",
    '---\ncode: X-05\nname: placed\nstructure: "C[C@H]1CC[C@@H](O)CC1"\nevidence:\n  - observation: seen\n    source: a notebook\n---\nText\n::figure[equilibrium]\n::table[energies]\nand\n\n::derivation[equilibrium]\n\n::table[evidence]\n\n![words](https://example.org/x.png)\n',
  ),
];

let made: ReadonlyMap<string, string>;

beforeAll(async () => {
  const services = await loadServices({ mechanics: false });
  const content = readContent(FILES, [], services.register);
  const collection = buildCollection(content, services);
  expect(collection.diagnostics.filter(({ severity }) => severity === "error")).toEqual([]);
  const { pages, diagnostics } = sitePages(collection);
  expect(diagnostics.map(({ code, severity, place }) => [code, severity, place.file, place.line])).toEqual([
    ["picture-not-shown", "caution", "content/series/one/x-05.md", 18],
  ]);
  made = new Map(pages.map((page) => [page.path, page.render()]));
});

const html = () => [...made].filter(([name]) => name.endsWith(".html"));

describe("Pages", () => {
  test("exist for the site, its series and every compound, analysed or not", () => {
    for (const name of [
      "index.html",
      "series/one/index.html",
      "checks/index.html",
      "register/index.html",
      "references/index.html",
      "methods/index.html",
    ]) {
      expect(made.has(name), name).toBe(true);
    }
    for (const slug of ["x-01", "x-02", "x-03", "x-04", "x-05"])
      expect(made.has(`series/one/${slug}/index.html`)).toBe(true);
  });

  test("show hostile text as text: no element, handler or address of the author's making", () => {
    for (const [name, text] of html()) {
      expect(text, name).not.toMatch(/<script|<img|onerror=(?!alert\(2\)&gt;)|href="javascript:/i);
      expect(text, name).not.toContain("<b>raw</b>");
      expect(text, name).not.toContain(">49<");
    }
    expect(made.get("series/one/x-01/index.html")).toContain("&lt;script&gt;");
  });

  test("are valid HTML", async () => {
    const validator = new HtmlValidate({
      extends: ["html-validate:recommended"],
      rules: {
        // Formulae carry inline style and presentation attributes of the typesetting library; long titles are names.
        "no-inline-style": "off",
        "long-title": "off",
        "no-trailing-whitespace": "off",
        "svg-focusable": "off",
        "no-implicit-button-type": "off",

        "prefer-native-element": "off",
        "tel-non-breaking": "off",
      },
    });
    for (const [name, text] of html()) {
      const report = await validator.validateString(text);
      const messages = report.results.flatMap((result) =>
        result.messages.map((m) => `${m.line}:${m.column} ${m.ruleId} ${m.message}`),
      );
      expect(messages, name).toEqual([]);
    }
  });

  test("link only to pages, anchors and files that exist", () => {
    const files = new Set([...made.keys(), ...siteAssets().map(({ to }) => to)]);
    const ids = new Map(
      html().map(([name, text]) => [name, new Set([...text.matchAll(/\sid="([^"]+)"/g)].map((m) => m[1]!))]),
    );
    const broken: string[] = [];
    for (const [name, text] of html()) {
      for (const [, raw] of text.matchAll(/\s(?:href|src)="([^"]+)"/g)) {
        const address = raw!.replaceAll("&amp;", "&");
        if (address.startsWith("data:")) continue;
        const [target, anchor] = address.split("#");
        const to = target === "" ? name : path.posix.join(path.posix.dirname(name), target!);
        if (!files.has(to)) broken.push(`${name} -> ${address}`);
        else if (anchor !== undefined && !ids.get(to)?.has(anchor))
          broken.push(`${name} -> ${address} (no such anchor)`);
      }
    }
    expect(broken).toEqual([]);
  });

  test("have every id once", () => {
    for (const [name, text] of html()) {
      const ids = [...text.matchAll(/\sid="([^"]+)"/g)].map((m) => m[1]!);
      expect(
        ids.filter((id, i) => ids.indexOf(id) !== i),
        name,
      ).toEqual([]);
    }
  });

  test("number figures and tables in the order in which they stand", () => {
    const text = made.get("series/one/x-01/index.html")!;
    for (const word of ["Figure", "Table"]) {
      const numbers = [...text.matchAll(new RegExp(`caption-number">${word} (\\d+)\\.`, "g"))].map((m) =>
        Number(m[1]),
      );
      expect(numbers.length).toBeGreaterThan(1);
      expect(numbers).toEqual(numbers.map((_, i) => i + 1));
    }
  });

  test("mark where the reader stands: the page itself, or what it stands below", () => {
    const marked = (name: string) =>
      [...made.get(name)!.matchAll(/aria-current="(\w+)">([^<]+)</g)].map((m) => [m[2], m[1]]);
    expect(marked("checks/index.html")).toEqual([["Checks", "page"]]);
    expect(marked("series/one/index.html")).toEqual([["Series", "true"]]);
    expect(marked("series/one/x-01/index.html")).toEqual([["Series", "true"]]);
  });

  test("list what a dossier holds, parts placed by the prose included", () => {
    const text = made.get("series/one/x-05/index.html")!;
    const list = /<nav class="on-this-page"[\s\S]*?<\/nav>/.exec(text)![0];
    const entries = [...list.matchAll(/href="#([^"]+)">([^<]+)</g)].map((m) => m[2]);
    for (const title of ["Energies", "From contributions to populations", "Evidence"])
      expect(entries).toContain(title);
    expect(text).toContain('It stands in <a href="#x-05-table-evidence">the text above</a>.');
    expect(text.match(/id="x-05-table-energies"/g)).toHaveLength(1);
  });

  test("show the standing and the sources of a register value directly behind it", () => {
    const titles = [...made.get("register/index.html")!.matchAll(/<thead>\n(.*?)\n<\/thead>/g)].map((m) =>
      [...m[1]!.matchAll(/<th[^>]*>([^<]+)/g)].map((cell) => cell[1]!.trim()),
    );
    for (const columns of titles.filter((list) => list.includes("Sources") && list.includes("Medium")))
      expect(columns.indexOf("Medium")).toBe(columns.indexOf("Sources") + 1);
    expect(titles.flat()).toContain("Used by");
  });

  test("report a picture in prose on the checks page, with its place", () => {
    expect(made.get("checks/index.html")).toContain("content/series/one/x-05.md:");
    expect(made.get("checks/index.html")).toContain("picture-not-shown");
  });

  test("say plainly when nothing was analysed, and carry the caution everywhere", () => {
    expect(made.get("series/one/x-03/index.html")).toContain("is a lactone or carbonate ring");
    for (const [name, text] of html()) expect(text, name).toContain("Draft for qualified review");
  });

  test("take their colours from the figures' palette", () => {
    const css = readFileSync(new URL("../../templates/assets/ringfolio.css", import.meta.url), "utf8");
    const [light, dark] = [...css.matchAll(/:root \{([^}]*--paper[^}]*)\}/g)].map((m) => m[1]!);
    for (const [block, paper] of [
      [light, PALETTE.light],
      [dark, PALETTE.dark],
    ] as const) {
      for (const [ink, colour] of Object.entries(paper)) expect(block).toContain(`--${ink}: ${colour};`);
    }
  });
});

describe("Downloads", () => {
  test("hold the record as it is, and guard cells of the author's making", () => {
    const record = JSON.parse(made.get("series/one/x-01/x-01.json")!);
    expect(record.name).toBe(HOSTILE);
    expect(made.get("series/one/x-01/tables/evidence.csv")!.split("\r\n").length).toBeGreaterThan(1);
  });

  test("are drawings that stand alone", () => {
    const svg = made.get("series/one/x-02/figures/equilibrium.svg")!;
    expect(svg.startsWith('<?xml version="1.0" encoding="UTF-8"?>\n<svg')).toBe(true);
    expect(svg.match(/xmlns="http:\/\/www\.w3\.org\/2000\/svg"/g)).toHaveLength(1);
  });
});
