import { parseLabel } from "../quantity/parseLabel.ts";
import { CAP_HEIGHT } from "./measures.ts";
import type { Ink, TextRun } from "./Scene.ts";
import { type FaceStyle, textWidth } from "./textWidth.ts";

export interface LabelStyle {
  /** Type size in px. */
  readonly size: number;
  readonly ink: Ink;
  readonly bold?: boolean;
}

/** Sub- and superscripts: size, and shift of the baseline, as shares of the type size. */
const SCRIPT_SIZE = 0.72;
const SUBSCRIPT_DROP = 0.17;
/** The top of a superscript stands this much above the capitals. */
const SUPERSCRIPT_RISE = 0.12;

/**
 * The markup of a chemical label (`CO_2Me`, `NH_3^+`, `*t*-Bu`) as pieces of text with positions, from the start
 * of the label and from its baseline.
 */
export function labelRuns(markup: string, { size, ink, bold = false }: LabelStyle): readonly TextRun[] {
  let x = 0;
  return parseLabel(markup).map(({ text, style }): TextRun => {
    const script = style === "sub" || style === "super";
    const runSize = script ? size * SCRIPT_SIZE : size;
    const raise = CAP_HEIGHT * (size - runSize) + SUPERSCRIPT_RISE * size;
    const dy = style === "sub" ? SUBSCRIPT_DROP * size : style === "super" ? -raise : 0;
    const face: FaceStyle = style === "italic" ? "italic" : bold ? "semibold" : "regular";
    const width = textWidth(text, runSize, face);
    const run = { text, x, dy, size: runSize, width, italic: style === "italic", bold, ink };
    x += width;
    return run;
  });
}
