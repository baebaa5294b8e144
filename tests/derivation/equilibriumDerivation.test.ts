import { describe, expect, test } from "vitest";
import type { DerivationStep } from "../../src/derivation/DerivationStep.ts";
import { equilibriumDerivation } from "../../src/derivation/equilibriumDerivation.ts";
import { numberContributions } from "../../src/derivation/numberContributions.ts";
import { renderDerivation } from "../../src/derivation/renderDerivation.ts";
import { madeDossier, sampleDossier } from "./madeDossier.ts";

const ROWS = { methyl: [7.28, 0.25], hydroxyl: [2.72, 0.5], pair: [1.5, 0.6], contact: [9.9, 1.3] } as const;

const TWO = madeDossier(ROWS, [
  [{ label: "gauche pair", kind: "vicinal gauche", rows: { pair: 1 } }],
  [
    { label: "Me axial at C1", rows: { methyl: 1 } },
    { label: "OH axial at C3", rows: { hydroxyl: 1 } },
    { label: "excess", kind: "syn-axial", rows: { contact: 1, methyl: -0.5, hydroxyl: -0.5 } },
    { label: "gauche pair", kind: "vicinal gauche", rows: { pair: 1 } },
  ],
]);
const MANY = madeDossier(ROWS, [
  [],
  [{ label: "OH axial at C1", rows: { hydroxyl: 1 } }],
  [{ label: "Me axial at C2", rows: { methyl: 1 } }],
  [
    { label: "OH axial at C1", rows: { hydroxyl: 1 } },
    { label: "Me axial at C2", rows: { methyl: 1 } },
  ],
]);
const EQUAL = madeDossier(
  ROWS,
  [[{ label: "Me axial at C1", rows: { methyl: 1 } }], [{ label: "Me axial at C3", rows: { methyl: 1 } }]],
  { relation: "enantiomeric" },
);

const step = (steps: readonly DerivationStep[], id: string) => steps.find((entry) => entry.id === id)!;

/** A printed number: `14.90` or `2.45\times10^{-3}`. */
const PRINTED = String.raw`-?\d+(?:\.\d+)?(?:\\times10\^\{-?\d+\})?`;
const number = (tex: string) => {
  const [mantissa, exponent] = tex.split("\\times10^");
  return Number(mantissa) * 10 ** Number(exponent?.replace(/[{}]/g, "") ?? 0);
};
const find = (tex: string, pattern: string) => {
  const match = new RegExp(pattern.replaceAll("#", `(${PRINTED})`)).exec(tex);
  if (match === null) throw new Error(`no ${pattern} in ${tex}`);
  return match.slice(1).map(number);
};

