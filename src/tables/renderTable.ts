import { escapeHtml } from "../quantity/escapeHtml.ts";
import { labelHtml } from "../quantity/labelHtml.ts";
import { type CellLinks, cellHtml } from "./cellHtml.ts";
import type { Cell, Column, Row, TableModel } from "./TableModel.ts";

export interface TableOptions extends CellLinks {
  /** Begins every id, unique on the page, e.g. the dossier's slug; default none. */
  readonly idPrefix?: string;
  /** Set before the caption: `Table 2.` */
  readonly number?: string;
}

/**
 * A table model as HTML: captioned, with scoped headings, in a region that scrolls sideways by keyboard too.
 * Every text is escaped; markup comes from label markup only.
 */
export function renderTable(model: TableModel, options: TableOptions = {}): string {
  const prefix = options.idPrefix === undefined || options.idPrefix === "" ? "" : `${options.idPrefix}-`;
  const id = escapeHtml(`${prefix}table-${model.id}`);
  const number =
    options.number === undefined ? "" : `<span class="caption-number">${escapeHtml(options.number)}</span> `;
  const spoken = [options.number, model.caption].filter((part) => part !== undefined).join(" ");
  const body = model.rows.map((row) => renderRow(row, model.columns, id, options));
  return [
    `<div class="table-scroll" role="region" tabindex="0" aria-label="${escapeHtml(spoken)}">`,
    `<table class="table table-${escapeHtml(model.id)}" id="${id}">`,
    `<caption><span class="caption-text">${number}${escapeHtml(model.caption)}</span></caption>`,
    `<thead>\n<tr>${model.columns.map(heading).join("")}</tr>\n</thead>`,
    `<tbody>\n${body.join("\n")}\n</tbody>`,
    "</table>",
    "</div>",
    ...notes(model.notes),
  ].join("\n");
}

function heading(column: Column): string {
  const unit = column.unit === undefined ? "" : ` <span class="unit">${escapeHtml(column.unit)}</span>`;
  const description =
    column.description === undefined
      ? ""
      : ` <span class="column-description">${labelHtml(column.description)}</span>`;
  return `<th scope="col" class="align-${column.align}">${escapeHtml(column.title)}${unit}${description}</th>`;
}

function renderRow(row: Row, columns: readonly Column[], tableId: string, links: CellLinks): string {
  const id = row.id === undefined ? "" : ` id="${tableId}-${escapeHtml(row.id)}"`;
  const kind = row.kind === undefined ? "" : ` class="row-${row.kind}"`;
  const cells = columns.map((column, index) => renderCell(row.cells[index] ?? { text: "" }, column, links));
  return `<tr${id}${kind}>${cells.join("")}</tr>`;
}

function renderCell(cell: Cell, column: Column, links: CellLinks): string {
  const value = cell.sortValue === undefined ? "" : ` data-sort="${cell.sortValue}"`;
  const attributes = `class="align-${column.align}"${value}`;
  const content = cellHtml(cell, links);
  return column.rowHeader === true
    ? `<th scope="row" ${attributes}>${content}</th>`
    : `<td ${attributes}>${content}</td>`;
}

function notes(sentences: readonly string[]): readonly string[] {
  if (sentences.length === 0) return [];
  return [`<div class="table-notes">${sentences.map((note) => `<p>${escapeHtml(note)}</p>`).join("")}</div>`];
}
