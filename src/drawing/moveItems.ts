import type { Box, Point, SceneItem } from "./Scene.ts";

/** The same items shifted. */
export function moveItems(items: readonly SceneItem[], dx: number, dy: number): readonly SceneItem[] {
  const point = ({ x, y }: Point): Point => ({ x: x + dx, y: y + dy });
  const box = ({ left, top, right, bottom }: Box): Box => ({
    left: left + dx,
    top: top + dy,
    right: right + dx,
    bottom: bottom + dy,
  });
  return items.map((item): SceneItem => {
    if (item.kind === "line") return { ...item, from: point(item.from), to: point(item.to) };
    if (item.kind === "arc") return { ...item, centre: point(item.centre) };
    if (item.kind === "polygon") return { ...item, points: item.points.map(point) };
    return { ...item, at: point(item.at), box: box(item.box) };
  });
}
