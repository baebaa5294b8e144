import { plainNumber } from "../../quantity/plainNumber.ts";
import { toDecimals } from "../../quantity/toDecimals.ts";
import { fromKilocalorie } from "../../quantity/units.ts";
import type { RegisterRow } from "../../register/Register.ts";
import { numberCell } from "../cells/numberCell.ts";
import { numberColumn } from "../cells/numberColumn.ts";
import { temperatureCell } from "../cells/temperatureCell.ts";
import { textColumn } from "../cells/textColumn.ts";
import { contributionStanding } from "../contributionStanding.ts";
import { registerAnchor } from "../registerAnchor.ts";
import type { Row, TableModel } from "../TableModel.ts";

/** Register rows of one kind, values as printed with their conversion beside them. */
export function energyRowsTable(id: string, caption: string, rows: readonly RegisterRow[]): TableModel {
  return {
    id: `register-${id}`,
    caption,
    columns: [
      { ...textColumn("id", "Row"), rowHeader: true },
      textColumn("groups", "Groups"),
      textColumn("ring", "Ring"),
      textColumn("locants", "Position"),
      numberColumn("value", "Value", "kcal/mol"),
      numberColumn("u", "u", "kcal/mol"),
      numberColumn("kilojoules", "Value", "kJ/mol"),
      textColumn("medium", "Medium"),
      numberColumn("temperature", "T", "K"),
      numberColumn("entropy", "\u0394S", "cal/(mol K)"),
      textColumn("standing", "Basis"),
      textColumn("sources", "Sources"),
      textColumn("note", "Note"),
    ],
    rows: rows.map(energyRow),
    notes: [
      "Values with standard uncertainties u in kcal/mol as printed, converted with 1 kcal = 4.184 kJ exactly.",
    ],
  };
}

function energyRow(row: RegisterRow): Row {
  const { standing, words } = contributionStanding({ basis: "published", standing: row.standing });
  const kilojoules = fromKilocalorie(row.value);
  return {
    id: registerAnchor(row.id),
    cells: [
      { text: row.id },
      { text: row.groups.join(" / ") },
      { text: row.ring },
      { text: row.locants.length === 0 ? "any" : row.locants.join(",") },
      numberCell(row.value),
      numberCell(row.u),
      numberCell(kilojoules, plainNumber(toDecimals(kilojoules, 2))),
      { text: row.solvent },
      temperatureCell(row.temperature_K),
      row.entropy === undefined ? { text: "" } : numberCell(row.entropy.value, entropyText(row.entropy)),
      { text: words, standing },
      { text: row.sources.join(", "), sourceKeys: row.sources },
      { text: row.note ?? "" },
    ],
  };
}

function entropyText({ value, u }: { readonly value: number; readonly u: number }): string {
  return `${plainNumber(String(value))}\u00a0±\u00a0${u}`;
}
