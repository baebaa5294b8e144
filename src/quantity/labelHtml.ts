import { escapeHtml } from "./escapeHtml.ts";
import { parseLabel } from "./parseLabel.ts";

const ELEMENTS = { sub: "sub", super: "sup", italic: "i" } as const;

/** The markup of a chemical label as HTML: `CO<sub>2</sub>Me`, `<i>t</i>-Bu`; everything else escaped. */
export function labelHtml(markup: string): string {
  return parseLabel(markup)
    .map(({ text, style }) => {
      const content = escapeHtml(text);
      return style === "plain" ? content : `<${ELEMENTS[style]}>${content}</${ELEMENTS[style]}>`;
    })
    .join("");
}
