/**
 * How much a printed value is worth: `confirmed` was found in a stored public page, `memory` is recalled
 * from the literature and was not found again, `estimate` is judged or interpolated by a curator.
 */
export type Standing = "confirmed" | "memory" | "estimate";

/** Classes of surroundings, in order of growing polarity; distance in this list is the nearest-medium rule. */
export const MEDIUM_CLASSES = ["gas", "nonpolar", "chlorinated", "polar aprotic", "protic"] as const;
export type MediumClass = (typeof MEDIUM_CLASSES)[number];

/** A substituent as the register knows it. */
export interface Group {
  /** The trade's abbreviation, unique, e.g. `CO2Me`, `t-Bu`, `NH3+`. */
  readonly key: string;
  /** Other spellings an author may use, e.g. `CH3`, `methyl`. */
  readonly aliases: readonly string[];
  /** Prefix used in names, e.g. `methoxycarbonyl`. */
  readonly prefix: string;
  /** SMILES with `[*]` for the ring atom it is attached to. */
  readonly smiles: string;
  /** Set for drawing: `_2` subscript, `^+` superscript, `*t*` italic; attached atom first. */
  readonly label: string;
  /** The same with the attached atom last, for the left side of a drawing (`MeO_2C`). */
  readonly labelReversed: string;
  /** Key of the group class that supplies stand-in values. */
  readonly groupClass: string;
}

/** Stand-in values for groups and pairs that no row covers: wide, and shown as `not available`. */
export interface GroupClass {
  readonly key: string;
  readonly title: string;
  /** Stand-in for the axial − equatorial free energy, kcal/mol, with standard uncertainty. */
  readonly axial: { readonly value: number; readonly u: number };
  /** Polar bonds at the attachment point: additivity is less safe between two of these. */
  readonly polar: boolean;
  /** Can donate a hydrogen bond. */
  readonly donor: boolean;
  /** True for carbon-attached groups whose pairs behave as alkyl/alkyl. */
  readonly carbon: boolean;
}

/** What kind of quantity a row states; also the name of the table it stands in. */
export type RowKind =
  | "axial group"
  | "anomeric"
  | "vicinal gauche"
  | "syn-axial"
  | "geminal"
  | "nitrogen substituent";

/** One published (or recalled, or estimated) energy, number and unit as printed. */
export interface RegisterRow {
  /** Unique and stable, e.g. `axial/cyclohexane/Me`, `vicinal/Me+OH/any`. */
  readonly id: string;
  readonly kind: RowKind;
  /**
   * Group keys: one for axial rows (axial − equatorial); two for pairs, order irrelevant except for
   * `geminal` (first axial, second equatorial, minus the reverse).
   */
  readonly groups: readonly string[];
  /** Parent ring by name, with the nitrogen's variant after a slash where it matters: `piperidine/NH`. */
  readonly ring: string;
  /** Locants the row is for, lowest equivalents; one for axial rows, two for ring-specific pairs, none when any. */
  readonly locants: readonly number[];
  readonly value: number;
  /** Standard uncertainty in the same unit. */
  readonly u: number;
  readonly unit: "kcal/mol";
  /** The printed solvent. */
  readonly solvent: string;
  /** Solvents of the register named by the row; an exact match beats every class. */
  readonly solvents: readonly string[];
  /** Medium classes the row is valid for; empty means any. */
  readonly media: readonly MediumClass[];
  readonly temperature_K?: number;
  /** ΔS (axial − equatorial) in cal/(mol K), where published, with its own sources and standing. */
  readonly entropy?: {
    readonly value: number;
    readonly u: number;
    readonly sources: readonly string[];
    readonly standing: Standing;
  };
  /** Keys of the bibliography. */
  readonly sources: readonly string[];
  readonly standing: Standing;
  readonly note?: string;
}

/** A ring-inversion or other barrier or non-chair energy; kept for display and later kinetics. */
export interface ReferenceRow {
  readonly id: string;
  readonly system: string;
  readonly smiles?: string;
  readonly quantity: string;
  readonly value: number;
  readonly u: number;
  readonly unit: string;
  readonly solvent: string;
  readonly temperature_K?: number;
  readonly sources: readonly string[];
  readonly standing: Standing;
  readonly note?: string;
}

/** A saturated six-membered parent ring: its name and its atoms in locant order 1…6. */
export interface RingParent {
  readonly name: string;
  readonly aliases: readonly string[];
  /** Element symbols at locants 1 to 6. */
  readonly elements: readonly string[];
}

export interface Solvent {
  readonly key: string;
  readonly aliases: readonly string[];
  /** For print, with `_` and `^` as in group labels. */
  readonly label: string;
  readonly medium: MediumClass;
}

export interface Citation {
  readonly key: string;
  readonly text: string;
  /** Whether the citation itself was seen: its own standing. */
  readonly standing: "confirmed" | "partly confirmed" | "memory" | "none";
}

/** The whole parameter register: plain frozen data, parsed from YAML texts by `parseRegister`. */
export interface Register {
  readonly version: string;
  /** SHA-256 over the register's own files, lower-case hex. */
  readonly sha256: string;
  readonly groups: readonly Group[];
  readonly groupClasses: readonly GroupClass[];
  readonly rows: readonly RegisterRow[];
  readonly barriers: readonly ReferenceRow[];
  readonly nonChair: readonly ReferenceRow[];
  readonly parents: readonly RingParent[];
  readonly solvents: readonly Solvent[];
  readonly citations: readonly Citation[];
}
