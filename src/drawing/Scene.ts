/**
 * A drawing as plain data. Lengths are CSS pixels at natural size, x to the right, y downwards as in SVG.
 * Everything that can be wrong in a figure is measured here, before any SVG exists.
 */
export interface Scene {
  /** Short, for the `title` element. */
  readonly title: string;
  /** What the figure shows, in sentences, for readers who do not see it. */
  readonly description: string;
  readonly bounds: Box;
  readonly items: readonly SceneItem[];
}

export type SceneItem = SceneLine | SceneArc | ScenePolygon | SceneText;

/** Colour by meaning; the palette gives each its value on either paper. */
export type Ink = "ink" | "muted" | "axial" | "equatorial" | "rule" | "paper";

/** What an item stands for, so that tests and later tools need not guess it from its shape. */
export type Part =
  | "ring bond"
  | "axial bond"
  | "equatorial bond"
  | "group bond"
  | "hydrogen bond"
  | "bond"
  | "wedge"
  | "hash"
  | "atom label"
  | "group label"
  | "hydrogen label"
  | "locant"
  | "orientation cue"
  | "conformer label"
  | "ring caption"
  | "population"
  | "forward arrow"
  | "reverse arrow"
  | "arrow note"
  | "note"
  | "axis"
  | "axis title"
  | "tick label"
  | "reference line"
  | "reference label"
  | "band"
  | "curve"
  | "curve label"
  | "interval"
  | "dot"
  | "row label";

interface Common {
  readonly part: Part;
  /** Atoms concerned, in input order numbering; empty where there are none. */
  readonly atoms: readonly number[];
  /** The conformer or the ring the item belongs to: `A/0`; empty where it belongs to none. */
  readonly group: string;
}

export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export interface SceneLine extends Common {
  readonly kind: "line";
  readonly from: Point;
  readonly to: Point;
  /** Stroke widths at both ends; a line that tapers has two different ones. */
  readonly width: number;
  readonly endWidth: number;
  readonly ink: Ink;
  /** Lengths of dash and gap; empty for a solid line. */
  readonly dash: readonly number[];
  /** Depth of both ends, towards the viewer; null in flat drawings. */
  readonly depth: readonly [number, number] | null;
}

/** A circular arc or, from 0° to 360°, a circle. Angles in degrees, clockwise on screen from the x axis. */
export interface SceneArc extends Common {
  readonly kind: "arc";
  readonly centre: Point;
  readonly radius: number;
  readonly startAngle: number;
  readonly endAngle: number;
  readonly width: number;
  readonly ink: Ink;
  readonly dash: readonly number[];
  /** Filled with this ink; null for an outline. */
  readonly fill: Ink | null;
}

export interface ScenePolygon extends Common {
  readonly kind: "polygon";
  readonly points: readonly Point[];
  /** A closed shape is filled; an open one is a stroked polyline. */
  readonly closed: boolean;
  readonly ink: Ink;
  readonly opacity: number;
  readonly width: number;
  readonly dash: readonly number[];
}

export type TextAnchor = "start" | "middle" | "end";

/** A piece of text with one style; offsets are from the start of the whole text and from its baseline. */
export interface TextRun {
  readonly text: string;
  readonly x: number;
  /** Downwards: negative for a superscript. */
  readonly dy: number;
  readonly size: number;
  readonly width: number;
  readonly italic: boolean;
  readonly bold: boolean;
  readonly ink: Ink;
}

export interface SceneText extends Common {
  readonly kind: "text";
  readonly runs: readonly TextRun[];
  /** Anchor point on the baseline. */
  readonly at: Point;
  readonly anchor: TextAnchor;
  /** Space the letters take: from the height of capitals, or of a superscript, to the baseline or a subscript. */
  readonly box: Box;
}
