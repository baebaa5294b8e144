import type { MediumClass, Standing } from "../register/Register.ts";

/** Raised whenever the meaning or shape of a record changes; readers of older versions are kept. */
export const DOSSIER_SCHEMA_VERSION = 2;

/**
 * Everything known about one compound: plain, frozen, versioned data, the waist of the program.
 * What stands before it computes; pages, figures, tables, documents and archives read only this.
 */
export interface Dossier {
  readonly schemaVersion: typeof DOSSIER_SCHEMA_VERSION;
  readonly program: { readonly name: "ringfolio"; readonly version: string };
  readonly register: { readonly version: string; readonly sha256: string };
  readonly input: {
    /** Path relative to the content folder, forward slashes; empty for the batch command. */
    readonly file: string;
    /** SHA-256 of the file's bytes, lower-case hex. */
    readonly sha256: string;
  };
  /** SHA-256 of this record in canonical JSON with `resultSha256` itself empty, lower-case hex. */
  readonly resultSha256: string;

  readonly code: string;
  /** Safe for a URL and a file name: lower-case letters, digits and hyphens. */
  readonly slug: string;
  /** Slug of the series. */
  readonly series: string;
  readonly name: string;
  /** Author's Markdown prose, as written, without the front matter; line of its first line in the file. */
  readonly prose: { readonly markdown: string; readonly firstLine: number };

  readonly conditions: Conditions;
  readonly identity: Identity;
  readonly structure: Structure;
  readonly rings: readonly Ring[];
  /** The ring systems that hold analysed rings. */
  readonly systems: readonly RingSystem[];
  /** Most stable first; empty when `alerts` holds a `stop` that says why. */
  readonly conformers: readonly Conformer[];
  /** Relation of the two chairs of a single flexible ring; null when there is no such pair. */
  readonly relation: ChairRelation | null;
  readonly kinship: Kinship;
  /** Free-energy difference and equilibrium constant of each conformer against the first. */
  readonly equilibria: readonly Equilibrium[];
  /** Ascending temperature; the dossier's own temperature is always among them. */
  readonly temperatures: readonly TemperatureRow[];
  /** When stereochemistry was left open and the author allowed it: what each member would give. */
  readonly members: readonly MemberSummary[];
  /** Every stereoisomer of the constitution: this one, its enantiomer, the others; empty for a single one or too many. */
  readonly stereoisomers: readonly StereoisomerSummary[];
  readonly stereoisomerCount: StereoisomerCount;
  readonly alerts: readonly Alert[];
  /** One paragraph in plain sentences; changes with the data. */
  readonly conclusion: string;
  readonly claim: Claim | null;
  readonly evidence: readonly EvidenceItem[];
  readonly review: readonly ReviewEntry[];
  /** Every source used above, sorted by key. */
  readonly sources: readonly SourceNote[];
}

/** How the listed conformers are related to each other. */
export interface Kinship {
  /** How many are distinct when superimposable ones count once. */
  readonly distinct: number;
  /** How many are distinct when mirror images count once too. */
  readonly distinctUpToMirror: number;
  /** Pairs that are superimposable or mirror images; every other pair is diastereomeric. */
  readonly pairs: readonly {
    readonly first: string;
    readonly second: string;
    readonly relation: "identical" | "enantiomeric";
  }[];
}

/** Rings joined by shared atoms. */
export interface RingSystem {
  readonly index: number;
  /** Analysed rings in it, as indices into the dossier's rings. */
  readonly rings: readonly number[];
  /** All its ring atoms, ascending; rings of any size and kind. */
  readonly atoms: readonly number[];
  readonly bonds: readonly {
    readonly from: number;
    readonly to: number;
    readonly order: 1 | 2 | 3;
    readonly aromatic: boolean;
  }[];
  /** Bonds that an analysed ring shares with another ring between two tetrahedral atoms, and how they are fused. */
  readonly fusions: readonly {
    readonly atoms: readonly [number, number];
    readonly locants: readonly [string, string];
    readonly relation: "cis" | "trans";
  }[];
}

export type ChairRelation = "identical" | "enantiomeric" | "diastereomeric";

