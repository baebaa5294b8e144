import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { MAXIMUM_CONFORMERS } from "../../src/conformers/enumerateConformers.ts";
import { ENERGY_RULES } from "../../src/energetics/rules/index.ts";
import { escapeHtml } from "../../src/quantity/escapeHtml.ts";
import { GAS_CONSTANT, NORMAL_95 } from "../../src/quantity/units.ts";
import { MEDIUM_CLASSES } from "../../src/register/Register.ts";
import { methodsPage } from "../../src/site/pages/methodsPage.ts";

const PAGE = methodsPage().replaceAll("\u00a0", " ");
const source = (file: string) => readFileSync(new URL(`../../src/${file}`, import.meta.url), "utf8");

/**
 * The constants stand in the rules, where they are used, and in words on the page. Whoever changes one changes
 * the other: the code of the rule is the key, the words are what a reviewer relies on.
 */
const HELD: readonly (readonly [file: string, code: string, words: string])[] = [
  ["energetics/rowParameter.ts", "OTHER_MEDIUM = 0.2;", "nearest class of medium; 0.2 added"],
  ["energetics/rowParameter.ts", "ASSUMED_TEMPERATURE = 298.15;", "are taken at 298.15 K"],
  ["energetics/rowParameter.ts", "UNKNOWN_ENTROPY = 1e-3;", "1 cal/(mol K) of doubt"],
  ["energetics/standIn.ts", "REFERENCE_TEMPERATURE = 298.15;", "and stand-ins, are taken at 298.15 K"],
  [
    "energetics/heteroringStandIn.ts",
    "{ sameClass: 0.3, otherState: 0.3, otherRing: 0.4, strongDipole: 1.0, allylic: 1.5 }",
    "the cyclohexane value, 0.4 added, or 1.0 for a polar group",
  ],
  [
    "energetics/heteroringStandIn.ts",
    "{ share: 0.6, u: 0.5 }",
    "0.6 of the cyclohexane value stands in, 0.5 added",
  ],
  ["energetics/heteroringStandIn.ts", "0.15 * Math.abs(value)", "0.4 and 15 % of the value added"],
  ["energetics/rules/nitrogenSubstituent.ts", "LOAN = 0.5;", "nitrogen of the same ring, 0.5 added"],
  ["energetics/rules/nitrogenSubstituent.ts", "1.5 ± 1.2 kcal/mol", "else 1.5 ± 1.2"],
  ["energetics/pairParameter.ts", "LOAN = 0.25;", "0.25 added for each group that differs"],
  [
    "energetics/rules/vicinalGauche.ts",
    "polar === 0 ? [0.9, 0.4] : polar === 1 ? [0.45, 0.4] : [0.5, 0.8]",
    "0.9 ± 0.4, 0.45 ± 0.4 with one polar group, 0.5 ± 0.8 with two",
  ],
  [
    "energetics/rules/synAxial.ts",
    "polar === 0 ? [2.0, 0.7] : polar === 1 ? [1.3, 0.7] : donor ? [0.7, 1.5] : [2.0, 1.5]",
    "2.0 ± 0.7, 1.3 ± 0.7 with one polar group, 2.0 ± 1.5 with two, 0.7 ± 1.5 where",
  ],
  ["energetics/rules/geminal.ts", "flat ? 1.0 : polar ? 0.5 : 0.2", "0.2, 0.5 with a polar group, 1.0 with"],
  ["energetics/rules/additivityAllowance.ts", "ACROSS = 0.5;", "0.5 for each pair that is 1,4 and diaxial"],
  ["energetics/rules/additivityAllowance.ts", "BESIDE = 0.2;", "0.2 for each that is 1,3 and diequatorial"],
  ["dossier/analysis/analyseConformers.ts", "RESIDUAL = 0.2;", "with a doubt of 0.2 where symmetry"],
  [
    "dossier/analysis/analyseConformers.ts",
    "{ fused: 0.4, bridged: 1.0 }",
    "0.4 kcal/mol of doubt, 1.0 where a bridge",
  ],
  ["dossier/analysis/analyseConformers.ts", "MECHANICS_DOUBT = 1.5;", "with 1.5 kcal/mol of doubt"],
  [
    "dossier/analysis/analyseConformers.ts",
    "TERT_BUTYL_EXCESS = 1.4;",
    "1.4 kcal/mol is added for each axial tert-butyl",
  ],
  ["dossier/analysis/isStrained.ts", "STRAIN_LIMIT = 16.7;", "more than 4 kcal/mol of contributions"],
];

describe("The methods page", () => {
  test.each(HELD)("says what %s does: %s", (file, code, words) => {
    // Line breaks of the formatter do not matter.
    expect(source(file).replace(/\s+/g, " ")).toContain(code);
    expect(PAGE).toContain(words);
  });

  test("names every rule of the energy model, its constants and the order of media", () => {
    for (const { title } of ENERGY_RULES) expect(PAGE).toContain(`<dt>${escapeHtml(title)}</dt>`);
    expect(PAGE).toContain(MEDIUM_CLASSES.join(", "));
    expect(PAGE).toContain(`more than ${MAXIMUM_CONFORMERS} conformers`);
    expect(PAGE).toContain(`${NORMAL_95.toFixed(2)} standard uncertainties`);
    expect((GAS_CONSTANT * 1000).toFixed(9)).toBe("8.314462618");
    expect(PAGE).toContain("8.314\\,462\\,618");
  });
});
