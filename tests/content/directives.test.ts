import fc from "fast-check";
import MarkdownIt, { type Token } from "markdown-it";
import { describe, expect, it } from "vitest";
import { checkProse } from "../../src/dossier/content/checkProse.ts";
import { findDirectives } from "../../src/dossier/content/findDirectives.ts";
import { contentFile } from "./contentFile.ts";

const found = (markdown: string) =>
  findDirectives(markdown).map(({ kind, name, line, column }) => `${line}:${column} ${kind}/${name}`);
const codes = (markdown: string, page: "compound" | "series" | "site" = "compound") =>
  checkProse(contentFile(markdown), { markdown, firstLine: 1 }, page).map(({ code }) => code);

describe("directives in prose", () => {
  it("are found with their place, options and form", () => {
    expect(findDirectives("::figure[chair]{conformer=B}\n\nAt :value[temperature].", 10)).toEqual([
      {
        kind: "figure",
        name: "chair",
        options: { conformer: "B" },
        unread: "",
        form: "block",
        alone: true,
        line: 10,
        column: 1,
        length: 28,
      },
      {
        kind: "value",
        name: "temperature",
        options: {},
        unread: "",
        form: "inline",
        alone: false,
        line: 12,
        column: 4,
        length: 19,
      },
    ]);
  });

  it.each([
    ["a fenced block", "```\n::figure[chair]\n```\n"],
    ["a fence of tildes", "~~~ md\n:value[name]\n~~~\n"],
    ["a longer fence", "````\n```\n::figure[chair]\n````\n"],
    ["a fence never closed", "```\n::figure[chair]\n"],
    ["a fence in a list", "- item\n\n  ```\n  ::figure[chair]\n  ```\n"],
    ["an indented block", "Text.\n\n    ::figure[chair]\n\n    :value[name]\n"],
    ["a code span", "Write `:value[name]` or `` :value[`code`] ``."],
    ["a code span over two lines", "Write `one\n:value[name]` here."],
    ["an escape", "Write \\:value[name]."],
    ["a word or a clock time", "std::vector[3], see:value[name], 10:30[x]"],
  ])("are not looked for in %s", (_what, markdown) => {
    expect(found(markdown)).toEqual([]);
    expect(codes(markdown)).toEqual([]);
  });

  it("are found again after code, and where a backtick stands alone", () => {
    expect(found("```\nx\n```\n:value[name]")).toEqual(["4:1 value/name"]);
    expect(found("A ` alone.\n\n:value[name] and ` again")).toEqual(["3:1 value/name"]);
    expect(found("- item\n\n    :value[name] continues the item")).toEqual(["3:5 value/name"]);
  });

  it("are known by the page they stand on", () => {
    expect(codes("::table[comparison]\n", "series")).toEqual([]);
    expect(codes("::table[comparison]\n", "compound")).toEqual(["unknown-table"]);
    expect(codes("::table[energies]\n", "series")).toEqual(["unknown-table"]);
    expect(codes(":value[name]\n", "site")).toEqual(["unknown-value"]);
  });

  it("keep their form: blocks alone on a line, values within text", () => {
    expect(codes("Text ::figure[chair]\n")).toEqual(["misplaced-directive"]);
    expect(codes(":figure[chair]\n")).toEqual(["misplaced-directive"]);
    expect(codes("::value[name]\n")).toEqual(["misplaced-directive"]);
    expect(codes("  ::figure[chair]  \n")).toEqual([]);
  });

  it("are told apart from unfinished ones", () => {
    expect(codes("::figure\n")).toEqual(["broken-directive"]);
    expect(codes("::figure[chair\n")).toEqual(["broken-directive"]);
    expect(codes("::figure[chair]{conformer}\n")).toEqual(["broken-directive"]);
  });
});

describe("code in prose", () => {
  it("is what a Markdown renderer takes for code, whatever stands around it", () => {
    const renderer = new MarkdownIt({ html: false });
    const shown = (tokens: readonly Token[]): string[] =>
      tokens.flatMap(({ children, type, content }) =>
        children !== null
          ? shown(children)
          : type === "text"
            ? [...content.matchAll(/(?<![\w:]):value\[(v\d)\]/g)].map((match) => match[1]!)
            : [],
      );
    const start = fc
      .array(fc.constantFrom("- ", "1. ", "> ", "    ", "  ", "`", "``", "```", "~~~", "text", " ", "\t"), {
        maxLength: 4,
      })
      .map((parts) => parts.join(""));
    const document = fc
      .array(fc.tuple(start, fc.boolean()), { minLength: 1, maxLength: 6 })
      .map((lines) =>
        lines.map(([line, has], index) => (has ? `${line}:value[v${index}]` : line)).join("\n"),
      );
    fc.assert(
      fc.property(document, (markdown) => {
        expect(findDirectives(markdown).map(({ name }) => name)).toEqual(shown(renderer.parse(markdown, {})));
      }),
      { seed: 5, numRuns: 500 },
    );
  });
});

describe("raw HTML in prose", () => {
  it.each(["<b>x</b>", "</div>", "<br/>", "<img src=x onerror=y>", "<!-- remark -->", "<SCRIPT>"])(
    "is pointed out once a line: %s",
    (html) => {
      expect(codes(`Text ${html} text.\n`)).toEqual(["raw-html"]);
    },
  );

  it.each([
    "a < b and c > d",
    "<https://example.org>",
    "<a.b@example.org>",
    "`<b>`",
    "p<0.05",
    "2 <3",
    "```\n<b>\n```",
  ])("is not seen in %s", (text) => {
    expect(codes(`${text}\n`)).toEqual([]);
  });
});
