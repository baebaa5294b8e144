import { describe, expect, test } from "vitest";
import { escapeHtml } from "../../src/quantity/escapeHtml.ts";
import { labelHtml } from "../../src/quantity/labelHtml.ts";
import { labelTex } from "../../src/quantity/labelTex.ts";
import { labelText } from "../../src/quantity/labelText.ts";

describe("A chemical label", () => {
  test.each([
    ["CO_2Me", "CO<sub>2</sub>Me", "CO2Me", "\\text{CO}_{\\text{2}}\\text{Me}"],
    ["*t*-Bu", "<i>t</i>-Bu", "t-Bu", "\\textit{t}\\text{-Bu}"],
    ["NH_3^+", "NH<sub>3</sub><sup>+</sup>", "NH3+", "\\text{NH}_{\\text{3}}{}^{\\text{+}}"],
  ])("%s is set alike in HTML, plain text and TeX", (markup, html, text, tex) => {
    expect(labelHtml(markup)).toBe(html);
    expect(labelText(markup)).toBe(text);
    expect(labelTex(markup)).toBe(tex);
  });

  test("cannot carry HTML", () => {
    expect(labelHtml('<b>_2"')).toBe("&lt;b&gt;<sub>2</sub>&quot;");
    expect(escapeHtml("a & 'b'")).toBe("a &amp; &#39;b&#39;");
  });
});
