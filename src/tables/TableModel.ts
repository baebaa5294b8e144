/** A table as data; one renderer each makes HTML and CSV of it. */
export interface TableModel {
  /** Kebab-case word, the name an author writes in `::table[name]`. */
  readonly id: string;
  /** Without number, without final stop. */
  readonly caption: string;
  readonly columns: readonly Column[];
  readonly rows: readonly Row[];
  /** Whole sentences below the table. */
  readonly notes: readonly string[];
}

export interface Column {
  readonly key: string;
  readonly title: string;
  /** Printed after the title, never in the cells of a number column. */
  readonly unit?: string;
  readonly align: "left" | "right" | "centre";
  /** A second, smaller line of the heading; label markup allowed. */
  readonly description?: string;
  /** The cells of this column name their rows. */
  readonly rowHeader?: boolean;
  /**
   * Headings of the plain-number columns that stand for this one in CSV, units included: `ΔG / kJ/mol`.
   * Without it the column is text and its cells are guarded.
   */
  readonly numbers?: readonly string[];
}

export interface Row {
  readonly cells: readonly Cell[];
  /** Anchor, unique in the table. */
  readonly id?: string;
  /** Results below the lines that lead to them. */
  readonly kind?: "result";
  /** Left out of CSV, where its quantity would not fit the unit of the columns. */
  readonly printOnly?: boolean;
}

/** What kind of knowledge a value is. */
export type CellStanding = "measured" | "published" | "computed" | "estimated" | "symmetry";

export interface Cell {
  /** As printed, empty for nothing to say. */
  readonly text: string;
  /** `text` holds label markup. */
  readonly markup?: boolean;
  /** Orders the column; text cells without it are ordered by their text. */
  readonly sortValue?: number;
  /** Unrounded values for the plain-number columns of CSV, null for none. */
  readonly numbers?: readonly (number | null)[];
  readonly standing?: CellStanding;
  /** Address of the link on the text, relative to the page. */
  readonly href?: string;
  /** Register row behind the value: the renderer links the text when it knows where the register stands. */
  readonly registerRow?: string;
  /** Citation keys in the text, likewise. */
  readonly sourceKeys?: readonly string[];
}
