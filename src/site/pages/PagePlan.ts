import { escapeHtml } from "../../quantity/escapeHtml.ts";
import { labelHtml } from "../../quantity/labelHtml.ts";

/** Numbers figures and tables of one page in the order in which they are placed. */
export class PagePlan {
  private figures = 0;
  private tables = 0;
  /** Names already placed, e.g. `figure/equilibrium`. */
  readonly placed = new Set<string>();

  /** The number of the next table, as it stands before a caption. */
  nextTable(): string {
    this.tables += 1;
    return `Table ${this.tables}.`;
  }

  /**
   * A drawing with its numbered caption.
   * @param caption - label markup; what a figure shows.
   */
  figure(
    id: string,
    svg: string,
    caption: string,
    links: readonly { readonly href: string; readonly text: string }[] = [],
  ): string {
    this.figures += 1;
    const downloads = links
      .map(({ href, text }) => `<a href="${escapeHtml(href)}" download>${escapeHtml(text)}</a>`)
      .join(" · ");
    return (
      `<figure id="${escapeHtml(id)}"><div class="figure-drawing-frame">${svg}</div>` +
      `<figcaption><span class="caption-number">Figure ${this.figures}.</span> ${labelHtml(caption)}` +
      `${downloads === "" ? "" : ` <span class="figure-download">${downloads}</span>`}</figcaption></figure>`
    );
  }
}
