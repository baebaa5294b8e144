import { STANDINGS, standingMark } from "./standingMark.ts";
import type { CellStanding } from "./TableModel.ts";

/** The key of the marks, for once a page: every mark with its word. */
export function standingKey(): string {
  const items = (Object.keys(STANDINGS) as CellStanding[]).map(
    (standing) => `<li>${standingMark(standing, "visible")}</li>`,
  );
  return `<div role="group" aria-label="Marks of standing"><ul class="standing-key">${items.join("")}</ul></div>`;
}
