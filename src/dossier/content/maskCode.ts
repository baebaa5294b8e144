import MarkdownIt, { type Token } from "markdown-it";

/** Only its block structure is used: which lines are code, and which lines hold running text. */
const MARKDOWN = new MarkdownIt({ html: false });

/**
 * The Markdown with code (fenced, indented and inline) blanked out, every other character in its place,
 * so that what stands in code is neither a directive nor raw HTML.
 */
export function maskCode(markdown: string): string {
  const lines = markdown.split("\n");
  const tokens: Token[] = [];
  MARKDOWN.block.parse(markdown.replaceAll("\0", "\uFFFD"), MARKDOWN, {}, tokens);
  for (const { type, map } of tokens) {
    if (map === null) continue;
    const [from, to] = map;
    if (type === "fence" || type === "code_block") {
      for (let index = from; index < to; index += 1) lines[index] = " ".repeat(lines[index]?.length ?? 0);
    } else if (type === "inline") {
      lines.splice(from, to - from, ...maskSpans(lines.slice(from, to).join("\n")).split("\n"));
    }
  }
  return lines.join("\n");
}

/** Blanks code spans: a run of backticks up to the next run of the same length within the same running text. */
function maskSpans(text: string): string {
  const runs = [...text.matchAll(/`+/g)];
  let result = "";
  let done = 0;
  for (let index = 0; index < runs.length; index += 1) {
    const opening = runs[index]!;
    if (opening.index < done || text[opening.index - 1] === "\\") continue;
    const closing = runs.slice(index + 1, index + 200).find((run) => run[0].length === opening[0].length);
    if (closing === undefined) continue;
    const end = closing.index + closing[0].length;
    result += text.slice(done, opening.index) + text.slice(opening.index, end).replace(/[^\n]/g, " ");
    done = end;
  }
  return result + text.slice(done);
}
