import { html, type Markup, type Piece } from "./html.ts";

/** What every page has around its content. */
export interface Frame {
  readonly siteTitle: string;
  /** Path from this page to the site's top: empty there, else `../` for each folder. */
  readonly root: string;
  readonly program: string;
  readonly registerVersion: string;
}

export interface PageParts {
  readonly title: string;
  readonly description: string;
  /** Name of the navigation entry that this page is, or below which it stands. */
  readonly current: string;
  /** True for a page of its own below that entry. */
  readonly below: boolean;
  /** The series' notice; null when none. */
  readonly notice: string | null;
  readonly body: Piece;
}

const NAVIGATION: readonly (readonly [string, string])[] = [
  ["Home", "index.html"],
  ["Series", "index.html#series"],
  ["Checks", "checks/index.html"],
  ["Register", "register/index.html"],
  ["References", "references/index.html"],
  ["Methods", "methods/index.html"],
];

const POLICY =
  "default-src 'none'; script-src 'self'; style-src 'self' 'unsafe-inline'; img-src 'self' data:; font-src 'self'; base-uri 'none'; form-action 'none'";

/** The caution that stands wherever text may reach a submission. */
export const CAUTION =
  "Draft for qualified review. Populations and energies are estimates by additive free-energy increments unless marked as measured. Defer to current regional guidance; this is not a validated system.";

/** The frame of every page. */
export function layout(frame: Frame, page: PageParts): Markup {
  return html`<!DOCTYPE html>
<html lang="en-GB">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${POLICY}">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="description" content="${page.description}">
<title>${page.title}</title>
<link rel="icon" href="data:,">
<link rel="stylesheet" href="${frame.root}assets/katex/katex.min.css">
<link rel="stylesheet" href="${frame.root}assets/ringfolio.css">
</head>
<body>
<a class="skip" href="#content">Skip to the content</a>
<header class="site-head">
<p class="site-title"><a href="${frame.root}index.html">${frame.siteTitle}</a></p>
<nav aria-label="Site">
<ul>
${NAVIGATION.map(
  ([
    name,
    path,
  ]) => html`<li><a href="${frame.root}${path}"${name === page.current && html` aria-current="${page.below ? "true" : "page"}"`}>${name}</a></li>
`,
)}</ul>
</nav>
</header>
<main id="content">
${
  page.notice !== null &&
  html`<p class="notice" role="note">${page.notice}</p>
`
}${page.body}
</main>
<footer class="site-foot">
<p>${CAUTION}</p>
<p>${frame.program} · register ${frame.registerVersion}</p>
</footer>
</body>
</html>
`;
}
