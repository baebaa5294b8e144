import { describe, expect, test } from "vitest";
import { renderFigure } from "../../src/drawing/renderFigure.ts";
import { renderScene } from "../../src/drawing/renderScene.ts";
import { seriesScene } from "../../src/drawing/seriesScene.ts";
import { sampleDossier } from "./makeDossier.ts";
import { systems } from "./systems.ts";
import { variants } from "./variants.ts";

/** Look at the picture before accepting a change. */
const keep = (svg: string, name: string) =>
  expect(`${svg}\n`).toMatchFileSnapshot(`../snapshots/${name}.svg`);

describe("Drawings kept for comparison", () => {
  test.each(["equilibrium", "wedge", "temperature"] as const)("sample: %s", async (name) => {
    await keep(renderFigure(sampleDossier, name).svg, `sample-${name}`);
  });

  test("sample: one chair with hydrogens", async () => {
    await keep(renderFigure(sampleDossier, "chair", { conformer: "B", hydrogens: true }).svg, "sample-chair");
  });

  test.each([
    ["1,2-diequatorial long", "diequatorial"],
    ["1,3-dioxane", "dioxane"],
    ["two rings", "two-rings"],
  ])("%s", async (variant, name) => {
    await keep(renderFigure(variants[variant]!, "equilibrium").svg, name);
  });

  test.each([
    ["trans-decalin groups", "trans-decalin"],
    ["cis-decalin groups", "cis-decalin"],
    ["steroid groups", "steroid"],
    ["spiro", "spiro"],
    ["adamantane", "adamantane"],
    ["tetralin", "tetralin"],
  ])("%s as one body", async (name, file) => {
    await keep(renderFigure(systems[name]!, "equilibrium").svg, file);
  });

  test("a series", async () => {
    const dossiers = [sampleDossier, variants["unresolved"]!, variants["bare"]!];
    await keep(renderScene(seriesScene(dossiers), "fig-series"), "series");
  });
});
