import { shownConformers } from "../../derivation/shownConformers.ts";
import { shownNotice } from "../../derivation/shownNotice.ts";
import type { Dossier } from "../../dossier/Dossier.ts";
import { plainNumber } from "../../quantity/plainNumber.ts";
import { toDecimals } from "../../quantity/toDecimals.ts";
import { ZERO_CELSIUS } from "../../quantity/units.ts";
import { NONE } from "../cells/NONE.ts";
import { numberCell } from "../cells/numberCell.ts";
import { populationCell } from "../cells/populationCell.ts";
import { populationColumn } from "../cells/populationColumn.ts";
import type { Cell, TableModel } from "../TableModel.ts";

/** Populations against temperature, the dossier's own temperature among them. */
export function temperatureTable(dossier: Dossier): TableModel {
  const shown = shownConformers(dossier);
  const notice = shownNotice(dossier);
  return {
    id: "temperature",
    caption: `Calculated populations of ${dossier.code} against temperature, with 95\u00a0% intervals`,
    columns: [
      { key: "temperature", title: "T", unit: "K", align: "right", rowHeader: true, numbers: ["T / K"] },
      { key: "celsius", title: "t", unit: "\u00b0C", align: "right", numbers: ["t / \u00b0C"] },
      ...shown.map(({ id, label }) => populationColumn(`conformer-${id}`, id, label)),
    ],
    rows: dossier.temperatures.map(({ temperature_K: kelvins, populations }) => ({
      cells: [
        numberCell(kelvins, toDecimals(kelvins, 2)),
        numberCell(
          Number(toDecimals(kelvins - ZERO_CELSIUS, 2)),
          plainNumber(toDecimals(kelvins - ZERO_CELSIUS, 0)),
        ),
        ...shown.map(({ id }): Cell => {
          const own = populations.find(({ conformer }) => conformer === id);
          return own === undefined ? NONE : populationCell(own.population, own.population95);
        }),
      ],
    })),
    notes: [
      "Away from the temperature of a source the published entropy carries its value; where none is published it is taken as zero with an uncertainty, so the intervals widen.",
      ...(notice === "" ? [] : [notice]),
    ],
  };
}
