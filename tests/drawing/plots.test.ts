import { describe, expect, test } from "vitest";
import type { ScenePolygon } from "../../src/drawing/Scene.ts";
import { seriesScene } from "../../src/drawing/seriesScene.ts";
import { temperatureScene } from "../../src/drawing/temperatureScene.ts";
import { tickValues } from "../../src/drawing/tickValues.ts";
import { sampleDossier } from "./makeDossier.ts";
import { linesOf, overlap, textsOf, wordsOf } from "./sceneParts.ts";
import { variants } from "./variants.ts";

const scene = temperatureScene(sampleDossier);
const shapes = (part: "curve" | "band") =>
  scene.items.filter((item): item is ScenePolygon => item.kind === "polygon" && item.part === part);

describe("The plot of populations against temperature", () => {
  test("puts every population where its axis says", () => {
    const ticks = textsOf(scene, "tick label").filter((text) => text.anchor === "end");
    const height = (value: string) => {
      const { box } = ticks.find((text) => wordsOf(text) === value)!;
      return (box.top + box.bottom) / 2;
    };
    const [zero, hundred] = [height("0"), height("100")];
    for (const [index, row] of sampleDossier.temperatures.entries()) {
      for (const { conformer, population } of row.populations) {
        const curve = shapes("curve").find((shape) => shape.group === conformer)!;
        expect(curve.points[index]!.y).toBeCloseTo(zero + population * (hundred - zero), 6);
      }
    }
  });

  test("draws each band around its curve as a 15 % tint", () => {
    for (const band of shapes("band")) {
      expect(band.opacity).toBe(0.15);
      const curve = shapes("curve").find((shape) => shape.group === band.group)!;
      for (const point of curve.points) {
        const edges = band.points.filter((edge) => edge.x === point.x).map((edge) => edge.y);
        expect(point.y).toBeGreaterThanOrEqual(Math.min(...edges) - 1e-9);
        expect(point.y).toBeLessThanOrEqual(Math.max(...edges) + 1e-9);
      }
    }
  });

  test("labels the curves directly and tells them apart by dashes too", () => {
    expect(textsOf(scene, "curve label").map(wordsOf)).toEqual(["A\u20021e,3e", "B\u20021a,3a"]);
    const dashes = shapes("curve").map((shape) => shape.dash.join(" "));
    expect(new Set(dashes).size).toBe(dashes.length);
  });

  test("names both quantities with their units, has at most six ticks an axis, and marks 50 % and the own temperature", () => {
    expect(textsOf(scene, "axis title").map(wordsOf)).toEqual(["Population / %", "Temperature / K"]);
    const ticks = textsOf(scene, "tick label");
    expect(ticks.filter((text) => text.anchor === "middle").length).toBeLessThanOrEqual(6);
    expect(ticks.filter((text) => text.anchor === "end").length).toBeLessThanOrEqual(6);
    expect(linesOf(scene, "reference line")).toHaveLength(2);
    expect(textsOf(scene, "reference label").map(wordsOf)).toEqual(["298.15\u00a0K"]);
  });

  test("keeps its texts apart", () => {
    const texts = textsOf(scene);
    for (const [index, text] of texts.entries()) {
      for (const other of texts.slice(0, index)) expect(overlap(text.box, other.box)).toBe(false);
    }
  });
});

describe("The plot of a series", () => {
  const dossiers = [
    sampleDossier,
    variants["unresolved"]!,
    { ...sampleDossier, code: "SX-02", conformers: [], equilibria: [] },
  ];
  const plot = seriesScene(dossiers);

  test("has one row a compound, in the order given, with dot and interval", () => {
    const codes = textsOf(plot, "row label").filter((text) => text.anchor === "end");
    expect(codes.map(wordsOf)).toEqual(["SX-01", "TX-01", "SX-02"]);
    const dots = plot.items.filter((item) => item.kind === "arc");
    expect(dots.map((dot) => dot.fill)).toEqual(["ink", "paper"]);
    const interval = linesOf(plot, "interval");
    expect(interval).toHaveLength(2);
    expect(interval[0]!.from.x).toBeLessThan(dots[0]!.centre.x);
    expect(interval[0]!.to.x).toBeGreaterThan(dots[0]!.centre.x);
    expect(textsOf(plot, "row label").map(wordsOf)).toContain("not analysed");
  });

  test("is described in words", () => {
    expect(plot.description).toContain("TX-01: 52.0");
    expect(plot.description).toContain("major conformer unresolved");
  });
});

describe("Tick values", () => {
  test.each([
    [173.15, 373.15, 6],
    [0, 100, 6],
    [-3.2, 0.1, 5],
    [200, 210, 6],
    [1, 1000, 4],
  ])("between %d and %d are at most %d, inside, even and more than one", (low, high, most) => {
    const ticks = tickValues(low, high, most);
    expect(ticks.length).toBeLessThanOrEqual(most);
    expect(ticks.length).toBeGreaterThan(1);
    expect(ticks[0]!).toBeGreaterThanOrEqual(low);
    expect(ticks.at(-1)!).toBeLessThanOrEqual(high);
    const steps = ticks.slice(1).map((tick, index) => (tick - ticks[index]!).toPrecision(6));
    expect(new Set(steps).size).toBe(1);
  });
});
