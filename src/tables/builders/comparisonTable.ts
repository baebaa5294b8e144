import type { Series } from "../../dossier/Collection.ts";
import type { Dossier } from "../../dossier/Dossier.ts";
import { energyCell } from "../cells/energyCell.ts";
import { energyColumn } from "../cells/energyColumn.ts";
import { NONE } from "../cells/NONE.ts";
import { numberCell } from "../cells/numberCell.ts";
import { populationCell } from "../cells/populationCell.ts";
import { populationColumn } from "../cells/populationColumn.ts";
import { uncertaintyCell } from "../cells/uncertaintyCell.ts";
import { configurationText } from "../configurationText.ts";
import type { Cell, Row, TableModel } from "../TableModel.ts";

/**
 * The members of a series side by side, one line each, every column orderable.
 *
 * @param href - address of a dossier relative to the page that shows the table; none prints codes without links.
 */
export function comparisonTable(series: Series, href?: (dossier: Dossier) => string): TableModel {
  return {
    id: "comparison",
    caption: `Members of the series ${series.title}`,
    columns: [
      { key: "code", title: "Code", align: "left", rowHeader: true },
      { key: "name", title: "Name", align: "left" },
      { key: "configuration", title: "Configuration", align: "left" },
      { key: "major", title: "Major conformer", align: "left" },
      populationColumn("population", "Its population", "with 95\u00a0% interval"),
      energyColumn("deltaG", "\u0394G\u00b0", "next conformer minus major"),
      energyColumn("u", "u(\u0394G\u00b0)"),
      { key: "evidence", title: "Evidence", align: "right", numbers: ["Evidence items"] },
      { key: "checks", title: "Open checks", align: "right", numbers: ["Open checks"] },
    ],
    rows: series.dossiers.map((dossier) => memberRow(dossier, href)),
    notes: ["Populations and energies are calculated at the conditions of each dossier, not measured."],
  };
}

function memberRow(dossier: Dossier, href: ((dossier: Dossier) => string) | undefined): Row {
  const checks = dossier.alerts.filter(({ severity }) => severity !== "note").length;
  const code: Cell =
    href === undefined ? { text: dossier.code } : { text: dossier.code, href: href(dossier) };
  return {
    id: dossier.slug,
    cells: [
      code,
      { text: dossier.name },
      { text: configurationText(dossier) },
      ...equilibriumCells(dossier),
      numberCell(dossier.evidence.length),
      numberCell(checks),
    ],
  };
}

/** Major conformer, its population, ΔG° and its uncertainty. */
function equilibriumCells(dossier: Dossier): readonly Cell[] {
  const [major] = dossier.conformers;
  if (major === undefined) return [{ text: "not analysed" }, NONE, NONE, NONE];
  const next = dossier.equilibria[0];
  const remark =
    next?.unresolved === true ? " (unresolved)" : next?.bySymmetry === true ? " (equal by symmetry)" : "";
  return [
    { text: `${major.label}${remark}`, markup: true },
    populationCell(major.population, major.population95),
    next === undefined ? NONE : energyCell(next.deltaG_kJ_mol, next.u_kJ_mol),
    next === undefined ? NONE : uncertaintyCell(next.u_kJ_mol),
  ];
}
