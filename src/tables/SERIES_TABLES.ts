import type { Series } from "../dossier/Collection.ts";
import type { Dossier } from "../dossier/Dossier.ts";
import { comparisonTable } from "./builders/comparisonTable.ts";
import type { TableModel } from "./TableModel.ts";

/** Tables of a series by the name an author writes in `::table[name]` in the series' own file. */
export const SERIES_TABLES: Readonly<
  Record<string, (series: Series, href?: (dossier: Dossier) => string) => TableModel>
> = {
  comparison: comparisonTable,
};
