import type { Dossier } from "../../dossier/Dossier.ts";
import { formatTemperature } from "../../quantity/formatTemperature.ts";
import { energyCell } from "../cells/energyCell.ts";
import { energyColumn } from "../cells/energyColumn.ts";
import { populationCell } from "../cells/populationCell.ts";
import { populationColumn } from "../cells/populationColumn.ts";
import { uncertaintyCell } from "../cells/uncertaintyCell.ts";
import type { TableModel } from "../TableModel.ts";

/** Every conformer with its free energy and population. */
export function conformersTable(dossier: Dossier): TableModel {
  const first = dossier.conformers[0]?.id ?? "A";
  return {
    id: "conformers",
    caption: `Calculated conformers of ${dossier.code} at ${formatTemperature(dossier.conditions.temperature_K)}`,
    columns: [
      { key: "conformer", title: "Conformer", align: "left", rowHeader: true },
      { key: "label", title: "Positions", align: "left" },
      energyColumn("deltaG", `\u0394G\u00b0 relative to ${first}`),
      energyColumn("u", "u(\u0394G\u00b0)"),
      populationColumn("population", "Population", "with 95\u00a0% interval"),
    ],
    rows: dossier.conformers.map((conformer) => ({
      id: `conformer-${conformer.id}`,
      cells: [
        { text: conformer.id },
        { text: conformer.label, markup: true },
        energyCell(conformer.deltaG_kJ_mol, conformer.u_kJ_mol),
        uncertaintyCell(conformer.u_kJ_mol),
        populationCell(conformer.population, conformer.population95),
      ],
    })),
    notes: ["Calculated by additive free-energy contributions, not measured."],
  };
}
