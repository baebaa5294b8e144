import { describe, expect, test } from "vitest";
import { contrastRatio } from "../../src/drawing/contrastRatio.ts";
import { PALETTE } from "../../src/drawing/palette.ts";

describe("Contrast", () => {
  // WCAG 2.2: black on white is 21 : 1 by the definition, a colour on itself 1 : 1; #767676 is the usual example of
  // the lightest grey that passes 4.5 : 1 on white, 4.54 : 1 (from memory).
  test("is that of WCAG (source: WCAG 2.2, contrast ratio and relative luminance)", () => {
    expect(contrastRatio("#000000", "#ffffff")).toBeCloseTo(21, 10);
    expect(contrastRatio("#a8471a", "#a8471a")).toBe(1);
    expect(contrastRatio("#767676", "#ffffff")).toBeCloseTo(4.54, 2);
  });
});

describe.each(["light", "dark"] as const)("On %s paper", (name) => {
  const paper = PALETTE[name];

  test.each(["ink", "muted", "axial", "equatorial"] as const)(
    "%s is 4.5 : 1 or more, enough for text",
    (ink) => {
      expect(contrastRatio(paper[ink], paper.paper)).toBeGreaterThanOrEqual(4.5);
    },
  );

  test.each(["axial", "equatorial"] as const)(
    "%s strokes are 3 : 1 or more, also on the tint of a band",
    (ink) => {
      const tinted = mix(paper[ink], paper.paper, 0.15);
      expect(contrastRatio(paper[ink], paper.paper)).toBeGreaterThanOrEqual(3);
      expect(contrastRatio(paper[ink], tinted)).toBeGreaterThanOrEqual(3);
    },
  );
});

function mix(a: string, b: string, share: number): string {
  const channel = (colour: string, at: number) => Number.parseInt(colour.slice(at, at + 2), 16);
  return `#${[1, 3, 5]
    .map((at) => Math.round(share * channel(a, at) + (1 - share) * channel(b, at)))
    .map((value) => value.toString(16).padStart(2, "0"))
    .join("")}`;
}
