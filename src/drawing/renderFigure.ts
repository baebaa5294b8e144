import type { Dossier } from "../dossier/Dossier.ts";
import type { FigureOptions } from "./FigureOptions.ts";
import { FIGURES, type FigureName } from "./figures.ts";
import { renderScene } from "./renderScene.ts";

/** A figure ready for a page. */
export interface RenderedFigure {
  readonly svg: string;
  /** Plain text with label markup. */
  readonly caption: string;
  readonly title: string;
}

/**
 * Draws one figure of a dossier. Ids begin with `fig-`, the slug and the figure's name unless a prefix is given;
 * a page that shows the same figure twice must give one.
 */
export function renderFigure(
  dossier: Dossier,
  name: FigureName,
  options: FigureOptions = {},
): RenderedFigure {
  const figure = FIGURES[name];
  const conformer = options.conformer === undefined ? "" : `-${options.conformer.toLowerCase()}`;
  const idPrefix = options.idPrefix ?? `fig-${dossier.slug}-${name}${conformer}`;
  return {
    svg: renderScene(figure.scene(dossier, options), idPrefix),
    caption: figure.caption(dossier, options),
    title: figure.title,
  };
}
