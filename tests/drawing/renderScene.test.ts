import { describe, expect, test } from "vitest";
import { equilibriumScene } from "../../src/drawing/equilibriumScene.ts";
import { FIGURES, type FigureName } from "../../src/drawing/figures.ts";
import { renderFigure } from "../../src/drawing/renderFigure.ts";
import { renderScene } from "../../src/drawing/renderScene.ts";
import type { Scene } from "../../src/drawing/Scene.ts";
import { labelText } from "../../src/quantity/labelText.ts";
import { sampleDossier } from "./makeDossier.ts";
import { variants } from "./variants.ts";

const [sample, oxane] = [equilibriumScene(sampleDossier), equilibriumScene(variants["oxane"]!)];
const everything = Object.entries(variants).map(([name, dossier], index) => ({
  name,
  svg: renderScene(equilibriumScene(dossier), `fig-${index}`),
}));

describe("An SVG drawing", () => {
  test("has the same bytes whatever was drawn before it", () => {
    const first = [renderScene(sample, "fig-a"), renderScene(oxane, "fig-b")];
    const second = [renderScene(oxane, "fig-b"), renderScene(sample, "fig-a")];
    expect(second.reverse()).toEqual(first);
    const again = equilibriumScene(sampleDossier);
    expect(renderScene(again, "fig-a")).toBe(first[0]);
  });

  test("has no automatic id: every id begins with the prefix given", () => {
    for (const { svg, name } of everything) {
      expect(svg, name).not.toMatch(/svgjs/i);
      const prefix = /aria-labelledby="(fig-\d+)-title/.exec(svg)![1]!;
      for (const [, id] of svg.matchAll(/\sid="([^"]*)"/g)) expect(id!.startsWith(prefix)).toBe(true);
    }
  });

  test("has coordinates with at most two decimals, no negative zero and no exponent", () => {
    for (const { svg, name } of everything) {
      expect(svg, name).not.toMatch(/\d\.\d{3,}/);
      expect(svg, name).not.toMatch(/[" ,ML]-0(?![.\d])/);
      expect(svg, name).not.toMatch(/\de[-+]?\d/);
      expect(svg, name).not.toMatch(/NaN|Infinity|undefined/);
    }
  });

  test("is an image with a title, then a description, that name it", () => {
    for (const { svg } of everything) {
      expect(svg).toMatch(
        /^<svg [^>]*role="img"[^>]*aria-labelledby="(\S+)-title \1-desc"[^>]*><title id="\1-title">[^<]+<\/title><desc id="\1-desc">[^<]+<\/desc>/,
      );
    }
  });

  test("takes its colours from the page, with the light palette as fallback, and keeps its text live", () => {
    for (const { svg } of everything) {
      for (const [, value] of svg.matchAll(/\s(?:fill|stroke)="([^"]*)"/g)) {
        expect(value).toMatch(/^(none|var\(--[a-z]+, #[0-9a-f]{6}\))$/);
      }
      expect(svg).toContain("<text ");
      expect(svg).toContain("'Source Sans 3 Variable', 'Source Sans 3', sans-serif");
    }
  });

  test("contains nothing that runs or is fetched, whatever the name says", () => {
    const hostile: Scene = {
      ...sample,
      title: '</title><script>alert("1")</script>',
      description: "a & b < c",
    };
    const svg = renderScene(hostile, "fig-a");
    expect(svg).not.toMatch(/<script/);
    expect(svg).toContain("a &amp; b &lt; c");
    expect(svg).not.toMatch(/href|url\(|style=/);
  });

  test("refuses an id prefix that is not one", () => {
    expect(() => renderScene(sample, "1 fig")).toThrow(RangeError);
  });
});

describe("The registry of figures", () => {
  test("draws every kind with caption, description and ids made of slug and name", () => {
    for (const name of Object.keys(FIGURES) as FigureName[]) {
      expect(FIGURES[name].canShow(sampleDossier)).toBe(true);
      const { svg, caption, title } = renderFigure(sampleDossier, name);
      expect(svg).toContain(`id="fig-sx-01-${name}-title"`);
      expect(labelText(caption)).toContain(sampleDossier.name);
      expect(title).not.toBe("");
      expect(FIGURES[name].describe(sampleDossier)).not.toMatch(/[_^*]/);
    }
  });

  test("describes an equilibrium by ring, shape, groups with their locants, and populations", () => {
    expect(FIGURES.equilibrium.describe(sampleDossier).replaceAll("\u00a0", " ")).toBe(
      "Conformer A: cyclohexane chair: OH equatorial at 1 and Me equatorial at 3. Population 99.8 % (99.3–99.9 %). " +
        "Conformer B: cyclohexane chair: OH axial at 1 and Me axial at 3. Population 0.2 % (0.1–0.7 %).",
    );
  });

  test("draws the conformer asked for and says what a dossier cannot show", () => {
    expect(renderFigure(sampleDossier, "chair", { conformer: "B" }).svg).toContain("fig-sx-01-chair-b-title");
    expect(FIGURES.chair.canShow(sampleDossier, { conformer: "Z" })).toBe(false);
    expect(() => renderFigure(sampleDossier, "chair", { conformer: "Z" })).toThrow(RangeError);
    const unanalysed = { ...sampleDossier, conformers: [], temperatures: [] };
    expect(FIGURES.equilibrium.canShow(unanalysed)).toBe(false);
    expect(FIGURES.temperature.canShow(unanalysed)).toBe(false);
    expect(FIGURES.wedge.canShow(unanalysed)).toBe(true);
  });
});
