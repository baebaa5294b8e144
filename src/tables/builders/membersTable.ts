import type { Dossier } from "../../dossier/Dossier.ts";
import { populationCell } from "../cells/populationCell.ts";
import { populationColumn } from "../cells/populationColumn.ts";
import type { Row, TableModel } from "../TableModel.ts";

/** What each stereoisomer would give where the author left stereochemistry open. */
export function membersTable(dossier: Dossier): TableModel {
  return {
    id: "members",
    caption: `Stereoisomers that ${dossier.code} may stand for`,
    columns: [
      { key: "description", title: "Stereoisomer", align: "left", rowHeader: true },
      { key: "major", title: "Major conformer", align: "left" },
      populationColumn("population", "Population", "with 95\u00a0% interval"),
      { key: "smiles", title: "Canonical SMILES", align: "left" },
    ],
    rows: dossier.members.map(
      (member): Row => ({
        cells: [
          { text: member.description },
          { text: member.majorLabel, markup: true },
          populationCell(member.population, member.population95),
          { text: member.canonicalSmiles },
        ],
      }),
    ),
    notes: dossier.members.length > 0 ? [] : ["No stereochemistry is left open, so no members are listed."],
  };
}
