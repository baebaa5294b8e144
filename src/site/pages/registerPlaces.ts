import type { Register } from "../../register/Register.ts";
import { registerTables } from "../../tables/builders/registerTables.ts";
import { registerAnchor } from "../../tables/registerAnchor.ts";

/** Where register rows stand, seen from one page. */
export interface RegisterPlaces {
  /** Path from the page to the site's top. */
  readonly root: string;
  /** Id on the register page, by register row. */
  readonly anchors: ReadonlyMap<string, string>;
}

/** The id of every register row on the register page. */
export function registerAnchors(register: Register): ReadonlyMap<string, string> {
  const anchors = new Map<string, string>();
  const byAnchor = new Map<string, string>();
  for (const model of registerTables(register)) {
    for (const row of model.rows)
      if (row.id !== undefined) byAnchor.set(row.id, `table-${model.id}-${row.id}`);
  }
  for (const row of register.rows) {
    const id = byAnchor.get(registerAnchor(row.id));
    if (id !== undefined) anchors.set(row.id, id);
  }
  return anchors;
}
