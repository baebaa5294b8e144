import { articleBody } from "../../../templates/article.ts";
import type { Collection } from "../../dossier/Collection.ts";
import { registerTables } from "../../tables/builders/registerTables.ts";
import { registerAnchor } from "../../tables/registerAnchor.ts";
import { renderTable } from "../../tables/renderTable.ts";
import { standingKey } from "../../tables/standingKey.ts";
import type { Cell, TableModel } from "../../tables/TableModel.ts";

/** The body of the register page: every parameter, its source and standing, and the dossiers that rest on it. */
export function registerPage(collection: Collection): string {
  const uses = usesByAnchor(collection);
  const dossiers = new Map(
    collection.series.flatMap((series) =>
      series.dossiers.map(
        (dossier) => [dossier.code, `../series/${series.slug}/${dossier.slug}/index.html`] as const,
      ),
    ),
  );
  const sections = registerTables(collection.register).map((model) => ({
    id: `kind-${model.id}`,
    title: model.caption,
    content: `<div class="wide">${renderTable(withUses(sourceFirst(model), uses), {
      // Cells that list dossiers are linked by the same means as those that list sources.
      sourceHref: (key) => dossiers.get(key) ?? `../references/index.html#${registerAnchor(key)}`,
    })}</div>`,
  }));
  return articleBody({
    title: "Parameter register",
    intro:
      `<p>Version ${collection.register.version}. Numbers and units stand as printed in their sources; each row keeps its uncertainty, medium, temperature, source and standing. Estimates and values from memory await confirmation.</p>` +
      `<p class="digests">SHA-256 ${collection.register.sha256}</p>${standingKey()}`,
    sections,
  }).markup;
}

/** Codes of the dossiers that use a row, by the row's anchor. */
function usesByAnchor(collection: Collection): ReadonlyMap<string, readonly string[]> {
  const uses = new Map<string, string[]>();
  for (const series of collection.series) {
    for (const dossier of series.dossiers) {
      const rows = new Set(
        dossier.conformers.flatMap(({ contributions }) =>
          contributions.flatMap(({ terms }) => terms.map(({ row }) => row)),
        ),
      );
      for (const row of rows) {
        const anchor = registerAnchor(row);
        uses.set(anchor, [...(uses.get(anchor) ?? []), dossier.code]);
      }
    }
  }
  return uses;
}

/** Standing and sources directly behind the value, so that a narrow screen never shows a number without them. */
function sourceFirst(model: TableModel): TableModel {
  const moved = ["standing", "sources"];
  const medium = model.columns.findIndex(({ key }) => key === "medium");
  if (medium === -1) return model;
  const rank = (index: number) => (moved.includes(model.columns[index]!.key) ? medium - 0.5 : index);
  const order = model.columns.map((_, index) => index).sort((a, b) => rank(a) - rank(b) || a - b);
  return {
    ...model,
    columns: order.map((index) => model.columns[index]!),
    rows: model.rows.map((row) => ({
      ...row,
      cells: order.map((index) => row.cells[index] ?? { text: "" }),
    })),
  };
}

function withUses(model: TableModel, uses: ReadonlyMap<string, readonly string[]>): TableModel {
  const used = model.rows.some((row) => row.id !== undefined && uses.has(row.id));
  if (!used) return model;
  return {
    ...model,
    columns: [...model.columns, { key: "used-by", title: "Used by", align: "left" }],
    rows: model.rows.map((row) => ({
      ...row,
      cells: [...row.cells, usedBy(row.id === undefined ? [] : (uses.get(row.id) ?? []))],
    })),
  };
}

function usedBy(codes: readonly string[]): Cell {
  return codes.length === 0 ? { text: "" } : { text: codes.join(", "), sourceKeys: codes };
}
