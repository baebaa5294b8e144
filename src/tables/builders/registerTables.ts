import { formatTemperature } from "../../quantity/formatTemperature.ts";
import { plainNumber } from "../../quantity/plainNumber.ts";
import { toDecimals } from "../../quantity/toDecimals.ts";
import { fromKilocalorie } from "../../quantity/units.ts";
import type { ReferenceRow, Register, RegisterRow, RowKind } from "../../register/Register.ts";
import { numberCell } from "../cells/numberCell.ts";
import { contributionStanding } from "../contributionStanding.ts";
import { registerAnchor } from "../registerAnchor.ts";
import type { Cell, Column, Row, TableModel } from "../TableModel.ts";

/** One table for each kind of row, in the order of the energy table, with its caption. */
const KINDS: readonly (readonly [RowKind, string, string])[] = [
  ["axial group", "axial-groups", "Axial minus equatorial free energies of single groups"],
  ["anomeric", "anomeric", "Axial minus equatorial free energies at anomeric positions"],
  ["nitrogen substituent", "nitrogen", "Axial minus equatorial free energies of groups on nitrogen"],
  ["geminal", "geminal", "Geminal pairs: first group axial minus second group axial"],
  ["vicinal gauche", "vicinal", "Vicinal gauche pairs"],
  ["syn-axial", "syn-axial", "Syn-axial pairs: total for one contact"],
];

/**
 * The register as tables, numbers and units as printed in their sources, grouped by kind:
 * energies, class stand-ins, inversion barriers, forms other than chairs. Empty kinds are left out.
 */
export function registerTables(register: Register): readonly TableModel[] {
  const energies = KINDS.map(
    ([kind, id, caption]): TableModel => ({
      id: `register-${id}`,
      caption,
      columns: ENERGY_COLUMNS,
      rows: register.rows.filter((row) => row.kind === kind).map(energyRow),
      notes: [
        "Values and standard uncertainties in kcal/mol as printed; kJ/mol by 1 kcal = 4.184 kJ exactly.",
      ],
    }),
  );
  return [
    ...energies,
    standIns(register),
    references("barriers", "Inversion barriers", register.barriers),
    references("non-chair", "Forms other than chairs", register.nonChair),
  ].filter(({ rows }) => rows.length > 0);
}

const TEXT = (key: string, title: string): Column => ({ key, title, align: "left" });
const NUMBER = (key: string, title: string, unit: string): Column => ({
  key,
  title,
  unit,
  align: "right",
  numbers: [`${title} / ${unit}`],
});

const ENERGY_COLUMNS: readonly Column[] = [
  { ...TEXT("id", "Row"), rowHeader: true },
  TEXT("groups", "Groups"),
  TEXT("ring", "Ring"),
  TEXT("locants", "Position"),
  NUMBER("value", "Value", "kcal/mol"),
  NUMBER("u", "u", "kcal/mol"),
  NUMBER("kilojoules", "Value", "kJ/mol"),
  TEXT("medium", "Medium"),
  NUMBER("temperature", "T", "K"),
  NUMBER("entropy", "\u0394S", "cal/(mol K)"),
  TEXT("standing", "Basis"),
  TEXT("sources", "Sources"),
  TEXT("note", "Note"),
];

function energyRow(row: RegisterRow): Row {
  const { standing, words } = contributionStanding({ basis: "published", standing: row.standing });
  return {
    id: registerAnchor(row.id),
    cells: [
      { text: row.id },
      { text: row.groups.join(" / ") },
      { text: row.ring },
      { text: row.locants.length === 0 ? "any" : row.locants.join(",") },
      numberCell(row.value),
      numberCell(row.u),
      numberCell(fromKilocalorie(row.value), plainNumber(toDecimals(fromKilocalorie(row.value), 2))),
      { text: row.solvent },
      temperatureCell(row.temperature_K),
      row.entropy === undefined ? { text: "" } : numberCell(row.entropy.value, entropyText(row.entropy)),
      { text: words, standing },
      { text: row.sources.join(", ") },
      { text: row.note ?? "" },
    ],
  };
}

function entropyText({ value, u }: { readonly value: number; readonly u: number }): string {
  return `${plainNumber(String(value))}\u00a0±\u00a0${u}`;
}

function temperatureCell(temperature: number | undefined): Cell {
  if (temperature === undefined) return { text: "" };
  return numberCell(temperature, formatTemperature(temperature).replace(/\u00a0K$/, ""));
}

function standIns(register: Register): TableModel {
  return {
    id: "register-stand-ins",
    caption: "Stand-ins for groups that no row covers",
    columns: [
      { ...TEXT("class", "Class of groups"), rowHeader: true },
      NUMBER("value", "Axial minus equatorial", "kcal/mol"),
      NUMBER("u", "u", "kcal/mol"),
      TEXT("groups", "Groups of the class"),
      TEXT("standing", "Basis"),
    ],
    rows: register.groupClasses.map(({ key, title, axial }) => ({
      id: registerAnchor(`class/${key}`),
      cells: [
        { text: title },
        numberCell(axial.value),
        numberCell(axial.u),
        {
          text: register.groups
            .filter((group) => group.groupClass === key)
            .map((group) => group.key)
            .join(", "),
        },
        { text: "not available, stand-in", standing: "estimated" },
      ],
    })),
    notes: ["A stand-in is wide on purpose: it keeps a missing value visible and never counts as zero."],
  };
}

function references(id: string, caption: string, rows: readonly ReferenceRow[]): TableModel {
  return {
    id: `register-${id}`,
    caption,
    columns: [
      { ...TEXT("id", "Row"), rowHeader: true },
      TEXT("system", "System"),
      TEXT("quantity", "Quantity"),
      { key: "value", title: "Value", align: "right", numbers: ["Value"] },
      { key: "u", title: "u", align: "right", numbers: ["u"] },
      TEXT("unit", "Unit"),
      TEXT("medium", "Medium"),
      NUMBER("temperature", "T", "K"),
      TEXT("standing", "Basis"),
      TEXT("sources", "Sources"),
      TEXT("note", "Note"),
    ],
    rows: rows.map((row) => {
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
          { text: row.sources.join(", ") },
          { text: row.note ?? "" },
        ],
      };
    }),
    notes: [],
  };
}
