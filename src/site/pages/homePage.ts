import { articleBody } from "../../../templates/article.ts";
import type { Collection, Series } from "../../dossier/Collection.ts";
import { escapeHtml } from "../../quantity/escapeHtml.ts";
import { renderTable } from "../../tables/renderTable.ts";
import type { TableModel } from "../../tables/TableModel.ts";
import { renderProse } from "./renderProse.ts";

/** The body of the home page: what the site is, its series, what is open. */
export function homePage(collection: Collection): string {
  const prose = renderProse(collection.prose.markdown, () => null).html;
  const open = (series: Series, severity: string) =>
    series.dossiers.reduce(
      (sum, dossier) => sum + dossier.alerts.filter((alert) => alert.severity === severity).length,
      0,
    );
  const model: TableModel = {
    id: "series",
    caption: "Series of this site",
    columns: [
      { key: "series", title: "Series", align: "left", rowHeader: true },
      { key: "about", title: "About", align: "left" },
      { key: "dossiers", title: "Dossiers", align: "right" },
      { key: "stop", title: "Stop", align: "right" },
      { key: "caution", title: "Caution", align: "right" },
      { key: "note", title: "Note", align: "right" },
    ],
    rows: collection.series.map((series) => ({
      cells: [
        { text: series.title, href: `series/${series.slug}/index.html` },
        { text: series.summary },
        { text: String(series.dossiers.length) },
        ...["stop", "caution", "note"].map((severity) => ({ text: String(open(series, severity)) })),
      ],
    })),
    notes: [],
  };
  const notices = collection.series.filter(({ notice }) => notice !== null);
  return articleBody({
    title: collection.title,
    intro: `<div class="prose">${prose}</div>`,
    sections: [
      {
        id: "series",
        title: "Series",
        content:
          `<div class="wide">${renderTable(model, {})}</div>` +
          notices
            .map(({ title, notice }) => `<p class="small">${escapeHtml(title)}: ${escapeHtml(notice!)}</p>`)
            .join("\n"),
      },
      {
        id: "more",
        title: "Elsewhere",
        content:
          '<ul><li><a href="checks/index.html">Checks</a>: everything a reviewer still has to look at, worst first.</li>' +
          '<li><a href="register/index.html">Register</a>: every parameter with its source and standing, and the dossiers that use it.</li>' +
          '<li><a href="references/index.html">References</a>: the bibliography.</li>' +
          '<li><a href="methods/index.html">Methods</a>: how energies, populations and intervals are made, and their limits.</li></ul>',
      },
    ],
  }).markup;
}
