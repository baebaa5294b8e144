import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { renderTex } from "../../src/derivation/renderTex.ts";
import { TexError } from "../../src/derivation/TexError.ts";
import { labelTex } from "../../src/quantity/labelTex.ts";

describe("A formula", () => {
  test("is set for the eye and for assistive technology", () => {
    const html = renderTex("K = \\exp(-x)", { display: false });
    expect(html).toContain("katex-html");
    expect(html).toContain("<math");
  });

  test("that is wrong throws with its position", () => {
    const run = () => renderTex("x + \\nope", { display: false });
    expect(run).toThrow(TexError);
    expect(run).toThrow(/Undefined control sequence/);
    try {
      run();
    } catch (error) {
      expect((error as TexError).position).toBe(4);
    }
  });

  test.each(["\\href{u}{x}", "\\url{u}", "\\includegraphics{a}", "\\htmlClass{a}{x}", "\\htmlStyle{a:b}{x}"])(
    "may not use %s",
    (tex) => {
      expect(() => renderTex(tex, { display: false })).toThrow(TexError);
    },
  );

  test("forgets macros of the formula before", () => {
    renderTex("\\gdef\\mine{1}\\mine", { display: false });
    expect(() => renderTex("\\mine", { display: false })).toThrow(TexError);
  });
});

describe("A label in a formula", () => {
  test("can be set whatever its text is, and shows nothing but text", () => {
    const label = fc.oneof(
      fc.string({ unit: "grapheme" }),
      fc.string({
        unit: fc.constantFrom("\\", "{", "}", "$", "%", "&", "#", "_", "^", "~", "*", "2", "+", "t", " "),
      }),
    );
    fc.assert(
      fc.property(label, (markup) => {
        const html = renderTex(`x ${labelTex(markup)} y`, { display: false });
        expect(html).not.toMatch(/href|style="color/);
      }),
      { numRuns: 300 },
    );
  });

  test("keeps Greek letters, primes and true minus signs", () => {
    expect(() => renderTex(labelTex("α-Me at C2′, −1 ± 2 é"), { display: true })).not.toThrow();
  });
});
