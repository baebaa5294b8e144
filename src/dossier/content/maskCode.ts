/**
 * The Markdown with code (fenced, indented and inline) blanked out, every other character in its place,
 * so that what stands in code is neither a directive nor raw HTML.
 */
export function maskCode(markdown: string): string {
  const lines = markdown.split("\n");
  let fence: { mark: string; length: number } | null = null;
  let inList = false;
  let inIndentedCode = false;
  let afterBlank = true;
  const masked = lines.map((line) => {
    const blanked = " ".repeat(line.length);
    const run = /^ {0,3}(?:(?:[-*+]|\d{1,9}[.)])\s+|>\s?)*\s*(`{3,}|~{3,})(.*)$/.exec(line);
    if (fence !== null) {
      const closing = /^\s*(?:>\s?)*\s*(`{3,}|~{3,})\s*$/.exec(line);
      if (closing !== null && closing[1]![0] === fence.mark && closing[1]!.length >= fence.length)
        fence = null;
      return blanked;
    }
    if (run !== null && !(run[1]!.startsWith("`") && run[2]!.includes("`"))) {
      fence = { mark: run[1]![0]!, length: run[1]!.length };
      return blanked;
    }
    if (line.trim() === "") {
      afterBlank = true;
      return line;
    }
    const indented = /^(?: {4}|\t| {1,3}\t)/.test(line);
    if (!indented) inList = /^ {0,3}(?:[-*+]|\d{1,9}[.)])\s/.test(line) || (inList && /^ {2}/.test(line));
    inIndentedCode = indented && !inList && (afterBlank || inIndentedCode);
    afterBlank = false;
    return inIndentedCode ? blanked : line;
  });
  return maskSpans(masked.join("\n"));
}

/** Blanks code spans: a run of backticks up to the next run of the same length within the paragraph. */
function maskSpans(text: string): string {
  const runs = [...text.matchAll(/`+/g)];
  let result = "";
  let done = 0;
  let paragraphEnd = -1;
  for (let index = 0; index < runs.length; index += 1) {
    const opening = runs[index]!;
    if (opening.index < done || text[opening.index - 1] === "\\") continue;
    if (paragraphEnd < opening.index) {
      const blank = text.indexOf("\n\n", opening.index);
      paragraphEnd = blank === -1 ? text.length : blank;
    }
    const closing = runs
      .slice(index + 1, index + 200)
      .find((run) => run[0].length === opening[0].length && run.index < paragraphEnd);
    if (closing === undefined) continue;
    const end = closing.index + closing[0].length;
    result += text.slice(done, opening.index) + text.slice(opening.index, end).replace(/[^\n]/g, " ");
    done = end;
  }
  return result + text.slice(done);
}
