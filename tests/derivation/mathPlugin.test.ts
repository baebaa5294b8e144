import MarkdownIt from "markdown-it";
import { describe, expect, test } from "vitest";
import type { MathProblem } from "../../src/derivation/MathProblem.ts";
import { mathPlugin } from "../../src/derivation/mathPlugin.ts";

function render(markdown: string): { html: string; problems: MathProblem[] } {
  const problems: MathProblem[] = [];
  const md = new MarkdownIt({ html: false });
  md.use(mathPlugin, (problem: MathProblem) => problems.push(problem));
  return { html: md.render(markdown), problems };
}

/** How many formulae were set. */
const formulae = (html: string) => html.split('class="katex"').length - 1;

describe("formulae in prose", () => {
  test("are set between single dollar signs", () => {
    const { html, problems } = render("The constant $K = e^{-x}$ follows.");
    expect(formulae(html)).toBe(1);
    expect(html).toContain("<math");
    expect(problems).toEqual([]);
  });

  test("are displayed between double signs, on one line, on several, or inside a list or quotation", () => {
    expect(render("$$x = 1$$").html).toContain("katex-display");
    expect(render("Text\n$$\nx\n= 1\n$$\nmore").html).toContain("katex-display");
    expect(render("> $$\n> x = 1\n> $$").html).toContain("katex-display");
    expect(render("- item\n  $$\n  x = 1\n  $$").html).toContain("katex-display");
    expect(render("a $$x$$ b").html).toContain("katex-display");
  });

  test.each([
    "It costs $5 and $6.",
    "From $5-$6 a piece, $ 7 in all.",
    "An escaped \\$x\\$ sign.",
    "Code `$x$` and `a $` b $ c.",
    "    $$x$$",
    "```\n$x$\n$$y$$\n```",
    "A lone $ sign, and $$ two.",
  ])("leave money and code alone: %s", (markdown) => {
    const { html, problems } = render(markdown);
    expect(formulae(html)).toBe(0);
    expect(html).toContain("$");
    expect(problems).toEqual([]);
  });

  test("keep a code span whole when a dollar sign stands before it", () => {
    expect(render("It costs $5 `a$` b").html).toContain("<code>a$</code>");
  });

  test("report what cannot be set with line and column, and show the source", () => {
    const { html, problems } = render("First line.\n\nSee $x$ and $\\frac{1}$ here.");
    expect(formulae(html)).toBe(1);
    expect(html).toContain('<code class="math-problem">');
    expect(problems).toHaveLength(1);
    expect(problems[0]).toMatchObject({ line: 3 });
    expect(problems[0]!.column).toBeGreaterThanOrEqual(13);
  });

  test.each([
    ["a\n\n- b\n  c $\\nope$ d", 4, 6],
    ["> quoted $\\nope$", 1, 11],
    ["| a | b |\n|---|---|\n| x | $\\nope$ |", 3, 8],
    ["# Title $\\nope$", 1, 10],
    ["$$\nx\n+ \\nope\n$$", 3, 3],
    ["$$\\nope$$", 1, 3],
    ["para\nmore $x$ and $\\nope$", 2, 15],
  ])("point at the command in %j", (markdown, line, column) => {
    expect(render(markdown).problems).toMatchObject([{ line, column }]);
  });

  test("report a display formula without an end", () => {
    expect(render("Text.\n\n$$ x = 1\n\nmore").problems).toMatchObject([{ line: 3, column: 3 }]);
  });

  test.each([
    "$\\href{https://example.org}{x}$",
    "$\\url{https://example.org}$",
    "$\\includegraphics{a.png}$",
    "$\\htmlId{a}{x}$",
    "$\\def\\a{\\a\\a}\\a$",
  ])("may not leave the formula: %s", (markdown) => {
    const { html, problems } = render(markdown);
    expect(problems).toHaveLength(1);
    expect(html).not.toMatch(/<a |<img|href=/);
  });

  test("cannot define a macro for the next formula", () => {
    expect(render("$\\gdef\\a{1}\\a$ and $\\a$").problems).toHaveLength(1);
  });

  test("escape HTML in a formula that is shown as source", () => {
    expect(render("$\\nope <b>x</b>$").html).not.toContain("<b>");
  });
});
