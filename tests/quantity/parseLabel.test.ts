import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { RING_SHAPES } from "../../src/conformers/ringShape.ts";
import { parseLabel } from "../../src/quantity/parseLabel.ts";

describe("parseLabel", () => {
  test("sets the digits after an underscore as a subscript", () => {
    expect(parseLabel("CO_2Me")).toEqual([
      { text: "CO", style: "plain" },
      { text: "2", style: "sub" },
      { text: "Me", style: "plain" },
    ]);
    expect(parseLabel("C_6H_11")).toEqual([
      { text: "C", style: "plain" },
      { text: "6", style: "sub" },
      { text: "H", style: "plain" },
      { text: "11", style: "sub" },
    ]);
  });

  test("sets a charge after a caret as a superscript with a true minus", () => {
    expect(parseLabel("NH_3^+").at(-1)).toEqual({ text: "+", style: "super" });
    expect(parseLabel("CO_2^-").at(-1)).toEqual({ text: "−", style: "super" });
    expect(parseLabel("^13C")[0]).toEqual({ text: "13", style: "super" });
  });

  test("sets letters between asterisks in italics", () => {
    expect(parseLabel("*t*-Bu")).toEqual([
      { text: "t", style: "italic" },
      { text: "-Bu", style: "plain" },
    ]);
  });

  test("raises and lowers the ring oxygen and the commas of a ring shape's symbol", () => {
    const set = (markup: string) => parseLabel(markup).map(({ text, style }) => `${style} ${text}`);
    expect(set("^OS_2")).toEqual(["super O", "plain S", "sub 2"]);
    expect(set("^3^,^OB")).toEqual(["super 3,O", "plain B"]);
    expect(set("B_3_,_O")).toEqual(["plain B", "sub 3,O"]);
    for (const { symbol } of RING_SHAPES) {
      const runs = parseLabel(symbol);
      expect(runs.filter(({ style }) => style === "plain").map(({ text }) => text)).toEqual([
        symbol.replaceAll(/[\^_][O\d,]/g, ""),
      ]);
    }
  });

  test("keeps a lone mark as ordinary text", () => {
    for (const text of ["a_b", "x_Os", "a_,b", "5 * 3", "x^y", "_", "*", "^", "**"])
      expect(parseLabel(text)).toEqual([{ text, style: "plain" }]);
    expect(parseLabel("")).toEqual([]);
  });

  test("never throws, loses no letter and never leaves two neighbours of one style", () => {
    fc.assert(
      fc.property(
        fc.string({ unit: fc.constantFrom("C", "_", "^", "*", "2", "+", "-", "<", "t") }),
        (markup) => {
          const runs = parseLabel(markup);
          const letters = (text: string) => text.replace(/[_^*]/g, "").replace(/[\u2212]/g, "-");
          expect(letters(runs.map((run) => run.text).join(""))).toBe(letters(markup));
          for (let i = 1; i < runs.length; i++) expect(runs[i]!.style).not.toBe(runs[i - 1]!.style);
        },
      ),
    );
  });
});
