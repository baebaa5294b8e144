import MarkdownIt from "markdown-it";
import type { MathProblem } from "../../derivation/MathProblem.ts";
import { mathPlugin } from "../../derivation/mathPlugin.ts";
import type { Directive } from "../../dossier/content/Directive.ts";
import { findDirectives } from "../../dossier/content/findDirectives.ts";

/** Stand in the Markdown for a directive; both are private-use characters that authors' text is cleared of. */
const OPEN = "\u{E000}";
const CLOSE = "\u{E001}";

export interface RenderedProse {
  readonly html: string;
  readonly problems: readonly MathProblem[];
}

/**
 * An author's Markdown as HTML: raw HTML stays text, nothing is linked or executed, formulae are set, and each
 * directive is replaced by what `place` returns for it.
 * @param place - finished HTML of a directive; null leaves it out.
 */
export function renderProse(markdown: string, place: (directive: Directive) => string | null): RenderedProse {
  const lines = markdown.replaceAll(OPEN, "").replaceAll(CLOSE, "").split("\n");
  const directives = findDirectives(lines.join("\n"));
  // From the end, so that earlier places stay true.
  [...directives]
    .map((directive, index) => ({ directive, index }))
    .reverse()
    .forEach(({ directive, index }) => {
      const line = lines[directive.line - 1]!;
      const start = directive.column - 1;
      lines[directive.line - 1] =
        line.slice(0, start) + OPEN + index + CLOSE + line.slice(start + directive.length);
    });
  const problems: MathProblem[] = [];
  const md = new MarkdownIt({ html: false, linkify: false, typographer: false });
  md.use(mathPlugin, (problem: MathProblem) => problems.push(problem));
  const rendered = md.render(lines.join("\n"));
  const finished = new Map<number, string>();
  const put = (index: string) => {
    const n = Number(index);
    if (!finished.has(n)) finished.set(n, place(directives[n]!) ?? "");
    return finished.get(n)!;
  };
  const html = rendered
    .replace(new RegExp(`<p>${OPEN}(\\d+)${CLOSE}</p>`, "g"), (_, index: string) => put(index))
    .replace(new RegExp(`${OPEN}(\\d+)${CLOSE}`, "g"), (_, index: string) => put(index));
  return { html, problems };
}
