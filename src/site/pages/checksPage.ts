import { articleBody } from "../../../templates/article.ts";
import type { Section } from "../../../templates/dossier.ts";
import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import type { Collection } from "../../dossier/Collection.ts";
import { escapeHtml } from "../../quantity/escapeHtml.ts";

const SEVERITIES = [
  ["stop", "Stop: no conclusion is drawn"],
  ["caution", "Caution: look before relying on it"],
  ["note", "Note: worth knowing"],
] as const;

/** The body of the checks page: every alert of every dossier, worst first, grouped by what to do about it. */
export function checksPage(collection: Collection, diagnostics: readonly Diagnostic[]): string {
  const sections: Section[] = SEVERITIES.flatMap(([severity, title]): Section[] => {
    const found = collection.series.flatMap((series) =>
      series.dossiers.flatMap((dossier) =>
        dossier.alerts
          .filter((alert) => alert.severity === severity)
          .map((alert) => ({
            alert,
            dossier,
            href: `../series/${series.slug}/${dossier.slug}/index.html#alerts`,
          })),
      ),
    );
    if (found.length === 0) return [];
    const codes = [...new Set(found.map(({ alert }) => alert.code))].sort();
    const content = codes.map((code) => {
      const here = found.filter(({ alert }) => alert.code === code);
      const items = here.map(
        ({ alert, dossier, href }) =>
          `<li><a href="${escapeHtml(href)}">${escapeHtml(dossier.code)}</a> ${escapeHtml(alert.message)}</li>`,
      );
      return `<h3 id="${severity}-${escapeHtml(code)}"><code>${escapeHtml(code)}</code> (${here.length})</h3><ul class="alerts">${items.join("")}</ul>`;
    });
    return [{ id: severity, title: `${title} (${found.length})`, content: content.join("\n") }];
  });
  const cautions = diagnostics.filter(({ severity }) => severity === "caution");
  if (cautions.length > 0) {
    const items = cautions.map(
      ({ place, code, message }) =>
        `<li><code>${escapeHtml(`${place.file}:${place.line}:${place.column}`)}</code> ${escapeHtml(message)} <code>${escapeHtml(code)}</code></li>`,
    );
    sections.push({
      id: "files",
      title: `In the content files (${cautions.length})`,
      content: `<ul class="alerts">${items.join("")}</ul>`,
    });
  }
  return articleBody({
    title: "Checks",
    intro:
      sections.length === 0
        ? "<p>Nothing is open.</p>"
        : "<p>Everything a reviewer still has to look at, worst first. Each entry leads to its dossier.</p>",
    sections,
  }).markup;
}
