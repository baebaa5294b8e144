import { describe, expect, test } from "vitest";
import type { Dossier } from "../../src/dossier/Dossier.ts";
import { chairScene } from "../../src/drawing/chairScene.ts";
import { equilibriumScene } from "../../src/drawing/equilibriumScene.ts";
import { labelRuns } from "../../src/drawing/labelRuns.ts";
import { MAXIMUM_WIDTH } from "../../src/drawing/measures.ts";
import { makeDossier } from "./makeDossier.ts";
import { collisions, linesOf, textsOf, wordsOf } from "./sceneParts.ts";
import { variants } from "./variants.ts";

const ALL_LABELS = ["Me", "CO_2Me", "*t*-Bu", "CH_2OH", "NHBoc", "NH_3^+", "F", "OSiMe_2*t*-Bu"];

describe.each(Object.entries(variants))("The labels of %s", (_name, dossier) => {
  test("touch neither a bond nor each other", () => {
    expect(collisions(equilibriumScene(dossier))).toEqual([]);
  });
});

describe("Labels exchanged on the sample's positions", () => {
  test.each(ALL_LABELS)("%s and others stay clear of bonds and of each other", (first) => {
    const found = ALL_LABELS.slice(1, 5).flatMap((second) =>
      [2, 3, 4].flatMap((at) =>
        (["up", "down"] as const).flatMap((face) => {
          const dossier = makeDossier({
            rings: [
              {
                groups: [
                  { at: 0, face: "up", element: "C", label: first },
                  { at: at - 1, face, element: "C", label: second },
                ],
              },
            ],
            populations: [0.8, 0.2],
          });
          return collisions(equilibriumScene(dossier)).map((each) => `1,${at} ${face} ${second}: ${each}`);
        }),
      ),
    );
    expect(found).toEqual([]);
  });
});

describe("A label on the left side of a chair", () => {
  const dossier = variants["long labels 1,4"]!;

  test("is reversed and ends at its bond, so that the attached atom is next to the ring", () => {
    const scene = chairScene(dossier, "B");
    const label = textsOf(scene, "group label").find((text) => wordsOf(text) === "BocHN")!;
    const bond = linesOf(scene, "equatorial bond")[0]!;
    expect(label.anchor).toBe("end");
    const gap = Math.min(bond.from.x, bond.to.x) - label.box.right;
    expect(gap).toBeGreaterThan(1);
    expect(gap).toBeLessThan(8);
  });

  test("reads forwards on the right side", () => {
    const label = textsOf(chairScene(dossier, "A"), "group label").find((text) => wordsOf(text) === "CO2Me");
    expect(label?.anchor).toBe("start");
  });
});

describe("Label runs", () => {
  test("set subscripts lower and smaller, superscripts higher, and italics for the prefix", () => {
    const style = { size: 10, ink: "ink" } as const;
    const [co, two, me] = labelRuns("CO_2Me", style);
    expect([co?.text, two?.text, me?.text]).toEqual(["CO", "2", "Me"]);
    expect(two!.dy).toBeGreaterThan(0);
    expect(two!.size).toBeLessThan(10);
    expect(me!.x).toBeCloseTo(co!.width + two!.width, 9);
    expect(labelRuns("NH_3^+", style).at(-1)!.dy).toBeLessThan(0);
    expect(labelRuns("*t*-Bu", style).map((run) => run.italic)).toEqual([true, false]);
  });
});

describe("Axial and equatorial", () => {
  test("are told apart by a letter at each group's bond as well as by colour", () => {
    for (const dossier of Object.values(variants)) {
      for (const conformer of dossier.conformers) {
        const scene = chairScene(dossier, conformer.id);
        const cues = textsOf(scene, "orientation cue");
        expect(cues.map((cue) => `${cue.atoms[1]}${wordsOf(cue)}`).sort()).toEqual(
          conformer.positions.map((each) => `${each.substituent}${each.orientation[0]}`).sort(),
        );
        for (const cue of cues) expect(cue.runs[0]?.ink).toBe(wordsOf(cue) === "a" ? "axial" : "equatorial");
      }
    }
  });
});

describe("Hydrogens", () => {
  const dossier = variants["t-butyl lock"]!;

  test("of substituted ring carbons are drawn only when asked for", () => {
    expect(textsOf(chairScene(dossier, "A"), "hydrogen label")).toEqual([]);
    expect(textsOf(chairScene(dossier, "A", { hydrogens: true }), "hydrogen label")).toHaveLength(2);
  });

  test("stay clear of bonds and labels in ordinary compounds", () => {
    for (const name of [
      "sample",
      "long labels 1,4",
      "geminal",
      "t-butyl lock",
      "oxane",
      "piperidine NMe",
      "1,3-dioxane",
    ]) {
      expect(collisions(equilibriumScene(variants[name]!, { hydrogens: true })), name).toEqual([]);
    }
  });
});

describe("Ring atoms other than carbon", () => {
  const lettersOf = (dossier: Dossier) =>
    textsOf(chairScene(dossier, "A"), "atom label").map((text) => wordsOf(text));

  test("carry their hydrogens and their charge", () => {
    expect(lettersOf(variants["oxane"]!)).toEqual(["O"]);
    expect(lettersOf(variants["piperidine NMe"]!)).toEqual(["N"]);
    expect(lettersOf(variants["piperidine NH"]!).join("").split("").sort().join("")).toBe("HN");
    expect(lettersOf(variants["piperidinium"]!).join("").split("").sort().join("")).toBe("+2HN");
  });

  test("leave a gap between their letters and the ends of the ring bonds", () => {
    const scene = chairScene(variants["1,3-dioxane"]!, "A");
    for (const letter of textsOf(scene, "atom label")) {
      const meeting = linesOf(scene, "ring bond").filter((line) => line.atoms.includes(letter.atoms[0]!));
      expect(meeting.length).toBeGreaterThanOrEqual(2);
      const middle = {
        x: (letter.box.left + letter.box.right) / 2,
        y: (letter.box.top + letter.box.bottom) / 2,
      };
      for (const { from, to } of meeting) {
        const nearest = Math.min(...[from, to].map((end) => Math.hypot(end.x - middle.x, end.y - middle.y)));
        expect(nearest).toBeGreaterThan(7);
      }
    }
  });
});

describe("The width of an equilibrium", () => {
  test("keeps small type at 8 px or more on a 320 px screen", () => {
    for (const [name, dossier] of Object.entries(variants)) {
      const scene = equilibriumScene(dossier);
      const width = scene.bounds.right - scene.bounds.left;
      expect(width, name).toBeLessThanOrEqual(MAXIMUM_WIDTH + 20);
      const smallest = Math.min(
        ...textsOf(scene).map((text) => Math.max(...text.runs.map((run) => run.size))),
      );
      expect(smallest * Math.min(1, 320 / width), name).toBeGreaterThanOrEqual(8);
    }
  });
});
