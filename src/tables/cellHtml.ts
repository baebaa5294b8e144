import { escapeHtml } from "../quantity/escapeHtml.ts";
import { labelHtml } from "../quantity/labelHtml.ts";
import { STANDINGS, standingMark } from "./standingMark.ts";
import type { Cell } from "./TableModel.ts";

/** Where a page finds what cells refer to, as addresses relative to the page; undefined prints no link. */
export interface CellLinks {
  readonly rowHref?: (registerRow: string) => string | undefined;
  readonly sourceHref?: (sourceKey: string) => string | undefined;
}

/** The content of a cell: its mark, its text with label markup set, its links. */
export function cellHtml(cell: Cell, links: CellLinks = {}): string {
  const set = cell.markup === true ? labelHtml : escapeHtml;
  const href = cell.href ?? (cell.registerRow === undefined ? undefined : links.rowHref?.(cell.registerRow));
  const text = href === undefined ? withSources(cell, links, set) : anchor(href, set(cell.text));
  return `${mark(cell)}${text}`;
}

/** The word of the mark is left to the text where the text says it. */
function mark({ standing, text }: Cell): string {
  if (standing === undefined) return "";
  const said = text.includes(STANDINGS[standing].word);
  return `${standingMark(standing, said ? "none" : "spoken")}\u00a0`;
}

/** Links each citation key where it stands as a word of its own. */
function withSources(cell: Cell, links: CellLinks, set: (text: string) => string): string {
  const keys = new Map<string, string>();
  for (const key of cell.sourceKeys ?? []) {
    const href = links.sourceHref?.(key);
    if (href !== undefined) keys.set(key, href);
  }
  if (keys.size === 0) return set(cell.text);
  // Split at the keys only, so that label markup between them stays whole.
  const names = [...keys.keys()].map((key) => key.replace(/[^A-Za-z0-9]/g, "\\$&"));
  return cell.text
    .split(new RegExp(`(?<![A-Za-z0-9-])(${names.join("|")})(?![A-Za-z0-9-])`))
    .map((part) => {
      const href = keys.get(part);
      return href === undefined ? set(part) : anchor(href, set(part));
    })
    .join("");
}

function anchor(href: string, html: string): string {
  return `<a href="${escapeHtml(href)}">${html}</a>`;
}
