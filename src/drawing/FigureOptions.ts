/** What a page or an export may ask of a figure. */
export interface FigureOptions {
  /** Begins every id of the drawing; by default made of the dossier's slug and the figure's name. */
  readonly idPrefix?: string;
  /** Id of the conformer for figures of a single one; the most stable by default. */
  readonly conformer?: string;
  /** Draw the hydrogen of ring carbons that carry a group; not by default. */
  readonly hydrogens?: boolean;
  /** Number the ring atoms; by default they are. */
  readonly locants?: boolean;
}
