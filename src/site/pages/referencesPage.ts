import { articleBody } from "../../../templates/article.ts";
import type { Collection } from "../../dossier/Collection.ts";
import { escapeHtml } from "../../quantity/escapeHtml.ts";
import { citationStanding } from "../../tables/citationStanding.ts";
import { registerAnchor } from "../../tables/registerAnchor.ts";

/** The body of the references page: the bibliography of the register, and where each source is used. */
export function referencesPage(collection: Collection): string {
  const users = new Map<string, string[]>();
  for (const series of collection.series) {
    for (const dossier of series.dossiers) {
      for (const { key } of dossier.sources) {
        const link = `<a href="../series/${series.slug}/${dossier.slug}/index.html">${escapeHtml(dossier.code)}</a>`;
        users.set(key, [...(users.get(key) ?? []), link]);
      }
    }
  }
  const sorted = [...collection.register.citations].sort((a, b) =>
    a.key < b.key ? -1 : a.key > b.key ? 1 : 0,
  );
  const items = sorted.map(({ key, text, standing }) => {
    const used = users.get(key);
    return (
      `<div class="reference" id="${registerAnchor(key)}"><dt>${escapeHtml(key)}</dt><dd>${escapeHtml(text)} ` +
      `<span class="small">Citation: ${escapeHtml(citationStanding(standing))}.${used === undefined ? "" : ` Used by ${used.join(", ")}.`}</span></dd></div>`
    );
  });
  return articleBody({
    title: "References",
    intro:
      "<p>Sources of the register. The standing says how sure the citation itself is, not the value taken from it.</p>",
    sections: [
      {
        id: "bibliography",
        title: "Bibliography",
        content: `<dl class="references">${items.join("\n")}</dl>`,
      },
    ],
  }).markup;
}