export interface Conditions {
  readonly temperature_K: number;
  /** Register key, or `unstated`. */
  readonly solvent: string;
  /** For print, `_` marks a subscript: `CDCl_3`. */
  readonly solventLabel: string;
  readonly medium: MediumClass;
  /** True where the author or the series names the solvent; false when a medium had to be assumed. */
  readonly stated: boolean;
}

export interface Identity {
  /** The structure as the author wrote it (SMILES), or the SMILES made from ring and groups. */
  readonly smiles: string;
  readonly canonicalSmiles: string;
  readonly inchi: string;
  readonly inchikey: string;
  readonly formula: string;
  /** Relative molecular mass, g/mol. */
  readonly molarMass: number;
  readonly stereocentres: readonly Stereocentre[];
  readonly stereobonds: readonly Stereobond[];
  readonly chirality: "achiral" | "meso" | "chiral";
}

export interface Stereocentre {
  /** Atom in input SMILES order, from 0. */
  readonly atom: number;
  readonly descriptor: "R" | "S" | "r" | "s" | "unspecified";
  /** Ring locant where the centre stands in an analysed ring: `1`, `4`, `2′`. */
  readonly locant: string | null;
}

export interface Stereobond {
  readonly atoms: readonly [number, number];
  readonly descriptor: "E" | "Z" | "unspecified";
}

/** The molecular graph with flat coordinates for the wedge diagram. */
export interface Structure {
  readonly atoms: readonly StructureAtom[];
  readonly bonds: readonly StructureBond[];
}

export interface StructureAtom {
  readonly element: string;
  readonly charge: number;
  /** Mass number, 0 when natural. */
  readonly isotope: number;
  readonly hydrogens: number;
  /** Flat coordinates, bond length about 1.5, y upwards. */
  readonly x: number;
  readonly y: number;
}

export interface StructureBond {
  /** The narrow end of a wedge is at `from`. */
  readonly from: number;
  readonly to: number;
  readonly order: 1 | 2 | 3;
  readonly aromatic: boolean;
  readonly wedge: "solid" | "hashed" | null;
}

export interface Ring {
  readonly index: number;
  /**
   * The six ring atoms, from the lowest index, in the direction of rising locants.
   * Faces are seen from the side from which this list runs clockwise.
   */
  readonly atoms: readonly number[];
  /** Printed locants of `atoms`, in the same order: `1` … `6`, `4a`, primed in further rings without a common numbering. */
  readonly locants: readonly string[];
  /** Index of the ring system it belongs to. */
  readonly system: number;
  /** What states it has: two chairs, two half-chairs (one bond held flat), or the boat that a bridge forces. */
  readonly kind: "chair" | "half-chair" | "boat";
  readonly parent: string;
  /** Register ring key, with the nitrogen's variant: `piperidine/NH`. */
  readonly ringKey: string;
  readonly substituents: readonly RingSubstituent[];
  /** Bonds from tetrahedral ring atoms to atoms of other rings of the system, which are axial or equatorial too. */
  readonly branches: readonly {
    readonly ringAtom: number;
    readonly atom: number;
    readonly locant: string;
    /** Locant of the other atom; empty where it has none. */
    readonly towards: string;
  }[];
  /** cis/trans of every pair of substituted ring atoms that carry one group each. */
  readonly configuration: readonly {
    readonly locants: readonly [string, string];
    readonly relation: "cis" | "trans";
  }[];
}

export interface RingSubstituent {
  /** Ring atom and the first atom of the group. */
  readonly ringAtom: number;
  readonly atom: number;
  readonly locant: string;
  /** null where the atom inverts (nitrogen) or is trigonal and so has no lasting face. */
  readonly face: "up" | "down" | null;
  /** Register key, or null for a group the register does not know. */
  readonly group: string | null;
  /** For print, with `_`, `^` and `*` as in the register; attached atom first, then last. */
  readonly label: string;
  readonly labelReversed: string;
}

export type Orientation = "axial" | "equatorial";

