import { html, type Markup, trusted } from "./html.ts";
import { CAUTION } from "./layout.ts";

/** A section of a dossier page: its anchor, its heading, its finished content. */
export interface Section {
  readonly id: string;
  readonly title: string;
  readonly content: string;
}

export interface DossierView {
  readonly code: string;
  readonly name: string;
  readonly seriesTitle: string;
  readonly seriesHref: string;
  readonly status: string;
  readonly conclusion: string;
  readonly stops: readonly string[];
  /** The equilibrium figure at the head; empty when prose places it or there is none. */
  readonly lead: string;
  readonly prose: string;
  readonly sections: readonly Section[];
  /** Where each part of the dossier stands, in its order. */
  readonly contents: readonly { readonly id: string; readonly title: string }[];
  /** The dossiers before and after this one in the series. */
  readonly neighbours: readonly {
    readonly relation: "Previous" | "Next";
    readonly code: string;
    readonly href: string;
  }[];
}

/** A dossier: what it is, what is concluded, the figure, the author's words, then the working. */
export function dossierBody(view: DossierView): Markup {
  return html`<article class="dossier">
<header class="dossier-head">
<p class="crumb"><a href="${view.seriesHref}">${view.seriesTitle}</a></p>
<h1><span class="code">${view.code}</span> ${trusted(view.name)}</h1>
<p class="status">${view.status}</p>
</header>
${view.stops.map(
  (stop) => html`<p class="alert alert-stop"><strong>Stop.</strong> ${stop}</p>
`,
)}<section aria-labelledby="conclusion">
<h2 id="conclusion">Conclusion</h2>
<p class="conclusion">${trusted(view.conclusion)}</p>
${trusted(view.lead)}
</section>
<nav class="on-this-page" aria-label="On this page">
<ul>
${view.contents.map(
  ({ id, title }) => html`<li><a href="#${id}">${title}</a></li>
`,
)}</ul>
</nav>
${
  view.prose !== "" &&
  html`<section class="prose" aria-label="Author's text">
${trusted(view.prose)}
</section>
`
}${view.sections.map(
  ({ id, title, content }) => html`<section id="${id}">
<h2>${title}</h2>
${trusted(content)}
</section>
`,
)}<aside class="caution"><p>${CAUTION}</p></aside>
${
  view.neighbours.length > 0 &&
  html`<nav class="neighbours" aria-label="Series">
<ul>
${view.neighbours.map(
  ({ relation, code, href }) => html`<li>${relation}: <a href="${href}">${code}</a></li>
`,
)}</ul>
</nav>
`
}</article>`;
}
