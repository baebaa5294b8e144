import type { SceneLine } from "./Scene.ts";
import type { Stroke } from "./Stroke.ts";

/** A piece of a stroke as shares of its length. */
export type Span = readonly [number, number];

/** Pieces shorter than this, in px, are specks and are left out. */
const SPECK = 1.5;

/** What is left of a stroke when the spans given are taken out, as lines with the widths and depths they have there. */
export function cutStroke(stroke: Stroke, gaps: readonly Span[], group: string): readonly SceneLine[] {
  const length = Math.hypot(stroke.to.x - stroke.from.x, stroke.to.y - stroke.from.y);
  const at = (share: number) => ({
    x: stroke.from.x + share * (stroke.to.x - stroke.from.x),
    y: stroke.from.y + share * (stroke.to.y - stroke.from.y),
  });
  const between = (share: number, a: number, b: number) => a + share * (b - a);
  const lines: SceneLine[] = [];
  let start = 0;
  for (const [from, to] of [...gaps].sort((a, b) => a[0] - b[0]).concat([[1, 1]])) {
    const end = Math.min(1, from);
    if ((end - start) * length > SPECK) {
      lines.push({
        kind: "line",
        part: stroke.part,
        atoms: stroke.atoms,
        group,
        from: at(start),
        to: at(end),
        width: between(start, stroke.width, stroke.endWidth),
        endWidth: between(end, stroke.width, stroke.endWidth),
        ink: stroke.ink,
        dash: [],
        depth: [
          between(start, stroke.from.depth, stroke.to.depth),
          between(end, stroke.from.depth, stroke.to.depth),
        ],
      });
    }
    start = Math.max(start, to);
  }
  return lines;
}
