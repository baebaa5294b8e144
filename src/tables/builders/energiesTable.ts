import { type NumberedContribution, numberContributions } from "../../derivation/numberContributions.ts";
import { shownConformers } from "../../derivation/shownConformers.ts";
import { shownNotice } from "../../derivation/shownNotice.ts";
import type { Conformer, Contribution, Dossier } from "../../dossier/Dossier.ts";
import { formatTemperature } from "../../quantity/formatTemperature.ts";
import { energyCell } from "../cells/energyCell.ts";
import { energyColumn } from "../cells/energyColumn.ts";
import { NONE } from "../cells/NONE.ts";
import { numberCell } from "../cells/numberCell.ts";
import { populationCell } from "../cells/populationCell.ts";
import { sumCell } from "../cells/sumCell.ts";
import { uncertaintyCell } from "../cells/uncertaintyCell.ts";
import { contributionStanding } from "../contributionStanding.ts";
import type { Cell, Column, Row, TableModel } from "../TableModel.ts";

/** Every contribution with its worth in each conformer, what it rests on, and the sums they lead to. */
export function energiesTable(dossier: Dossier): TableModel {
  const shown = shownConformers(dossier);
  const ids = new Set(shown.map(({ id }) => id));
  const rows = numberContributions(dossier).filter((row) => row.conformers.some((id) => ids.has(id)));
  const notice = shownNotice(dossier);
  return {
    id: "energies",
    caption: `Contributions to the free energy of each conformer of ${dossier.code}`,
    columns: columns(shown),
    rows: [...rows.map((row) => contributionRow(row, shown)), ...results(dossier, shown)],
    notes: [
      "Values are axial minus equatorial or excess energies as their labels say, with standard uncertainties u (coverage factor 1). Rounded for print; sums are taken from unrounded values.",
      "A register value that stands in both conformers moves them together, so the uncertainty of the difference is not the sum of the column.",
      ...(notice === "" ? [] : [notice]),
    ],
  };
}

function columns(shown: readonly Conformer[]): readonly Column[] {
  return [
    { key: "number", title: "No.", align: "right", numbers: ["No."] },
    { key: "contribution", title: "Contribution", align: "left", rowHeader: true },
    ...shown.map(({ id, label }) => energyColumn(`conformer-${id}`, id, label)),
    energyColumn("u", "u"),
    { key: "basis", title: "Basis", align: "left" },
    { key: "source", title: "Source", align: "left" },
    { key: "medium", title: "Medium, temperature", align: "left" },
    { key: "note", title: "Note", align: "left" },
  ];
}

function contributionRow(row: NumberedContribution, shown: readonly Conformer[]): Row {
  const { contribution, number } = row;
  const { standing, words } = contributionStanding(contribution);
  const { temperature_K: temperature, medium } = contribution;
  const value = energyCell(contribution.value_kJ_mol, contribution.u_kJ_mol);
  return {
    id: `row-${number}`,
    cells: [
      numberCell(number),
      { text: contribution.label, markup: true },
      ...shown.map(({ id }) => (row.conformers.includes(id) ? value : NONE)),
      uncertaintyCell(contribution.u_kJ_mol),
      { text: words, standing, ...registerRow(contribution) },
      { text: contribution.source, sourceKeys: contribution.sourceKeys, markup: true },
      { text: temperature === null ? medium : `${medium}, ${formatTemperature(temperature)}` },
      { text: noteText(contribution), markup: true },
    ],
  };
}

const EMPTY: Cell = { text: "" };
/** Columns u, basis, source, medium and note say nothing about a result. */
const REST: readonly Cell[] = [EMPTY, EMPTY, EMPTY, EMPTY, EMPTY];

/** What the source column has not said already: of a stand-in it tells the whole story. */
function noteText({ note, source }: Contribution): string {
  return (note ?? "").replace(source, "").trim();
}

/** The row that a published value was read from; stand-ins have no row to show. */
function registerRow({ basis, terms }: Contribution): Pick<Cell, "registerRow"> {
  const [term] = terms;
  return basis === "published" && term !== undefined ? { registerRow: term.row } : {};
}

function results(dossier: Dossier, shown: readonly Conformer[]): readonly Row[] {
  const [first] = shown;
  if (first === undefined) return [];
  const equilibrium = (id: string) => dossier.equilibria.find(({ to }) => to === id);
  const row = (title: string, cells: readonly Cell[]): Row => ({
    kind: "result",
    cells: [EMPTY, { text: title }, ...cells, ...REST],
  });
  const others = (reference: Cell, cell: (conformer: Conformer) => Cell) =>
    shown.map((conformer) => (conformer === first ? reference : cell(conformer)));
  return [
    row(
      "Sum",
      shown.map(({ sum_kJ_mol }) => sumCell(sum_kJ_mol)),
    ),
    row(
      `\u0394G\u00b0 relative to ${first.id}`,
      others({ text: "reference" }, (conformer) =>
        difference(conformer, equilibrium(conformer.id)?.bySymmetry === true),
      ),
    ),
    row(
      "u(\u0394G\u00b0)",
      others(NONE, ({ u_kJ_mol }) => uncertaintyCell(u_kJ_mol)),
    ),
    {
      ...row(
        "Population",
        shown.map(({ population, population95 }) => populationCell(population, population95)),
      ),
      printOnly: true,
    },
  ];
}

function difference(conformer: Conformer, bySymmetry: boolean): Cell {
  const cell = energyCell(conformer.deltaG_kJ_mol, conformer.u_kJ_mol);
  return bySymmetry ? { ...cell, standing: "symmetry" } : { ...cell, standing: "computed" };
}
