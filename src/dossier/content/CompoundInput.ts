import type { Diagnostic, Place } from "../../diagnostics/Diagnostic.ts";
import type { Claim, EvidenceItem, ReviewEntry } from "../Dossier.ts";

/** One content file as read from disk: data only, nothing in it is executed. */
export interface ContentFile {
  /** Path relative to the content folder, forward slashes, e.g. `series/kestrel/ks-01.md`. */
  readonly path: string;
  /** Path as an author would type it, for messages, e.g. `content/series/kestrel/ks-01.md`. */
  readonly shownPath: string;
  readonly text: string;
  /** SHA-256 of the bytes, lower-case hex. */
  readonly sha256: string;
}

/** A file that evidence may point to (CIF, XYZ, …), known by path and digest. */
export interface AttachedFile {
  /** Relative to the content folder. */
  readonly path: string;
  readonly sha256: string;
}

/** A compound as its author defined it, after series defaults are applied; still no chemistry. */
export interface CompoundInput {
  readonly file: ContentFile;
  readonly code: string;
  readonly slug: string;
  readonly series: string;
  readonly name: string;
  readonly structure: StructureInput;
  readonly temperature_K: number;
  /** True when the compound or its series states the temperature; false for the default of 298.15 K. */
  readonly temperatureStated: boolean;
  /** Register key of the solvent, or null when neither compound nor series states one. */
  readonly solvent: string | null;
  /** True when the author allows open stereocentres and wants every member listed. */
  readonly enumerateStereoisomers: boolean;
  readonly claim: Claim | null;
  readonly evidence: readonly EvidenceItem[];
  readonly review: readonly ReviewEntry[];
  readonly prose: { readonly markdown: string; readonly firstLine: number };
  /**
   * Where a value stands in the file, e.g. `place(["structure"])`, `place(["conditions", "temperature"])`;
   * its nearest ancestor when it is absent. `character` (from 0) counts into a text: `place(["structure"], 12)`.
   */
  readonly place: (path: readonly (string | number)[], character?: number) => Place;
}

export interface StructureInput {
  readonly smiles: string;
  /** Atoms (SMILES order, from 0) at locants 1…6 when the author fixed the numbering by the bench notation. */
  readonly ringLocants: readonly number[] | null;
}

export interface SeriesInput {
  readonly file: ContentFile;
  readonly slug: string;
  readonly title: string;
  /** One or two sentences for lists. */
  readonly summary: string;
  /** Shown on every page of the series, e.g. that the scenario is invented; null when none. */
  readonly notice: string | null;
  readonly prose: { readonly markdown: string; readonly firstLine: number };
}

/** Everything read from a content folder: what could be read, and every problem found. */
export interface ContentInput {
  /** Title of the whole site, from `content/index.md`; `Conformer dossiers` when absent. */
  readonly title: string;
  readonly prose: { readonly markdown: string; readonly firstLine: number };
  readonly series: readonly SeriesInput[];
  readonly compounds: readonly CompoundInput[];
  readonly diagnostics: readonly Diagnostic[];
}
