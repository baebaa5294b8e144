import type { Register, RowKind } from "../../register/Register.ts";
import type { TableModel } from "../TableModel.ts";
import { energyRowsTable } from "./energyRowsTable.ts";
import { referenceRowsTable } from "./referenceRowsTable.ts";
import { standInsTable } from "./standInsTable.ts";

/** One table for each kind of row, in the order of the energy table: kind, id, caption. */
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
 * energies, class stand-ins, inversion barriers, forms other than chairs. Empty tables are left out.
 */
export function registerTables(register: Register): readonly TableModel[] {
  const energies = KINDS.map(([kind, id, caption]) =>
    energyRowsTable(
      id,
      caption,
      register.rows.filter((row) => row.kind === kind),
    ),
  );
  return [
    ...energies,
    standInsTable(register),
    referenceRowsTable("barriers", "Inversion barriers", register.barriers),
    referenceRowsTable("non-chair", "Forms other than chairs", register.nonChair),
  ].filter(({ rows }) => rows.length > 0);
}
