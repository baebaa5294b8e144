import { type Dom, registerWindow, SVG } from "@svgdotjs/svg.js";
import { createSVGWindow } from "svgdom";
import { PALETTE } from "./palette.ts";
import type { Ink, Scene, SceneArc, SceneItem, SceneLine, ScenePolygon, SceneText } from "./Scene.ts";
import { svgNumber } from "./svgNumber.ts";
import { taperedPath } from "./taperedPath.ts";

/** One window for the whole process; every drawing gets an element tree of its own, so nothing is carried over. */
const window = createSVGWindow();
registerWindow(window as never, window.document as never);

const FONT_FAMILY = "'Source Sans 3 Variable', 'Source Sans 3', sans-serif";

/**
 * Turns a scene into an SVG element as text; the only place that knows svg.js.
 *
 * The same scene and prefix give the same bytes whatever was drawn before: no automatic id is used, and numbers
 * have at most two decimals. Colours are custom properties of the page with the light palette as fallback.
 *
 * @param idPrefix - begins every id of the drawing, unique on the page: `fig-ks-07-equilibrium`.
 */
export function renderScene(scene: Scene, idPrefix: string): string {
  if (!/^[a-z][a-z0-9-]*$/.test(idPrefix)) {
    throw new RangeError(`an id prefix has lower-case letters, digits and hyphens only, got "${idPrefix}"`);
  }
  const { left, top, right, bottom } = scene.bounds;
  const [width, height] = [svgNumber(right - left), svgNumber(bottom - top)];
  const root = SVG();
  // svg.js announces its own name space, which no element of ours is in.
  for (const name of ["version", "xmlns:xlink", "xmlns:svgjs"]) root.attr(name, null);
  root.attr({
    viewBox: `${svgNumber(left)} ${svgNumber(top)} ${width} ${height}`,
    width,
    height,
    role: "img",
    "aria-labelledby": `${idPrefix}-title ${idPrefix}-desc`,
    "font-family": FONT_FAMILY,
    class: "figure-drawing",
  });
  root.element("title").attr("id", `${idPrefix}-title`).words(scene.title);
  root.element("desc").attr("id", `${idPrefix}-desc`).words(scene.description);
  for (const item of scene.items) renderItem(root, item);
  return root.svg();
}

function renderItem(parent: Dom, item: SceneItem): void {
  if (item.kind === "line") renderLine(parent, item);
  else if (item.kind === "arc") renderArc(parent, item);
  else if (item.kind === "polygon") renderPolygon(parent, item);
  else renderText(parent, item);
}

function renderLine(parent: Dom, line: SceneLine): void {
  if (line.width !== line.endWidth) {
    parent.element("path").attr({ d: taperedPath(line), fill: colour(line.ink) });
    return;
  }
  parent.element("line").attr({
    x1: svgNumber(line.from.x),
    y1: svgNumber(line.from.y),
    x2: svgNumber(line.to.x),
    y2: svgNumber(line.to.y),
    ...stroke(line.ink, line.width, line.dash),
    "stroke-linecap": "round",
  });
}

function renderArc(parent: Dom, arc: SceneArc): void {
  const { centre, radius, startAngle, endAngle } = arc;
  const paint = {
    fill: arc.fill === null ? "none" : colour(arc.fill),
    ...(arc.width > 0 ? stroke(arc.ink, arc.width, arc.dash) : {}),
  };
  if (endAngle - startAngle >= 360) {
    const [cx, cy, r] = [svgNumber(centre.x), svgNumber(centre.y), svgNumber(radius)];
    parent.element("circle").attr({ cx, cy, r, ...paint });
    return;
  }
  const end = (angle: number) =>
    `${svgNumber(centre.x + radius * Math.cos((angle * Math.PI) / 180))} ${svgNumber(centre.y + radius * Math.sin((angle * Math.PI) / 180))}`;
  const large = endAngle - startAngle > 180 ? 1 : 0;
  const r = svgNumber(radius);
  parent.element("path").attr({ d: `M${end(startAngle)}A${r} ${r} 0 ${large} 1 ${end(endAngle)}`, ...paint });
}

function renderPolygon(parent: Dom, polygon: ScenePolygon): void {
  const points = polygon.points.map(({ x, y }) => `${svgNumber(x)},${svgNumber(y)}`).join(" ");
  if (polygon.closed) {
    const faint = polygon.opacity < 1 ? { "fill-opacity": svgNumber(polygon.opacity) } : {};
    parent.element("polygon").attr({ points, fill: colour(polygon.ink), ...faint });
    return;
  }
  parent.element("polyline").attr({
    points,
    fill: "none",
    ...stroke(polygon.ink, polygon.width, polygon.dash),
    "stroke-linejoin": "round",
    "stroke-linecap": polygon.dash.length > 0 ? "butt" : "round",
  });
}

function renderText(parent: Dom, text: SceneText): void {
  const [first] = text.runs;
  if (first === undefined) return;
  const base = { size: Math.max(...text.runs.map((run) => run.size)), ink: first.ink };
  const element = parent.element("text").attr({
    x: svgNumber(text.at.x),
    y: svgNumber(text.at.y),
    "font-size": svgNumber(base.size),
    fill: colour(base.ink),
    ...(text.anchor === "start" ? {} : { "text-anchor": text.anchor }),
  });
  let baseline = 0;
  for (const run of text.runs) {
    const shift = run.dy - baseline;
    baseline = run.dy;
    const style = {
      ...(shift === 0 ? {} : { dy: svgNumber(shift) }),
      ...(run.size === base.size ? {} : { "font-size": svgNumber(run.size) }),
      ...(run.italic ? { "font-style": "italic" } : {}),
      ...(run.bold ? { "font-weight": "600" } : {}),
      ...(run.ink === base.ink ? {} : { fill: colour(run.ink) }),
    };
    if (text.runs.length === 1) element.words(run.text).attr(style);
    else element.element("tspan").words(run.text).attr(style);
  }
}

function stroke(ink: Ink, width: number, dash: readonly number[]): Record<string, string> {
  return {
    stroke: colour(ink),
    "stroke-width": svgNumber(width),
    ...(dash.length > 0 ? { "stroke-dasharray": dash.map(svgNumber).join(" ") } : {}),
  };
}

function colour(ink: Ink): string {
  return `var(--${ink}, ${PALETTE.light[ink]})`;
}