describe("The derivation of an equilibrium", () => {
  test("goes from contributions to intervals, one step after another", () => {
    expect(equilibriumDerivation(TWO).map(({ id }) => id)).toEqual([
      "energies",
      "common",
      "difference",
      "uncertainty",
      "constant",
      "populations",
      "interval",
    ]);
  });

  test("prints contributions that add up to the printed sum within rounding", () => {
    const { tex } = step(equilibriumDerivation(TWO), "energies");
    const block = tex.slice(tex.indexOf("\\mathrm{B}"));
    const terms = [...block.matchAll(/([+-]?) ?\\underset\{\(\d+\)\}\{([\d.]+)\}/g)].map(
      ([, sign, size]) => (sign === "-" ? -1 : 1) * Number(size),
    );
    const [total] = find(block, String.raw`\n&= #`);
    expect(terms).toHaveLength(4);
    expect(terms.reduce((sum, term) => sum + term, 0)).toBeCloseTo(total!, 1);
    expect(total).toBeCloseTo(TWO.conformers[1]!.sum_kJ_mol, 2);
  });

  test("says that what both conformers have cancels, by row number", () => {
    const { words, tex } = step(equilibriumDerivation(TWO), "common");
    const row = numberContributions(TWO).find(({ contribution }) => contribution.label === "gauche pair")!;
    expect(words).toContain(`Row ${row.number} is the same in all conformers and cancels`);
    expect(tex).toContain(`\\underset{(${row.number})}{\\cancel{1.50}}`);
    expect(step(equilibriumDerivation(MANY), "common").words).toContain("none cancels");
  });

  test("prints a K that follows from the printed ΔG°, R and T", () => {
    const steps = equilibriumDerivation(TWO);
    const [deltaG] = find(step(steps, "difference").tex, String.raw`&= #\\ \\mathrm\{kJ`);
    const { tex } = step(steps, "constant");
    const [gas, temperature] = find(tex, String.raw`RT &= #\\times #`);
    const [K] = find(tex, String.raw`\) = #`);
    // ΔG° is printed to 0.01 kJ/mol, which is 0.2 % of K near room temperature, and K to three figures.
    expect(Math.exp(-deltaG! / (gas! * temperature!)) / K! - 1).toBeCloseTo(0, 2);
  });

  test("prints populations that follow from the printed K", () => {
    const steps = equilibriumDerivation(TWO);
    const [K] = find(step(steps, "constant").tex, String.raw`\) = #`);
    const { tex } = step(steps, "populations");
    const [first] = find(tex, String.raw`p\(\\mathrm\{A\}\)[^\n]*\n&= #`);
    const [second] = find(tex, String.raw`p\(\\mathrm\{B\}\)[^\n]*\n&= #`);
    expect(first).toBeCloseTo(1 / (1 + K!), 3);
    expect(second).toBeCloseTo(K! / (1 + K!), 3);
  });

  test("prints an uncertainty that follows from the printed shares, shared rows counted once", () => {
    const { tex, where } = step(equilibriumDerivation(TWO), "uncertainty");
    const shares = [...tex.matchAll(/\{(?:\(([\d.]+)\\times ([\d.]+)\)\^2|([\d.]+)\^2)\}/g)].map(
      ([, factor, u, alone]) => (alone === undefined ? Number(factor) * Number(u) : Number(alone)) ** 2,
    );
    const [u] = find(tex, String.raw`u\(\\Delta G\^\\circ\) &= #`);
    expect(shares).toHaveLength(3);
    expect(Math.sqrt(shares.reduce((sum, share) => sum + share, 0))).toBeCloseTo(u!, 1);
    expect(where.map(({ row }) => row)).toEqual(["contact", "hydroxyl", "methyl"]);
    expect(step(equilibriumDerivation(TWO), "uncertainty").words).toContain("pair adds nothing");
  });

  test("shows only the result when the record does not explain its uncertainty", () => {
    const wrong = { ...TWO, equilibria: [{ ...TWO.equilibria[0]!, u_kJ_mol: 9 }] };
    const { tex, words, where } = step(equilibriumDerivation(wrong), "uncertainty");
    expect(tex).not.toContain("u^2");
    expect(tex).toContain("9.00");
    expect(words).toContain("only the result is shown");
    expect(where).toEqual([]);
  });

  test("prints interval ends that follow from ΔG° and u", () => {
    const { tex } = step(equilibriumDerivation(TWO), "interval");
    const [deltaG, factor, u] = find(tex, String.raw`: # \\pm #\\times #`);
    const [low, high] = find(tex, String.raw`&= #\\ \\text\{to\}\\ #\\ \\mathrm`);
    expect(low).toBeCloseTo(deltaG! - factor! * u!, 1);
    expect(high).toBeCloseTo(deltaG! + factor! * u!, 1);
  });

  test("gives half each, exactly and with the reason, to chairs that are equal by symmetry", () => {
    const steps = equilibriumDerivation(EQUAL);
    expect(steps.map(({ id }) => id)).toEqual([
      "energies",
      "symmetry",
      "difference",
      "constant",
      "populations",
    ]);
    expect(step(steps, "symmetry").words).toContain("mirror images");
    expect(step(steps, "difference").tex).toContain("0 \\quad\\text{exactly}");
    expect(step(steps, "constant").tex).toContain("\\exp(0) = 1");
    expect(step(steps, "populations").tex).toContain("&= 0.5");
    const identical = equilibriumDerivation({ ...EQUAL, relation: "identical" });
    expect(step(identical, "symmetry").words).toContain("superimposed");
  });

  test("sums over all states when there are more than two", () => {
    const steps = equilibriumDerivation(MANY);
    const { tex } = step(steps, "populations");
    const [total] = find(tex, String.raw`\n&= #`);
    const [first] = find(tex, String.raw`p\(\\mathrm\{A\}\) &= [^=]*= #`);
    expect(first).toBeCloseTo(1 / total!, 3);
    expect(tex).toContain("K_j");
    const interval = step(steps, "interval");
    expect(interval.words).toContain("ln(p/(1 − p))");
    const [middle, factor, u] = find(interval.tex, String.raw`\\ell\(\\mathrm\{A\}\) &: # \\pm #\\times #`);
    const [low] = find(interval.tex, String.raw`&= #\\ \\text`);
    expect(low).toBeCloseTo(middle! - factor! * u!, 1);
  });

  test("says so when the interval of ΔG° includes zero", () => {
    const close = madeDossier({ a: [0.5, 1] }, [[], [{ label: "x", rows: { a: 1 } }]]);
    expect(step(equilibriumDerivation(close), "interval").words).toContain("unresolved");
  });

  test("is empty without conformers and stops after the sums with one", () => {
    expect(equilibriumDerivation({ ...TWO, conformers: [], equilibria: [] })).toEqual([]);
    const single = { ...TWO, conformers: [TWO.conformers[0]!], equilibria: [] };
    expect(equilibriumDerivation(single).map(({ id }) => id)).toEqual(["energies"]);
  });

  test("writes out the first conformers only when there are very many, and says so", () => {
    const many = madeDossier(
      ROWS,
      Array.from({ length: 16 }, (_, index) => [{ label: `state ${index}`, rows: { hydroxyl: index } }]),
    );
    const steps = equilibriumDerivation(many);
    expect(step(steps, "energies").words).toContain("Of 16 conformers the 6 most stable");
    expect(step(steps, "populations").tex).toContain("\\cdots");
  });
});

