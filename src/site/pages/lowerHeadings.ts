import type { MarkdownIt } from "markdown-it";

/** markdown-it plugin: a page has one title, so prose that begins with first-level headings moves one level down. */
export function lowerHeadings(md: MarkdownIt): void {
  md.core.ruler.push("lower_headings", (state) => {
    const headings = state.tokens.filter(({ type }) => type === "heading_open" || type === "heading_close");
    if (!headings.some(({ tag }) => tag === "h1")) return;
    for (const token of headings) token.tag = `h${Math.min(6, Number(token.tag[1]) + 1)}`;
  });
}
