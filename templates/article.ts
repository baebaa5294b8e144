import type { Section } from "./dossier.ts";
import { html, type Markup, trusted } from "./html.ts";

/** A plain page: a heading, an introduction, sections. */
export function articleBody(view: {
  readonly title: string;
  readonly intro: string;
  readonly sections: readonly Section[];
}): Markup {
  return html`<article>
<h1>${view.title}</h1>
${trusted(view.intro)}
${view.sections.map(
  ({ id, title, content }) => html`<section id="${id}">
<h2>${title}</h2>
${trusted(content)}
</section>
`,
)}</article>`;
}
