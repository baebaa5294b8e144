import type { Box, SceneItem } from "./Scene.ts";

/** The smallest box that holds every item, strokes included; null when there is none. */
export function boundsOf(items: readonly SceneItem[]): Box | null {
  if (items.length === 0) return null;
  const boxes = items.map(boxOf);
  return {
    left: Math.min(...boxes.map((box) => box.left)),
    top: Math.min(...boxes.map((box) => box.top)),
    right: Math.max(...boxes.map((box) => box.right)),
    bottom: Math.max(...boxes.map((box) => box.bottom)),
  };
}

function boxOf(item: SceneItem): Box {
  switch (item.kind) {
    case "text":
      return item.box;
    case "arc": {
      const reach = item.radius + item.width / 2;
      const { x, y } = item.centre;
      return { left: x - reach, top: y - reach, right: x + reach, bottom: y + reach };
    }
    case "line": {
      const half = Math.max(item.width, item.endWidth) / 2;
      return around([item.from, item.to], half);
    }
    case "polygon":
      return around(item.points, item.closed ? 0 : item.width / 2);
  }
}

function around(points: readonly { readonly x: number; readonly y: number }[], margin: number): Box {
  const xs = points.map((point) => point.x);
  const ys = points.map((point) => point.y);
  return {
    left: Math.min(...xs) - margin,
    top: Math.min(...ys) - margin,
    right: Math.max(...xs) + margin,
    bottom: Math.max(...ys) + margin,
  };
}
