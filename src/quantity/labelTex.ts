import { escapeTex } from "./escapeTex.ts";
import { parseLabel } from "./parseLabel.ts";

/**
 * The markup of a chemical label as TeX for mathematics: `\text{CO}_{\text{2}}\text{Me}`.
 * Built from escaped text only. An index that follows another index, or nothing, is given an empty base,
 * since TeX refuses two indices of one kind on one base.
 */
export function labelTex(markup: string): string {
  const runs = parseLabel(markup);
  return runs
    .map(({ text, style }, position) => {
      const content = escapeTex(text);
      if (style === "plain") return `\\text{${content}}`;
      if (style === "italic") return `\\textit{${content}}`;
      const before = runs[position - 1]?.style;
      const base = before === "plain" || before === "italic" ? "" : "{}";
      return `${base}${style === "sub" ? "_" : "^"}{\\text{${content}}}`;
    })
    .join("");
}
