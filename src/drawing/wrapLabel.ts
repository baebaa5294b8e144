import { labelRuns } from "./labelRuns.ts";

/** Breaks a conformer's label after its commas into lines no wider than asked. */
export function wrapLabel(label: string, size: number, width: number): readonly string[] {
  const lines: string[] = [];
  for (const piece of label.split(/(?<=[,;])/)) {
    const line = lines.at(-1);
    const last = labelRuns(`${line ?? ""}${piece}`, { size, ink: "ink" }).at(-1);
    if (line === undefined || (last !== undefined && last.x + last.width > width))
      lines.push(piece.trimStart());
    else lines[lines.length - 1] = line + piece;
  }
  return lines;
}
