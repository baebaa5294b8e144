/** A figure, table, derivation or value that prose asks for, as written and not yet rendered. */
export interface Directive {
  /** As written: one of the kinds below when `checkProse` has found no problem. */
  readonly kind: string;
  readonly name: string;
  readonly options: Readonly<Record<string, string>>;
  /** What stands in the braces and is not `key=value`; empty when all of it was understood. */
  readonly unread: string;
  /** `block` for two colons on a line of its own, `inline` for one colon. */
  readonly form: "block" | "inline";
  /** True for a block directive with nothing else on its line. */
  readonly alone: boolean;
  readonly line: number;
  readonly column: number;
  readonly length: number;
}

export type PageKind = "compound" | "series" | "site";
export type DirectiveKind = "figure" | "table" | "derivation" | "value";

/** Names that each kind of page can show. The site renders exactly these. */
export const DIRECTIVES: Readonly<Record<PageKind, Readonly<Record<DirectiveKind, readonly string[]>>>> = {
  compound: {
    figure: ["equilibrium", "chair", "wedge", "temperature"],
    table: ["energies", "shapes", "temperature", "identity", "stereoisomers", "evidence", "sources"],
    derivation: ["equilibrium"],
    value: [
      "name",
      "code",
      "temperature",
      "solvent",
      "formula",
      "population.major",
      "population.minor",
      "interval.major",
      "interval.minor",
      "deltaG",
      "K",
      "label.major",
      "label.minor",
      "relation",
      "stereoisomers",
    ],
  },
  series: { figure: ["series"], table: ["comparison"], derivation: [], value: [] },
  site: { figure: [], table: [], derivation: [], value: [] },
};

/** Options that a directive takes in braces, by `kind/name`. */
export const DIRECTIVE_OPTIONS: Readonly<Record<string, readonly string[]>> = {
  "figure/chair": ["conformer"],
};
