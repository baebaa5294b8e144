import type { Directive } from "../../dossier/content/Directive.ts";
import { findDirectives } from "../../dossier/content/findDirectives.ts";

/** Stands for a directive while Markdown is read: its index between private characters, as long as the directive. */
export const DIRECTIVE_MARK = /\u{E000}(\d+)\u{E002}*\u{E001}/gu;

export interface MarkedProse {
  /** The Markdown with marks; a blank line before and behind each block directive, so that it stands alone. */
  readonly text: string;
  readonly directives: readonly Directive[];
  /** The directives as they were written. */
  readonly sources: readonly string[];
  /** Line of the original Markdown (from 1) on which a line of `text` (from 1) stands. */
  readonly lineOf: (line: number) => number;
}

/** Puts a mark in the place of every directive; the same characters in an author's text are taken out first. */
export function markDirectives(markdown: string): MarkedProse {
  const clear = markdown.replace(/[\u{E000}-\u{E002}]/gu, "\uFFFD");
  const directives = findDirectives(clear);
  const lines = clear.split("\n");
  const marked: string[] = [];
  const origins: number[] = [];
  lines.forEach((line, index) => {
    const here = directives.flatMap((directive, n) =>
      directive.line === index + 1 ? [{ directive, n }] : [],
    );
    // From the end, so that earlier columns stay true where a mark is longer than what it stands for.
    const text = [...here]
      .reverse()
      .reduce(
        (rest, { directive: { column, length }, n }) =>
          rest.slice(0, column - 1) + mark(n, length) + rest.slice(column - 1 + length),
        line,
      );
    const block = here.some(({ directive }) => directive.form === "block" && directive.alone);
    for (const part of block ? ["", text, ""] : [text]) {
      marked.push(part);
      origins.push(index + 1);
    }
  });
  return {
    text: marked.join("\n"),
    directives,
    sources: directives.map(({ line, column, length }) =>
      lines[line - 1]!.slice(column - 1, column - 1 + length),
    ),
    lineOf: (line) => origins[line - 1] ?? lines.length,
  };
}

function mark(index: number, length: number): string {
  return `\u{E000}${index}${"\u{E002}".repeat(Math.max(0, length - 2 - String(index).length))}\u{E001}`;
}
