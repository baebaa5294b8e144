import { labelRuns } from "./labelRuns.ts";
import type { Ink, TextRun } from "./Scene.ts";

/**
 * A conformer's label with the letters a and e in their accents: `1e,4e`, `1a(Me)`, `4a-a/e`, `8a–1 e`. They
 * stand after a locant, a hyphen, a stroke, a space or ψ, so the same letters in a locant or a group's name are left
 * alone.
 */
export function conformerLabelRuns(label: string, size: number): readonly TextRun[] {
  const runs: TextRun[] = [];
  let x = 0;
  for (const piece of label.split(/(?<=[-ψ/ ]|\d′*)([ae])(?![A-Za-z–-])/)) {
    if (piece === "") continue;
    const ink: Ink = piece === "a" ? "axial" : piece === "e" ? "equatorial" : "ink";
    for (const run of labelRuns(piece, { size, ink, bold: ink !== "ink" })) {
      runs.push({ ...run, x: x + run.x });
    }
    const last = runs.at(-1)!;
    x = last.x + last.width;
  }
  return runs;
}
