import type { Dossier } from "../../dossier/Dossier.ts";
import { NONE } from "../cells/NONE.ts";
import { numberCell } from "../cells/numberCell.ts";
import type { Row, TableModel } from "../TableModel.ts";

/** First characters of a digest that are printed; the whole stands in the record. */
const DIGEST_SHOWN = 12;

/** What was observed, under which conditions, and where it is written down. A missing entry is said, not left out. */
export function evidenceTable(dossier: Dossier): TableModel {
  const rows = dossier.evidence.map(
    (item, index): Row => ({
      id: `evidence-${index + 1}`,
      cells: [
        numberCell(index + 1),
        { text: item.kind },
        { text: item.summary, standing: "measured" },
        { text: item.conditions ?? "not stated" },
        { text: item.source ?? "not stated" },
        item.file === null
          ? NONE
          : { text: `${item.file.path} (SHA-256 ${item.file.sha256.slice(0, DIGEST_SHOWN)}\u2026)` },
      ],
    }),
  );
  return {
    id: "evidence",
    caption: `Evidence given for ${dossier.code}`,
    columns: [
      { key: "number", title: "No.", align: "right", numbers: ["No."] },
      { key: "kind", title: "Kind", align: "left" },
      { key: "summary", title: "Observation", align: "left", rowHeader: true },
      { key: "conditions", title: "Conditions", align: "left" },
      { key: "source", title: "Source", align: "left" },
      { key: "file", title: "File", align: "left" },
    ],
    rows:
      rows.length > 0
        ? rows
        : [{ cells: [NONE, NONE, { text: "No measured evidence is given." }, NONE, NONE, NONE] }],
    notes:
      rows.length > 0
        ? ["Observations as stated by the author; they are not yet compared with the calculation."]
        : [],
  };
}
