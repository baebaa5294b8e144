/** How one piece of a chemical label is set. */
export type RunStyle = "plain" | "sub" | "super" | "italic";

/** A piece of a chemical label with one style; neighbouring runs differ in style. */
export interface Run {
  readonly text: string;
  readonly style: RunStyle;
}

/**
 * Digits after `_`, digits and a charge sign after `^`, and letters, digits or hyphens between two `*`. Symbols of ring
 * shapes also raise and lower the ring oxygen and the comma between two locants: `^OS_2`, `^3^,^OB`.
 * Anything else, such as a lone `_` or `*`, is ordinary text: a label is never an error.
 */
const MARK = /_(\d+|O(?![a-z])|,(?=_))|\^(\d*[+\u2212-]|\d+|O(?![a-z])|,(?=\^))|\*([\p{L}\p{N}-]+)\*/gu;

/**
 * Splits the markup of a chemical label into runs: `CO_2Me`, `NH_3^+`, `*t*-Bu`.
 * The only reader of this markup, so that drawings, tables and formulae set a label alike.
 * A minus after `^` becomes the true minus sign; an empty label gives no run.
 */
export function parseLabel(markup: string): readonly Run[] {
  const runs: Run[] = [];
  let end = 0;
  for (const match of markup.matchAll(MARK)) {
    add(runs, markup.slice(end, match.index), "plain");
    const [whole, sub, sup, italic] = match;
    if (sub !== undefined) add(runs, sub, "sub");
    else if (sup !== undefined) add(runs, sup.replace("-", "\u2212"), "super");
    else add(runs, italic ?? "", "italic");
    end = match.index + whole.length;
  }
  add(runs, markup.slice(end), "plain");
  return runs;
}

/** Appends text, joined to the last run when the style is the same. */
function add(runs: Run[], text: string, style: RunStyle): void {
  if (text === "") return;
  const last = runs.at(-1);
  if (last?.style === style) runs[runs.length - 1] = { text: last.text + text, style };
  else runs.push({ text, style });
}
