import { escapeHtml } from "../quantity/escapeHtml.ts";
import { labelHtml } from "../quantity/labelHtml.ts";
import type { DerivationKey, DerivationStep } from "./DerivationStep.ts";
import { renderTex } from "./renderTex.ts";

export interface DerivationOptions {
  /** Level of each step's heading; default 3. */
  readonly headingLevel?: 2 | 3 | 4 | 5 | 6;
  /** Begins every id, unique on the page; default `derivation`. */
  readonly idPrefix?: string;
  /** Address of a register row relative to the page; undefined for rows without a place of their own. */
  readonly rowHref?: (row: string) => string | undefined;
}

/** Steps as an ordered list with headings, sentences, formulae and the key of their symbols. */
export function renderDerivation(steps: readonly DerivationStep[], options: DerivationOptions = {}): string {
  const { headingLevel = 3, idPrefix = "derivation" } = options;
  const items = steps.map((step) => {
    const id = escapeHtml(`${idPrefix}-${step.id}`);
    return [
      `<li class="derivation-step" id="${id}">`,
      `<h${headingLevel}>${escapeHtml(step.title)}</h${headingLevel}>`,
      `<p>${labelHtml(step.words)}</p>`,
      ...formula(step),
      ...key(step, options),
      "</li>",
    ].join("\n");
  });
  return `<ol class="derivation">\n${items.join("\n")}\n</ol>`;
}

/** Focusable, because a formula wider than the screen scrolls sideways. */
function formula(step: DerivationStep): readonly string[] {
  if (step.tex === "") return [];
  const label = escapeHtml(`Formula: ${step.title}`);
  return [
    `<div class="math-scroll" role="region" tabindex="0" aria-label="${label}">${renderTex(step.tex, { display: true })}</div>`,
  ];
}

function key(step: DerivationStep, options: DerivationOptions): readonly string[] {
  if (step.where.length === 0) return [];
  const rows = step.where.map(
    (entry) => `<div><dt>${symbolHtml(entry.symbol)}</dt><dd>${meaningHtml(entry, options)}</dd></div>`,
  );
  return [`<dl class="derivation-key">`, ...rows, "</dl>"];
}

function meaningHtml({ meaning, row }: DerivationKey, { rowHref }: DerivationOptions): string {
  const text = labelHtml(meaning);
  const href = row === undefined ? undefined : rowHref?.(row);
  return href === undefined ? text : `<a href="${escapeHtml(href)}">${text}</a>`;
}

/** `u1` with its index lowered; anything else as it is. */
function symbolHtml(symbol: string): string {
  const indexed = /^([a-z])(\d+)$/.exec(symbol);
  return indexed === null ? escapeHtml(symbol) : `<i>${indexed[1]}</i><sub>${indexed[2]}</sub>`;
}