export interface Conformer {
  /** `A` is the most stable. */
  readonly id: string;
  /** Locants with a or e: `1e,4e`; group in brackets where two groups share a ring atom. */
  readonly label: string;
  readonly rings: readonly { readonly ring: number; readonly form: RingForm }[];
  readonly positions: readonly Position[];
  /** Relative to conformer A, kJ/mol, with standard uncertainty of the difference. */
  readonly deltaG_kJ_mol: number;
  readonly u_kJ_mol: number;
  /** Sum of the contributions below, kJ/mol. */
  readonly sum_kJ_mol: number;
  readonly population: number;
  readonly population95: readonly [number, number];
  readonly contributions: readonly Contribution[];
  /** Ideal coordinates in Å for drawing: ring atoms of each system, their hydrogens, the first atom of each group. */
  readonly geometry: Geometry;
  /** The whole molecule relaxed by mechanics; null where no mechanics ran. */
  readonly relaxed: RelaxedGeometry | null;
  /** Shares of the two places of each N–H in this conformer. */
  readonly nitrogens: readonly NitrogenPlaces[];
}

export type RingForm = "chair" | "half-chair" | "boat" | "twist-boat";

/** Where the hydrogen of a secondary ring amine stands: two states that a conformer holds together. */
export interface NitrogenPlaces {
  readonly ring: number;
  readonly atom: number;
  readonly locant: string;
  /** Fraction with the hydrogen equatorial, with its 95 % interval. */
  readonly equatorial: number;
  readonly equatorial95: readonly [number, number];
  readonly source: string;
  readonly sourceKeys: readonly string[];
}

/** One conformer of the whole molecule after relaxation. */
export interface RelaxedGeometry {
  /** Force field: `MMFF94s`. */
  readonly method: string;
  /** Å; atoms in input order, then hydrogens with `atom` null. */
  readonly atoms: readonly {
    readonly element: string;
    readonly atom: number | null;
    readonly x: number;
    readonly y: number;
    readonly z: number;
  }[];
  readonly puckering: readonly RingPuckering[];
  /**
   * Distinct staggered rotamers of the groups, lowest first: torsions found, degrees, and energy of the force field
   * above the lowest, kJ/mol. One with no torsions where nothing turns.
   */
  readonly rotamers: readonly {
    readonly torsions: readonly { readonly atoms: readonly number[]; readonly degrees: number }[];
    readonly energy_kJ_mol: number;
  }[];
}

/** Shape of one ring in numbers (Cremer and Pople, J. Am. Chem. Soc. 1975, 97, 1354). */
export interface RingPuckering {
  readonly ring: number;
  /** Locants in the order that the numbers refer to. */
  readonly locants: readonly string[];
  /** Endocyclic torsion about the bond from each atom of that order to the next, degrees. */
  readonly torsions_deg: readonly number[];
  readonly Q_A: number;
  readonly theta_deg: number;
  /** null near θ = 0° and 180°, where it has no meaning. */
  readonly phi_deg: number | null;
  /** IUPAC symbol where the ring has sugar numbering, label markup: `^4C_1`. */
  readonly symbol: string | null;
  /** Nearest canonical form in words, and its angular distance on the sphere of forms, degrees. */
  readonly nearest: string;
  readonly distance_deg: number;
}

export interface Position {
  readonly ring: number;
  readonly ringAtom: number;
  /** First atom of the group. */
  readonly substituent: number;
  readonly locant: string;
  /** A group, or a bond into another ring of the system. */
  readonly kind: "group" | "ring bond";
  /** Label for print, attached atom first. */
  readonly group: string;
  readonly orientation: Orientation;
  /** True next to a flat bond, where the words are pseudoaxial and pseudoequatorial. */
  readonly pseudo: boolean;
  readonly face: "up" | "down";
}

export type ContributionKind =
  | "axial group"
  | "anomeric"
  | "vicinal gauche"
  | "syn-axial"
  | "geminal"
  | "nitrogen substituent"
  | "ring fusion"
  | "non-chair form"
  | "additivity allowance";

export type Basis = "published" | "computed" | "not available";

