import { describe, expect, it } from "vitest";
import { parseFrontMatter } from "../../src/dossier/content/parseFrontMatter.ts";
import { contentFile } from "./contentFile.ts";

const parse = (text: string) => parseFrontMatter(contentFile(text));
const codes = (text: string) =>
  parse(text).diagnostics.map(({ code, place }) => `${place.line}:${place.column} ${code}`);

describe("front matter", () => {
  it("is taken apart into data and prose", () => {
    const matter = parse("---\ncode: TN-01\nlist: [1, x]\n---\nFirst line.\nSecond.\n");
    expect(matter.data).toEqual({ code: "TN-01", list: [1, "x"] });
    expect(matter.prose).toEqual({ markdown: "First line.\nSecond.\n", firstLine: 5 });
    expect(matter.diagnostics).toEqual([]);
  });

  it("is read the same with a byte order mark and with carriage returns, at the same places", () => {
    const plain = parse("---\ncode: TN-01\nname: x\n---\nProse.\n");
    const windows = parse("\uFEFF---\r\ncode: TN-01\r\nname: x\r\n---\r\nProse.\r\n");
    expect(windows.data).toEqual(plain.data);
    expect(windows.prose).toEqual(plain.prose);
    expect(windows.place(["name"])).toEqual(plain.place(["name"]));
    expect(windows.place(["name"])).toEqual({
      file: "content/series/tern/tn-01.md",
      line: 3,
      column: 7,
      length: 1,
      sourceLine: "name: x",
    });
  });

  it("may be empty, and keys written in digits stay text", () => {
    expect(parse("---\n---\n").data).toEqual({});
    expect(parse("---\n# only a remark\n---\n").data).toEqual({});
    expect(parse("---\n1: { up: Me }\n---\n").data).toEqual({ "1": { up: "Me" } });
  });

  it("keeps dates, yes and no as the author wrote them", () => {
    expect(parse("---\non: 2026-11-20\nseen: yes\nbase: NO\n---\n").data).toEqual({
      on: "2026-11-20",
      seen: "yes",
      base: "NO",
    });
  });
});

describe("places in front matter", () => {
  const matter = parse(
    "---\nstructure:\n  ring: oxane\n  groups:\n    2: { up: Me }\nempty:\nquoted: 'C1CC(1'\nplain: CC(\n---\n",
  );
  const at = (...path: (string | number)[]) => {
    const { line, column, length } = matter.place(path);
    return [line, column, length];
  };

  it("point to the value at a path, with its length", () => {
    expect(at("structure", "ring")).toEqual([3, 9, 5]);
    expect(at("structure", "groups", 2, "up")).toEqual([5, 14, 2]);
    expect(at("structure", "groups", "2", "up")).toEqual([5, 14, 2]);
  });

  it("fall back to the nearest ancestor, to the key of an empty value, and to the fence for the whole", () => {
    expect(at("structure", "groups", 3, "up")).toEqual([5, 5, 13]);
    expect(at("empty")).toEqual([6, 1, 5]);
    expect(at("conditions", "temperature")).toEqual([1, 1, 3]);
    expect(at()).toEqual([1, 1, 3]);
  });

  it("count into a text, quoted or not", () => {
    expect(matter.place(["quoted"], 4)).toMatchObject({ line: 7, column: 14, length: 1 });
    expect(matter.place(["plain"], 2)).toMatchObject({ line: 8, column: 10, length: 1 });
  });

  it("show no control characters of the source, and stay true in column", () => {
    const { place } = parse("---\nname: a\u001b[31mb\u202ec\n---\n");
    expect(place(["name"]).sourceLine).toBe("name: a\uFFFD[31mb\uFFFDc");
  });
});

