import type { Dossier } from "../dossier/Dossier.ts";
import type { FigureOptions } from "./FigureOptions.ts";
import type { Scene } from "./Scene.ts";

/** A kind of figure that a dossier can show. */
export interface Figure {
  /** Heading of the kind, for lists and menus. */
  readonly title: string;
  /** The sentence printed beneath, plain text with label markup. */
  caption(dossier: Dossier, options?: FigureOptions): string;
  /** The figure in words for readers who do not see it. */
  describe(dossier: Dossier, options?: FigureOptions): string;
  /** Whether the dossier holds what the figure needs; asking for a scene without it is a programmer's error. */
  canShow(dossier: Dossier, options?: FigureOptions): boolean;
  scene(dossier: Dossier, options?: FigureOptions): Scene;
}
