/** Markup that is finished: it is placed as it is. Everything else is escaped. */
export interface Markup {
  readonly markup: string;
}

export type Piece = string | number | Markup | null | undefined | false | readonly Piece[];

const ESCAPES: Readonly<Record<string, string>> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "'": "&#39;",
};

/** Marks a string as finished markup. Only for strings made by the program's own renderers. */
export const trusted = (markup: string): Markup => ({ markup });

/** A template literal of HTML: strings and numbers put into it are escaped, markup and lists are placed. */
export function html(parts: TemplateStringsArray, ...pieces: readonly Piece[]): Markup {
  return { markup: parts.reduce((text, part, i) => text + place(pieces[i - 1]) + part) };
}

function place(piece: Piece): string {
  if (piece === null || piece === undefined || piece === false) return "";
  if (typeof piece === "string" || typeof piece === "number")
    return String(piece).replace(/[&<>"']/g, (c) => ESCAPES[c]!);
  if ("markup" in piece) return piece.markup;
  return piece.map(place).join("");
}
