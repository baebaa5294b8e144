import { describe, expect, test } from "vitest";
import { labelText } from "../../src/quantity/labelText.ts";
import { nameMarkup } from "../../src/quantity/nameMarkup.ts";

describe("Systematic names are set as the trade sets them (common practice)", () => {
  test.each([
    ["trans-4-aminocyclohexan-1-ol", "*trans*-4-aminocyclohexan-1-ol"],
    [
      "(1R,2S,5R)-5-methyl-2-(propan-2-yl)cyclohexan-1-ol",
      "(1*R*,2*S*,5*R*)-5-methyl-2-(propan-2-yl)cyclohexan-1-ol",
    ],
    ["cis-1-tert-butyl-4-methoxycyclohexane", "*cis*-1-*tert*-butyl-4-methoxycyclohexane"],
    ["N-cyclohexylcyclohexanamine", "*N*-cyclohexylcyclohexanamine"],
    ["N,N-dimethylpiperidinium", "*N*,*N*-dimethylpiperidinium"],
    ["1-phenylcyclohexan-1-ol", "1-phenylcyclohexan-1-ol"],
    ["transferase", "transferase"],
  ])("%s", (name, markup) => {
    expect(nameMarkup(name)).toBe(markup);
    expect(labelText(nameMarkup(name))).toBe(name);
  });
});
