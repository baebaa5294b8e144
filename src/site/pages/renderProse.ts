import MarkdownIt from "markdown-it";
import type { MathProblem } from "../../derivation/MathProblem.ts";
import { mathPlugin } from "../../derivation/mathPlugin.ts";
import type { Directive } from "../../dossier/content/Directive.ts";
import { lowerHeadings } from "./lowerHeadings.ts";
import { markDirectives } from "./markDirectives.ts";
import { namePictures, type PicturePlace } from "./namePictures.ts";
import { placeDirectives } from "./placeDirectives.ts";

export interface RenderedProse {
  readonly html: string;
  readonly problems: readonly MathProblem[];
  /** Where pictures stand that are not shown. */
  readonly pictures: readonly PicturePlace[];
}

/**
 * An author's Markdown as HTML: raw HTML stays text, nothing is executed or fetched, formulae are set, and each
 * directive is replaced by what `place` returns for it. Lines and columns of problems count from 1 within `markdown`.
 * @param place - finished HTML of a directive; null leaves it out.
 */
export function renderProse(markdown: string, place: (directive: Directive) => string | null): RenderedProse {
  const marked = markDirectives(markdown);
  const problems: MathProblem[] = [];
  const pictures: PicturePlace[] = [];
  const md = new MarkdownIt({ html: false, linkify: false, typographer: false });
  md.use(lowerHeadings);
  md.use(namePictures, (picture: PicturePlace) => pictures.push(picture));
  md.use(placeDirectives, marked, (directive: Directive) => place(directive) ?? "");
  md.use(mathPlugin, (problem: MathProblem) => problems.push(problem));
  const html = md.render(marked.text);
  const inFile = <P extends { readonly line: number }>(problem: P): P => ({
    ...problem,
    line: marked.lineOf(problem.line),
  });
  return { html, problems: problems.map(inFile), pictures: pictures.map(inFile) };
}