describe("Numbered contributions", () => {
  test("share a number across conformers when label and value are the same", () => {
    const rows = numberContributions(TWO);
    expect(rows.map(({ number }) => number)).toEqual([1, 2, 3, 4]);
    expect(rows.find(({ contribution }) => contribution.label === "gauche pair")!.conformers).toEqual([
      "A",
      "B",
    ]);
  });

  test("count twice where one conformer has the same contribution twice", () => {
    const twice = { label: "same", rows: { methyl: 1 } };
    const rows = numberContributions(madeDossier(ROWS, [[twice, twice], [twice]]));
    expect(rows.map(({ conformers }) => conformers)).toEqual([["A", "B"], ["A"]]);
  });
});

describe("A rendered derivation", () => {
  test.each([
    ["two conformers", TWO],
    ["four conformers", MANY],
    ["equal chairs", EQUAL],
    ["the sample record", sampleDossier()],
  ])("sets every formula for %s, with headings of the asked level and unique ids", (_, dossier) => {
    const html = renderDerivation(equilibriumDerivation(dossier), { headingLevel: 4, idPrefix: "sx" });
    const ids = [...html.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(html).toContain("<h4>");
    expect(html).toContain("<math");
    expect(html).not.toMatch(/katex-error|undefined|NaN/);
  });

  test("keeps an author's label from acting as TeX or HTML", () => {
    const label = "\\href{x}{y} $ & % # { } ~ ^ _ <b> *t*-Bu";
    const hostile = madeDossier(ROWS, [[], [{ label, rows: { methyl: 1 } }]]);
    const html = renderDerivation(equilibriumDerivation(hostile));
    expect(html).not.toMatch(/<b>|href=/);
    expect(html).toContain("&lt;b&gt; <i>t</i>-Bu");
  });

  test("links register rows where the caller knows their place", () => {
    const html = renderDerivation(equilibriumDerivation(TWO), {
      rowHref: (row) => (row === "methyl" ? "../register/index.html#methyl" : undefined),
    });
    expect(html).toContain('<a href="../register/index.html#methyl">methyl</a>');
    expect(html).not.toContain(">hydroxyl</a>");
  });

  test("is the same every time", () => {
    const once = renderDerivation(equilibriumDerivation(MANY));
    expect(renderDerivation(equilibriumDerivation(MANY))).toBe(once);
  });
});
