/** Deeper than any sensible front matter; the deepest key of the content schema stands at level six. */
const DEEPEST = 60;

/**
 * Where YAML text may nest more than `DEEPEST` levels, as an offset into it, or null.
 *
 * The YAML parser recurses. Running it into the end of the stack is no harmless exception: a regular expression
 * compiled just there ends the whole process. So depth is bounded before the parser sees the text, by three counts
 * that never fall short of the true depth: open brackets, indentation, and list or key marks in a row.
 */
export function findDeepNesting(yaml: string): number | null {
  let depth = 0;
  for (let i = 0; i < yaml.length; i++) {
    const character = yaml[i];
    if (character === "[" || character === "{") depth += 1;
    else if (character === "]" || character === "}") depth = Math.max(0, depth - 1);
    if (depth > DEEPEST) return i;
  }
  const marks = new RegExp(`^[ \\t]{${2 * DEEPEST},}\\S|(?:[-?:][ \\t]+){${DEEPEST},}`, "m");
  const found = marks.exec(yaml);
  return found === null ? null : found.index;
}
