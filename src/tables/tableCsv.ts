import { labelText } from "../quantity/labelText.ts";
import { NONE } from "./cells/NONE.ts";
import type { Cell, Column, TableModel } from "./TableModel.ts";

/** Significant digits of a plain number: enough to calculate on, without the dust of binary fractions. */
const DIGITS = 9;

/**
 * A table model as CSV after RFC 4180: CRLF, quotes doubled, one heading line with units.
 *
 * Number columns hold plain numbers, `-7.28` with an ASCII hyphen, unrounded. Text that a spreadsheet would run as
 * a formula (it begins with = + - @, a tab or a line break) is led in by an apostrophe.
 *
 * @returns text to be written as UTF-8.
 */
export function tableCsv(model: TableModel): string {
  const lines = [
    model.columns.flatMap((column) => column.numbers ?? [columnTitle(column)]).map(field),
    ...model.rows
      .filter((row) => row.printOnly !== true)
      .map((row) =>
        model.columns.flatMap((column, index) => fields(row.cells[index] ?? { text: "" }, column)),
      ),
  ];
  return lines.map((line) => `${line.join(",")}\r\n`).join("");
}

function columnTitle(column: Column): string {
  return column.unit === undefined ? column.title : `${column.title} / ${column.unit}`;
}

function fields(cell: Cell, column: Column): readonly string[] {
  if (column.numbers === undefined) {
    if (cell.text === NONE.text) return [""];
    return [field(guarded(cell.markup === true ? labelText(cell.text) : cell.text))];
  }
  return column.numbers.map((_, index) => plain(cell.numbers?.[index] ?? null));
}

function plain(value: number | null): string {
  if (value === null || !Number.isFinite(value)) return "";
  return String(Number(value.toPrecision(DIGITS)));
}

function guarded(text: string): string {
  // A text that begins with an apostrophe before such a sign gets one more, so that taking one away gives it back.
  return /^'*[=+\-@\t\r\n]/.test(text) ? `'${text}` : text;
}

function field(text: string): string {
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
