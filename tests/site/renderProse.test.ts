import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { renderProse } from "../../src/site/pages/renderProse.ts";

const MARKUP = '<span class="value">“a” &amp; b</span>';
const set = (markdown: string) =>
  renderProse(markdown, ({ kind }) => (kind === "value" ? MARKUP : "<figure>drawn</figure>"));
const htmlOf = (markdown: string) => set(markdown).html;

describe("A directive in prose", () => {
  test("is replaced where text stands: sentence, heading, table cell, link text", () => {
    for (const markdown of [
      "Before :value[name] after.",
      "## About :value[name]",
      "| a |\n| --- |\n| :value[name] |",
      "[see :value[name]](https://example.org/)",
    ])
      expect(htmlOf(markdown)).toContain(MARKUP);
  });

  test("never puts markup into an attribute: a title, an address, the words of a picture", () => {
    expect(htmlOf('[t](a.html ":value[name]")')).toBe('<p><a href="a.html" title=":value[name]">t</a></p>\n');
    expect(htmlOf("[t](https://example.org/:value[name])")).toContain(
      'href="https://example.org/:value%5Bname%5D"',
    );
    expect(htmlOf("[t](https://example.org/%E0%A4:value[name])")).toContain('href="https://example.org/');
    expect(htmlOf("![:value[name]](a.png)")).not.toContain(MARKUP);
  });

  test("stands as a block of its own beside text, other directives and in lists, never inside a paragraph", () => {
    for (const markdown of [
      "text\n::figure[wedge]\nmore",
      "::figure[wedge]\n::figure[temperature]",
      "- item\n  ::figure[wedge]",
      "> quoted\n::figure[wedge]",
      "| a |\n| --- |\n::figure[wedge]",
      "::figure[wedge]\n---",
    ]) {
      const html = htmlOf(markdown);
      expect(html).toContain("<figure>drawn</figure>");
      expect(html).not.toMatch(/<(p|h\d|td)>(?:(?!<\/\1>)[\s\S])*<figure>/);
    }
  });

  test("cannot be feigned by private characters, written or as entities", () => {
    expect(htmlOf("&#xE000;7&#xE001;")).toContain("7");
    const html = htmlOf("&#xE000;0&#xE001; \u{E000}0\u{E001} :value[name]");
    expect(html.split(MARKUP)).toHaveLength(2);
  });

  test("leaves the places of bad formulae as they are in the file", () => {
    const { problems } = set("::figure[wedge]\ntext\n\n:value[name] and $\\nosuch$");
    expect(problems.map(({ line, column }) => [line, column])).toEqual([[4, 19]]);
  });
});

describe("Other things in prose", () => {
  test("a picture is not fetched: its words are shown and its place is reported", () => {
    const { html, pictures } = set("One.\n\nTwo ![a chair](https://example.org/x.png) three.");
    expect(html).not.toContain("<img");
    expect(html).toContain("a chair");
    expect(pictures).toEqual([{ line: 3, column: 5 }]);
  });

  test("headings begin below the title of the page and keep their order", () => {
    expect(htmlOf("# One\n\n## Two")).toBe("<h2>One</h2>\n<h3>Two</h3>\n");
    expect(htmlOf("## One\n\n### Two")).toBe("<h2>One</h2>\n<h3>Two</h3>\n");
  });
});

describe("Whatever an author writes", () => {
  const piece = fc.constantFrom(
    "::figure[wedge]",
    ":value[name]",
    "&#xE000;0&#xE001;",
    "\u{E000}",
    "[a](",
    '](b ":value[name]")',
    "![",
    "](http://x/:value[name])",
    "`",
    "$",
    "$$",
    "**",
    "_",
    "> ",
    "- ",
    "1. ",
    "# ",
    "    ",
    "\n",
    "\n\n",
    "<b>",
    "<img src=x>",
    "| a |",
    "---",
    "|",
    "text",
    " ",
    "%E0%A4",
    "[r]: x",
  );

  test("is set without an exception, an element of the author's making, or a figure inside running text", () => {
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 24 }), (pieces) => {
        const markdown = pieces.join("");
        const { html, problems, pictures } = set(markdown);
        expect(html).not.toMatch(/<(img|b|script)\b/);
        // Outside what the program itself placed, no attribute was left open: quotes pair up in every tag.
        for (const [tag] of html.replaceAll(MARKUP, "").matchAll(/<[a-z][^>]*>/g))
          expect((tag.match(/"/g) ?? []).length % 2, tag).toBe(0);
        for (const { line } of [...problems, ...pictures])
          expect(line).toBeLessThanOrEqual(markdown.split("\n").length);
      }),
      { numRuns: 400 },
    );
  });
});
