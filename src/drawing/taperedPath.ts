import type { SceneLine } from "./Scene.ts";
import { svgNumber } from "./svgNumber.ts";

/** Outline of a line whose width changes evenly from one end to the other, with round ends that join to others. */
export function taperedPath({ from, to, width, endWidth }: SceneLine): string {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  const across = { x: -(to.y - from.y) / length, y: (to.x - from.x) / length };
  const corner = (end: typeof from, half: number) =>
    `${svgNumber(end.x + across.x * half)} ${svgNumber(end.y + across.y * half)}`;
  const [start, end] = [width / 2, endWidth / 2];
  const cap = (half: number) => `A${svgNumber(half)} ${svgNumber(half)} 0 0 1 `;
  return (
    `M${corner(from, -start)}L${corner(to, -end)}${cap(end)}${corner(to, end)}` +
    `L${corner(from, start)}${cap(start)}${corner(from, -start)}Z`
  );
}
