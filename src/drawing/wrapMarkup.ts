import { labelRuns } from "./labelRuns.ts";

/** Breaks words, set with label markup, into lines no wider than asked; a single longer word keeps its line. */
export function wrapMarkup(markup: string, size: number, width: number): readonly string[] {
  const lines: string[] = [];
  for (const word of markup.split(" ").filter((part) => part !== "")) {
    const line = lines.at(-1);
    const longer = line === undefined ? word : `${line} ${word}`;
    const last = labelRuns(longer, { size, ink: "ink" }).at(-1);
    if (line === undefined || (last !== undefined && last.x + last.width > width)) lines.push(word);
    else lines[lines.length - 1] = longer;
  }
  return lines;
}