/** One line of the energy table. */
export interface Contribution {
  readonly kind: ContributionKind;
  /** Words for the table: `Me axial at C1`. Labels with `_`, `^`, `*` as in the register. */
  readonly label: string;
  readonly atoms: readonly number[];
  readonly value_kJ_mol: number;
  readonly u_kJ_mol: number;
  readonly basis: Basis;
  /** The register's own mark; null when the value is not from the register. */
  readonly standing: Standing | null;
  /** One line for a reader: citation keys, or why a stand-in was used. */
  readonly source: string;
  readonly sourceKeys: readonly string[];
  /**
   * Register rows and stand-ins used, with the factor of each in this value and what it is worth by itself
   * at the dossier's temperature (kJ/mol, standard uncertainty).
   */
  readonly terms: readonly {
    readonly row: string;
    readonly coefficient: number;
    readonly value_kJ_mol: number;
    readonly u_kJ_mol: number;
  }[];
  /** Medium and temperature the printed value is for. */
  readonly medium: string;
  readonly temperature_K: number | null;
  readonly note: string | null;
}

export interface Equilibrium {
  /** Conformer ids: `from` is always A. */
  readonly from: string;
  readonly to: string;
  /** ΔG = G(to) − G(from), kJ/mol. */
  readonly deltaG_kJ_mol: number;
  readonly u_kJ_mol: number;
  readonly deltaG95_kJ_mol: readonly [number, number];
  /** K = [to]/[from]. */
  readonly K: number;
  readonly K95: readonly [number, number];
  /** The interval of ΔG contains zero and the two are not equal by symmetry. */
  readonly unresolved: boolean;
  /** Equal by symmetry (identical or enantiomeric chairs): exact, no uncertainty. */
  readonly bySymmetry: boolean;
}

export interface TemperatureRow {
  readonly temperature_K: number;
  readonly populations: readonly {
    readonly conformer: string;
    readonly population: number;
    readonly population95: readonly [number, number];
  }[];
}

export interface MemberSummary {
  readonly canonicalSmiles: string;
  /** `cis-1,2` and the like, or the CIP descriptors. */
  readonly description: string;
  readonly majorLabel: string;
  readonly population: number;
  readonly population95: readonly [number, number];
}

/** One stereoisomer of the constitution, with the locants of the compound. */
export interface StereoisomerSummary {
  readonly canonicalSmiles: string;
  /** To the compound. Where it leaves configurations open, every stereoisomer it may stand for is `same`. */
  readonly relation: "same" | "enantiomer" | "diastereomer";
  /** CIP descriptors in the order of locants, then E/Z: `1R,3S`. */
  readonly descriptors: string;
  /** Relative configuration of its rings: `cis-1,3`, `r-1,c-2,t-4`, `trans-4a,8a`; empty where it has none. */
  readonly configuration: string;
  readonly chirality: Identity["chirality"];
}

export interface StereoisomerCount {
  /** Stereoisomers of the constitution; null when there are too many elements to count. */
  readonly distinct: number | null;
  /** Upper bound: 2 to the power of the centres and double bonds. */
  readonly upTo: number;
}

export type AlertSeverity = "stop" | "caution" | "note";

export interface Alert {
  /** Stable kebab-case word. */
  readonly code: string;
  readonly severity: AlertSeverity;
  readonly message: string;
}

export interface Claim {
  readonly configuration: string | null;
  readonly basis: string | null;
  readonly statement: string | null;
}

export interface EvidenceItem {
  readonly kind: "coupling" | "population" | "exchange" | "contact" | "geometry" | "observation";
  /** Plain words: what was observed, with value and uncertainty as the author gave them. */
  readonly summary: string;
  readonly conditions: string | null;
  readonly source: string | null;
  readonly file: { readonly path: string; readonly sha256: string } | null;
  /** 1-based line of the item in the content file. */
  readonly line: number;
}

export interface ReviewEntry {
  readonly by: string;
  /** ISO date. */
  readonly on: string;
  readonly as: string;
  readonly meaning: string | null;
}

export interface SourceNote {
  readonly key: string;
  readonly text: string;
  readonly standing: "confirmed" | "partly confirmed" | "memory" | "none";
}

export interface Geometry {
  readonly atoms: readonly {
    readonly element: string;
    /** Input atom, or null for a hydrogen added on `parent`. */
    readonly atom: number | null;
    /** The ring atom it hangs on; null for a ring atom. */
    readonly parent: number | null;
    /** Ring system whose frame the coordinates are in. */
    readonly system: number;
    readonly x: number;
    readonly y: number;
    readonly z: number;
  }[];
}
