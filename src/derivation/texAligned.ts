/** Lines, each with one `&`, set below each other at that mark. */
export function texAligned(lines: readonly string[]): string {
  return `\\begin{aligned}\n${lines.join(" \\\\\n")}\n\\end{aligned}`;
}
