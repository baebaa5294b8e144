import { describe, expect, test } from "vitest";
import { equilibriumScene } from "../../src/drawing/equilibriumScene.ts";
import { MOST_DRAWN } from "../../src/drawing/measures.ts";
import type { Scene } from "../../src/drawing/Scene.ts";
import { makeDossier } from "./makeDossier.ts";
import { linesOf, textsOf, wordsOf } from "./sceneParts.ts";
import { variants } from "./variants.ts";

const shaft = (scene: Scene, part: "forward arrow" | "reverse arrow") => {
  const { from, to } = linesOf(scene, part)[0]!;
  return Math.hypot(to.x - from.x, to.y - from.y);
};
const withK = (K: number) =>
  equilibriumScene(
    makeDossier({
      rings: [{ groups: [{ at: 0, face: "down", element: "C", label: "Me" }] }],
      populations: [1 / (1 + K), K / (1 + K)],
    }),
  );

describe("The two half-headed arrows", () => {
  const constants = [0.001, 0.01, 0.03, 0.1, 0.3, 0.9, 1, 1.2, 3, 30, 100, 1000];
  const ratios = constants.map((K) => {
    const scene = withK(K);
    return shaft(scene, "forward arrow") / shaft(scene, "reverse arrow");
  });

  test("have lengths in the order of the equilibrium constants", () => {
    for (let index = 1; index < ratios.length; index++) {
      const clamped = constants[index]! <= 0.01 || constants[index - 1]! >= 100;
      if (clamped) expect(ratios[index]!).toBeCloseTo(ratios[index - 1]!, 6);
      else expect(ratios[index]!).toBeGreaterThan(ratios[index - 1]!);
    }
  });

  test("are equal for K = 1 and mirror each other for K and 1/K", () => {
    expect(ratios[constants.indexOf(1)]).toBeCloseTo(1, 6);
    expect(ratios[constants.indexOf(0.01)]! * ratios[constants.indexOf(100)]!).toBeCloseTo(1, 6);
  });

  test("never shrink so far that the shorter one cannot be seen", () => {
    expect(Math.min(...ratios)).toBeGreaterThan(0.3);
  });

  test("point in opposite directions, forward above", () => {
    const scene = withK(0.2);
    const [forward, reverse] = [linesOf(scene, "forward arrow")[0]!, linesOf(scene, "reverse arrow")[0]!];
    expect(forward.to.x).toBeGreaterThan(forward.from.x);
    expect(reverse.to.x).toBeLessThan(reverse.from.x);
    expect(forward.from.y).toBeLessThan(reverse.from.y);
  });
});

describe("Chairs that are equal by symmetry", () => {
  const notes = (scene: Scene) => textsOf(scene, "arrow note").map(wordsOf).join(" ");

  test("have equal arrows and the words that say how they are related", () => {
    const [identical, mirrored] = [
      equilibriumScene(variants["bare"]!),
      equilibriumScene(variants["1,2-cis"]!),
    ];
    expect(notes(identical)).toBe("identical chairs");
    expect(notes(mirrored)).toBe("mirror-image chairs");
    for (const scene of [identical, mirrored]) {
      expect(shaft(scene, "forward arrow")).toBeCloseTo(shaft(scene, "reverse arrow"), 9);
    }
  });

  test("are not claimed where the chairs differ", () => {
    expect(notes(equilibriumScene(variants["sample"]!))).toBe("");
    expect(notes(equilibriumScene(variants["unresolved"]!))).toBe("major conformer unresolved");
  });
});

describe("A figure of an equilibrium", () => {
  test("prints label, population and interval under every conformer", () => {
    const scene = equilibriumScene(variants["sample"]!);
    expect(textsOf(scene, "conformer label").map(wordsOf)).toEqual(["A\u20021e,3e", "B\u20021a,3a"]);
    expect(textsOf(scene, "population").map((text) => wordsOf(text).replaceAll("\u00a0", " "))).toEqual([
      "99.8 % (99.3–99.9 %)",
      "0.2 % (0.1–0.7 %)",
    ]);
  });

  test("has no arrow when there is one conformer", () => {
    const scene = equilibriumScene(variants["one conformer"]!);
    expect(linesOf(scene, "forward arrow", "reverse arrow")).toEqual([]);
  });

  test("draws every ring of a molecule with several, captioned, and heads each further conformer by its equilibrium", () => {
    const scene = equilibriumScene(variants["two rings"]!);
    expect(textsOf(scene, "ring caption").map(wordsOf)).toEqual(Array(4).fill(["ring 1", "ring 2"]).flat());
    expect(linesOf(scene, "forward arrow").map((line) => line.group)).toEqual(["B", "C", "D"]);
  });

  test("draws at most eight conformers and says how many more there are", () => {
    const group = { at: 0, face: "down", element: "C", label: "Me" } as const;
    const scene = equilibriumScene(
      makeDossier({
        rings: Array(4).fill({ groups: [group] }),
        populations: Array(16).fill(1 / 16),
      }),
    );
    expect(textsOf(scene, "population")).toHaveLength(MOST_DRAWN);
    expect(textsOf(scene, "note").map(wordsOf).join(" ")).toBe("and 8 more conformers, listed in the table");
    expect(scene.description).toContain("8 more");
  });
});
