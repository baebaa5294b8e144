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