describe("front matter that cannot be read", () => {
  it.each([
    ["an empty file", "", "1:1 empty-file"],
    ["white space alone", " \n\n", "1:1 empty-file"],
    ["no fence", "Prose.\n", "1:1 missing-front-matter"],
    ["a fence that is too long", "----\na: 1\n----\n", "1:1 missing-front-matter"],
    ["a fence after a blank line", "\n---\na: 1\n---\n", "1:1 missing-front-matter"],
    ["a fence never closed", "---\na: 1\n", "1:1 unterminated-front-matter"],
    ["a language after the fence", "---js\n{}\n---\n", "1:1 executable-front-matter"],
    ["a language after a space", "--- json\n{}\n---\n", "1:1 executable-front-matter"],
    ["an older name of a language", "---jsLegacy\n{}\n---\n", "1:1 executable-front-matter"],
    ["any word after the fence", "---yaml\na: 1\n---\n", "1:1 executable-front-matter"],
    ["a NUL character", "---\na: b\0\n---\n", "2:5 nul-character"],
    ["more than a million characters", `---\na: 1\n---\n${"x".repeat(1_000_000)}`, "1:1 file-too-large"],
    ["front matter beyond all measure", `---\na: ${"x".repeat(100_001)}\n---\n`, "2:1 file-too-large"],
    ["a list for a root", "---\n- a\n---\n", "2:1 not-a-map"],
    ["a colon without a space", "---\na:b\n---\n", "2:1 not-a-map"],
    ["a tab for indentation", "---\na:\n\tb: 1\n---\n", "3:1 broken-yaml"],
    ["an open quotation mark", "---\na: 1\nb: 'x\nc: 2\n---\n", "3:4 broken-yaml"],
    ["an open bracket", "---\na: [1, 2\nb: 3\n---\n", "2:4 broken-yaml"],
    ["a bare SMILES that begins with a bracket", "---\na: [C@H](F)(Cl)Br\n---\n", "2:9 broken-yaml"],
    ["an alias of nothing", "---\na: *x\n---\n", "2:4 broken-yaml"],
    ["a second document", "---\na: 1\n...\nb: 2\n---\n", "4:1 broken-yaml"],
    ["a list as a key", "---\n? [a]\n: 1\n---\n", "2:3 broken-yaml"],
    ["a list in a list in a list without end", `---\na:\n  ${"- ".repeat(5_000)}x\n---\n`, "3:3 broken-yaml"],
    ["indentation without end", `---\na:\n${" ".repeat(200)}b: 1\n---\n`, "3:1 broken-yaml"],
    ["nesting without end", `---\na: ${"[".repeat(20_000)}\n---\n`, "2:64 broken-yaml"],
    ["an alias within itself", "---\na: &a [*a]\n---\n", "2:8 broken-yaml"],
  ])("is reported at its place: %s", (_what, text, told) => {
    expect(codes(text)).toEqual([told]);
  });

  it("is told once, without the echoes of the first error", () => {
    expect(codes("---\na: {b: [1, 2\nc: 'x\n---\n")).toHaveLength(1);
  });

  it("still has its prose read where the closing fence is found", () => {
    expect(parse("---js\n{}\n---\nProse.\n").prose).toEqual({ markdown: "Prose.\n", firstLine: 4 });
  });

  it("offers quotation marks for a bare SMILES that begins with a bracket", () => {
    expect(parse("---\na: [C@H](F)(Cl)Br\n---\n").diagnostics[0]?.suggestion).toBe("'[C@H](F)(Cl)Br'");
  });

  it.each([
    [6, "2:1 too-many-aliases"],
    [9, "5:14 too-many-aliases"],
  ])("stops an alias bomb of %i to the third instead of unfolding it", (width, told) => {
    const row = (name: string, of: string) => `${name}: &${name} [${`*${of},`.repeat(width)}]`;
    expect(codes(`---\na: &a [x]\n${row("b", "a")}\n${row("c", "b")}\n${row("d", "c")}\n---\n`)).toEqual([
      told,
    ]);
  });

  it("refuses keys given twice, also those that reach for a prototype", () => {
    expect(codes("---\na: 1\na: 2\n---\n")).toEqual(["3:1 duplicate-key"]);
    const matter = parse("---\n__proto__: { polluted: true }\n---\n");
    expect(Object.keys(matter.data ?? {})).toEqual(["__proto__"]);
    expect(({} as { polluted?: boolean }).polluted).toBeUndefined();
  });

  it("refuses tags of every kind but those of YAML itself", () => {
    expect(codes("---\na: !!js/function 'function () {}'\nb: !mine {x: 1}\nc: !!str 5\n---\n")).toEqual([
      "2:4 forbidden-tag",
      "3:4 forbidden-tag",
    ]);
  });
});
