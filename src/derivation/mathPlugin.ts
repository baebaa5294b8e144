import type { MarkdownIt, StateCore, Token } from "markdown-it";
import { escapeHtml } from "../quantity/escapeHtml.ts";
import { blockMath } from "./blockMath.ts";
import { inlineMath } from "./inlineMath.ts";
import type { MathProblem } from "./MathProblem.ts";
import { renderTex } from "./renderTex.ts";
import { TexError } from "./TexError.ts";

/**
 * markdown-it plugin for formulae in prose: `$…$` in a line, `$$…$$` on lines of their own.
 * A formula that cannot be set is reported through `onProblem`, never thrown, and shows its source.
 */
export function mathPlugin(md: MarkdownIt, onProblem: (problem: MathProblem) => void): void {
  md.inline.ruler.after("escape", "math_inline", inlineMath);
  md.block.ruler.before("fence", "math_block", blockMath, {
    alt: ["paragraph", "reference", "blockquote", "list"],
  });
  md.core.ruler.push("math_set", (state) => setFormulae(state, onProblem));
  md.renderer.rules["math_inline"] = (tokens, index) => htmlOf(tokens[index]!);
  md.renderer.rules["math_block"] = (tokens, index) =>
    `<div class="math-scroll" role="region" tabindex="0" aria-label="Formula">${htmlOf(tokens[index]!)}</div>\n`;
}

/** Sets every formula once the tokens stand, when their lines are known. */
function setFormulae(state: StateCore, onProblem: (problem: MathProblem) => void): void {
  const source = state.src.split("\n");
  // Cells of a table have no lines of their own; their row, which comes before, has.
  let line = 0;
  for (const token of state.tokens) {
    if (token.map !== null) line = token.map[0];
    if (token.type === "math_block")
      set(token, true, (position) => inBlock(token, position, source), onProblem);
    for (const child of token.children ?? []) {
      if (child.type !== "math_inline") continue;
      const offset = (child.meta as { offset: number }).offset;
      const first = line;
      set(
        child,
        child.markup === "$$",
        (position) => inInline(token, offset + position, first, source),
        onProblem,
      );
    }
  }
}

type Locate = (position: number) => { readonly line: number; readonly column: number };

function set(
  token: Token,
  display: boolean,
  locate: Locate,
  onProblem: (problem: MathProblem) => void,
): void {
  const meta = token.meta as { unclosed?: boolean };
  if (meta.unclosed === true) {
    onProblem({ message: "The formula that begins here with $$ has no closing $$.", ...locate(0) });
    token.meta = { html: source(token) };
    return;
  }
  try {
    token.meta = { html: renderTex(token.content.trim(), { display }) };
  } catch (error) {
    if (!(error instanceof TexError)) throw error;
    const leading = token.content.length - token.content.trimStart().length;
    onProblem({ message: error.message, ...locate(leading + (error.position ?? 0)) });
    token.meta = { html: source(token) };
  }
}

function source(token: Token): string {
  return `<code class="math-problem">${escapeHtml(token.markup + token.content + token.markup)}</code>`;
}

function htmlOf(token: Token): string {
  return (token.meta as { html?: string }).html ?? "";
}

/** Place of a character of a block formula, whose first line stands behind `$$`. */
function inBlock(token: Token, position: number, source: readonly string[]): ReturnType<Locate> {
  const before = token.content.slice(0, position).split("\n");
  const line = (token.map?.[0] ?? 0) + before.length - 1;
  const text = token.content.split("\n")[before.length - 1] ?? "";
  const indent = Math.max(0, (source[line] ?? "").indexOf(before.length === 1 ? `$$${text}` : text));
  const mark = before.length === 1 ? 2 : 0;
  return { line: line + 1, column: indent + mark + before.at(-1)!.length + 1 };
}

/** Place of a character of an inline token, whose lines have lost their indentation. */
function inInline(
  inline: Token,
  position: number,
  first: number,
  source: readonly string[],
): ReturnType<Locate> {
  const before = inline.content.slice(0, position).split("\n");
  const line = first + before.length - 1;
  const text = (inline.content.split("\n")[before.length - 1] ?? "").trimEnd();
  const indent = Math.max(0, (source[line] ?? "").indexOf(text));
  return { line: line + 1, column: indent + before.at(-1)!.length + 1 };
}
