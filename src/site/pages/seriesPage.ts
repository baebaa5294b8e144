import { articleBody } from "../../../templates/article.ts";
import type { Series } from "../../dossier/Collection.ts";
import { renderScene } from "../../drawing/renderScene.ts";
import { seriesScene } from "../../drawing/seriesScene.ts";
import { escapeHtml } from "../../quantity/escapeHtml.ts";
import { renderTable } from "../../tables/renderTable.ts";
import { SERIES_TABLES } from "../../tables/SERIES_TABLES.ts";
import { PagePlan } from "./PagePlan.ts";
import { renderProse } from "./renderProse.ts";

/** The body of a series page: scope, comparison table, populations at a glance. */
export function seriesPage(series: Series): string {
  const plan = new PagePlan();
  const comparison = () => {
    plan.placed.add("table/comparison");
    const model = SERIES_TABLES["comparison"]!(series, (dossier) => `${dossier.slug}/index.html`);
    return `<div class="wide">${renderTable(model, { number: plan.nextTable() })}<p class="table-download"><a href="comparison.csv" download>CSV</a></p></div>`;
  };
  const overview = () => {
    plan.placed.add("figure/series");
    if (!series.dossiers.some((dossier) => dossier.conformers.length > 0)) return "";
    const svg = renderScene(seriesScene(series.dossiers), `fig-${series.slug}-series`);
    return plan.figure(
      `figure-${series.slug}`,
      svg,
      "Population of the major conformer of each compound, with its 95\u00a0% interval, at the conditions of its dossier.",
    );
  };
  const prose = renderProse(series.prose.markdown, ({ kind, name }) =>
    kind === "table" && name === "comparison"
      ? comparison()
      : kind === "figure" && name === "series"
        ? overview()
        : null,
  ).html;
  const sections = [];
  if (!plan.placed.has("table/comparison"))
    sections.push({ id: "comparison", title: "Comparison", content: comparison() });
  if (!plan.placed.has("figure/series")) {
    const figure = overview();
    if (figure !== "") sections.push({ id: "overview", title: "Populations at a glance", content: figure });
  }
  return articleBody({
    title: series.title,
    intro: `<p class="lead">${escapeHtml(series.summary)}</p>\n<div class="prose">${prose}</div>`,
    sections,
  }).markup;
}
