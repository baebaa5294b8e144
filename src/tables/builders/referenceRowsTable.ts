import type { ReferenceRow } from "../../register/Register.ts";
import { numberCell } from "../cells/numberCell.ts";
import { numberColumn } from "../cells/numberColumn.ts";
import { temperatureCell } from "../cells/temperatureCell.ts";
import { textColumn } from "../cells/textColumn.ts";
import { contributionStanding } from "../contributionStanding.ts";
import { registerAnchor } from "../registerAnchor.ts";
import type { Row, TableModel } from "../TableModel.ts";

/** Barriers and energies of forms other than chairs, each row in the unit it was printed in. */
export function referenceRowsTable(id: string, caption: string, rows: readonly ReferenceRow[]): TableModel {
  return {
    id: `register-${id}`,
    caption,
    columns: [
      { ...textColumn("id", "Row"), rowHeader: true },
      textColumn("system", "System"),
      textColumn("quantity", "Quantity"),
      numberColumn("value", "Value"),
      numberColumn("u", "u"),
      textColumn("unit", "Unit"),
      textColumn("medium", "Medium"),
      numberColumn("temperature", "T", "K"),
      textColumn("standing", "Basis"),
      textColumn("sources", "Sources"),
      textColumn("note", "Note"),
    ],
    rows: rows.map(referenceRow),
    notes: [],
  };
}

function referenceRow(row: ReferenceRow): Row {
  const { standing, words } = contributionStanding({ basis: "published", standing: row.standing });
  return {
    id: registerAnchor(row.id),
    cells: [
      { text: row.id },
      { text: row.system },
      { text: row.quantity },
      numberCell(row.value),
      numberCell(row.u),
      { text: row.unit },
      { text: row.solvent },
      temperatureCell(row.temperature_K),
      { text: words, standing },
      { text: row.sources.join(", "), sourceKeys: row.sources },
      { text: row.note ?? "" },
    ],
  };
}
