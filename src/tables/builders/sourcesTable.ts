import type { Dossier } from "../../dossier/Dossier.ts";
import { citationStanding } from "../citationStanding.ts";
import type { TableModel } from "../TableModel.ts";

/** Every source the dossier's numbers rest on. */
export function sourcesTable(dossier: Dossier): TableModel {
  return {
    id: "sources",
    caption: `Sources used for ${dossier.code}`,
    columns: [
      { key: "key", title: "Key", align: "left", rowHeader: true },
      { key: "text", title: "Source", align: "left" },
      { key: "standing", title: "Citation", align: "left" },
    ],
    rows: dossier.sources.map(({ key, text, standing }) => ({
      id: `source-${key}`,
      cells: [{ text: key }, { text }, { text: citationStanding(standing) }],
    })),
    notes: [
      "\u201cFrom memory\u201d citations must be checked against the publication before they are quoted.",
    ],
  };
}
