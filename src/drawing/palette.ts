import type { Ink } from "./Scene.ts";

/** The colours of one paper. */
export type Paper = Readonly<Record<Ink, string>>;

/**
 * The house colours, for figures and pages alike. Figures refer to them as custom properties of the same name
 * (`--ink`, `--axial`) with the light value as fallback, so that a figure in a page follows its paper.
 *
 * Contrast on the paper, by the formula of WCAG 2.2, is computed in the tests: text 4.5 : 1, strokes 3 : 1.
 * `rule` is for hairlines that carry no meaning.
 */
export const PALETTE: Readonly<Record<"light" | "dark", Paper>> = {
  light: {
    paper: "#fbfaf7",
    ink: "#1c1b1a",
    muted: "#5d5952",
    axial: "#a8471a",
    equatorial: "#0b6a70",
    rule: "#c9c4ba",
  },
  dark: {
    paper: "#171614",
    ink: "#e9e6df",
    muted: "#a8a298",
    axial: "#e08a5b",
    equatorial: "#5fbcc0",
    rule: "#4a4741",
  },
};
