import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import type { Register } from "../register/Register.ts";
import type { Dossier } from "./Dossier.ts";

/** A series with its analysed members, ordered by code. */
export interface Series {
  readonly slug: string;
  readonly title: string;
  readonly summary: string;
  /** Shown on every page of the series; null when none. */
  readonly notice: string | null;
  readonly prose: { readonly markdown: string; readonly firstLine: number };
  readonly dossiers: readonly Dossier[];
}

/** The whole content folder after analysis: what the site, the checks page and the commands read. */
export interface Collection {
  /** The content folder as an author types it, with a final slash; for messages. */
  readonly folder: string;
  readonly title: string;
  readonly prose: { readonly markdown: string; readonly firstLine: number };
  readonly series: readonly Series[];
  readonly register: Register;
  readonly program: { readonly name: "ringfolio"; readonly version: string };
  /** Sorted by file, line, column. Any error means that no site may be published. */
  readonly diagnostics: readonly Diagnostic[];
}
