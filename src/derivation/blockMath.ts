import type { StateBlock } from "markdown-it";

/**
 * Block rule for a formula that begins a line with `$$` and ends one with `$$`, on the same or a later line.
 * Where the closing mark is missing the token covers the first line only and says so in its meta.
 */
export function blockMath(state: StateBlock, startLine: number, endLine: number, silent: boolean): boolean {
  const first = lineText(state, startLine);
  if (!first.startsWith("$$") || first[2] === "$" || state.sCount[startLine]! - state.blkIndent >= 4)
    return false;
  const last = closingLine(state, startLine, endLine);
  // A formula that closes within the line and is followed by words belongs to the paragraph.
  if (last === null && first.indexOf("$$", 2) !== -1) return false;
  if (silent) return true;
  const until = last ?? startLine;
  const lines = [first.slice(2)];
  for (let line = startLine + 1; line <= until; line++) lines.push(lineText(state, line));
  const content = lines.join("\n");
  const token = state.push("math_block", "math", 0);
  token.block = true;
  token.markup = "$$";
  token.content = last === null ? content : content.replace(/\$\$$/, "");
  token.map = [startLine, until + 1];
  token.meta = { unclosed: last === null };
  state.line = until + 1;
  return true;
}

/** The line that ends with the closing mark, or null; a blank line or the end of the block ends the search. */
function closingLine(state: StateBlock, startLine: number, endLine: number): number | null {
  for (let line = startLine; line < endLine; line++) {
    if (line > startLine && (state.isEmpty(line) || state.sCount[line]! < state.blkIndent)) return null;
    const text = line === startLine ? lineText(state, line).slice(2) : lineText(state, line);
    if (text.endsWith("$$")) return text.indexOf("$$") === text.length - 2 ? line : null;
  }
  return null;
}

function lineText(state: StateBlock, line: number): string {
  return state.src.slice(state.bMarks[line]! + state.tShift[line]!, state.eMarks[line]!).trimEnd();
}
