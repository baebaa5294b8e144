import type { StateInline } from "markdown-it";

/**
 * Inline rule for `$…$` and, within a line, `$$…$$`.
 *
 * So that money stays money, the opening sign is followed and the closing one preceded by something other than a
 * space, and the closing one is not followed by a digit. A backtick ends the search: code is never eaten.
 * `\$` is an ordinary sign, before and inside a formula.
 */
export function inlineMath(state: StateInline, silent: boolean): boolean {
  const { src, pos, posMax } = state;
  if (src[pos] !== "$") return false;
  const mark = src.startsWith("$$", pos) ? "$$" : "$";
  const start = pos + mark.length;
  if (start >= posMax || /[\s$]/.test(src[start] ?? " ")) return skip(state, mark, silent);
  const end = closing(src, start, posMax, mark);
  if (end === -1) return skip(state, mark, silent);
  if (!silent) {
    const token = state.push("math_inline", "math", 0);
    token.content = src.slice(start, end);
    token.markup = mark;
    token.meta = { offset: start };
  }
  state.pos = end + mark.length;
  return true;
}

/** Position of the closing mark, or −1. */
function closing(src: string, start: number, end: number, mark: string): number {
  for (let at = start; at + mark.length <= end; at++) {
    const character = src[at];
    if (character === "`") return -1;
    if (character === "\\") at++;
    else if (src.startsWith(mark, at)) {
      const before = src[at - 1] ?? " ";
      const after = src[at + mark.length] ?? " ";
      if (!/\s/.test(before) && !/\d/.test(after)) return at;
    }
  }
  return -1;
}

/** Passes over a mark that opens nothing, both signs of a double one at once. */
function skip(state: StateInline, mark: string, silent: boolean): boolean {
  if (!silent) state.pending += mark;
  state.pos += mark.length;
  return true;
}
