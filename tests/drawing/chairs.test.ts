import { describe, expect, test } from "vitest";
import type { Dossier } from "../../src/dossier/Dossier.ts";
import { chairScene } from "../../src/drawing/chairScene.ts";
import { equilibriumScene } from "../../src/drawing/equilibriumScene.ts";
import type { Scene, SceneLine } from "../../src/drawing/Scene.ts";
import { makeDossier, sampleDossier } from "./makeDossier.ts";
import { between, directionOf, linesOf } from "./sceneParts.ts";
import { variants } from "./variants.ts";

/** Six methyl groups, all on the side where they are axial in conformer A and equatorial in B. */
const hexamethyl = makeDossier({
  rings: [
    {
      groups: [0, 1, 2, 3, 4, 5].map((at) => ({
        at,
        face: at % 2 === 0 ? ("up" as const) : ("down" as const),
        element: "C",
        label: "Me",
      })),
    },
  ],
  populations: [0.01, 0.99],
});
const axial = chairScene(hexamethyl, "A");
const equatorial = chairScene(hexamethyl, "B");

/** A ring bond cut by a crossing is in pieces; any of them has its direction. */
const ringBond = (scene: Scene, a: number, b: number): SceneLine =>
  linesOf(scene, "ring bond").find((line) => line.atoms.includes(a) && line.atoms.includes(b))!;
const bondFrom = (scene: Scene, part: "axial bond" | "equatorial bond", atom: number): SceneLine =>
  linesOf(scene, part).find((line) => line.atoms[0] === atom)!;

describe("The bonds of a drawn chair (source: IUPAC Basic Terminology of Stereochemistry 1996, axial, equatorial)", () => {
  test("axial bonds are vertical within 1°, parallel to the threefold axis", () => {
    for (let atom = 0; atom < 6; atom++) {
      expect(between(directionOf(bondFrom(axial, "axial bond", atom)), 90), `atom ${atom}`).toBeLessThan(1);
    }
  });

  test("axial bonds point up and down in turn around the ring", () => {
    const senses = [0, 1, 2, 3, 4, 5].map((atom) =>
      Math.sign(directionOf(bondFrom(axial, "axial bond", atom))),
    );
    expect(senses).toEqual([1, -1, 1, -1, 1, -1]);
  });

  test("each equatorial bond is parallel within 0.5° to the two ring bonds one removed", () => {
    for (let atom = 0; atom < 6; atom++) {
      const own = directionOf(bondFrom(equatorial, "equatorial bond", atom));
      for (const [a, b] of [
        [1, 2],
        [4, 5],
      ] as const) {
        const removed = ringBond(equatorial, (atom + a) % 6, (atom + b) % 6);
        expect(between(own, directionOf(removed)), `atom ${atom}`).toBeLessThan(0.5);
      }
    }
  });

  test("opposite ring bonds are parallel", () => {
    for (let atom = 0; atom < 3; atom++) {
      const [a, b] = [ringBond(axial, atom, atom + 1), ringBond(axial, atom + 3, (atom + 4) % 6)];
      expect(between(directionOf(a), directionOf(b))).toBeLessThan(0.5);
    }
  });
});

describe.each(Object.entries(variants))("The chairs of %s", (_name, dossier) => {
  const scenes = dossier.conformers.map((conformer) => chairScene(dossier, conformer.id));

  test("have a front edge that is nearest to the viewer, lowest of its parallels and heaviest", () => {
    for (const scene of scenes) {
      for (const bonds of ringsOf(scene)) {
        const widest = Math.max(...bonds.map((line) => Math.min(line.width, line.endWidth)));
        const front = bonds.filter((line) => Math.min(line.width, line.endWidth) === widest);
        const nearest = Math.max(...bonds.map(middleDepth));
        expect(Math.max(...front.map(middleDepth))).toBe(nearest);
        expect(widest).toBeGreaterThan(2 * Math.min(...bonds.map((line) => line.width)));
      }
    }
  });

  test("show no farther bond running through a nearer one", () => {
    for (const scene of scenes) {
      const lines = linesOf(scene, "ring bond", "axial bond", "equatorial bond");
      for (const [index, line] of lines.entries()) {
        for (const other of lines.slice(0, index)) {
          if (line.group !== other.group || line.atoms.some((atom) => other.atoms.includes(atom))) continue;
          expect(cross(line, other), `${line.atoms} and ${other.atoms}`).toBe(false);
        }
      }
    }
  });
});

describe("Two chairs of a flip", () => {
  const flips: readonly Dossier[] = [
    sampleDossier,
    variants["bare"]!,
    variants["1,2-cis"]!,
    variants["t-butyl lock"]!,
  ];

  test("are mirror shapes of each other: every ring atom above the middle line goes below its neighbours", () => {
    for (const dossier of flips) {
      const [a, b] = dossier.conformers.map((conformer) =>
        corners(chairScene(dossier, conformer.id), dossier),
      ) as [Corner[], Corner[]];
      for (let atom = 0; atom < 6; atom++) {
        const rise = (at: Corner[]) => 2 * at[atom]!.y - at[(atom + 1) % 6]!.y - at[(atom + 5) % 6]!.y;
        expect(Math.sign(rise(a))).toBe(-Math.sign(rise(b)));
      }
    }
  });

  test("keep every ring atom at its place: none moves sideways by more than a quarter of a bond", () => {
    for (const dossier of flips) {
      const [a, b] = dossier.conformers.map((conformer) =>
        corners(chairScene(dossier, conformer.id), dossier),
      ) as [Corner[], Corner[]];
      const centre = (at: Corner[]) => at.reduce((sum, corner) => sum + corner.x, 0) / 6;
      for (let atom = 0; atom < 6; atom++) {
        expect(Math.abs(a[atom]!.x - centre(a) - (b[atom]!.x - centre(b)))).toBeLessThan(42 / 4);
      }
    }
  });

  test("are drawn alike in the equilibrium and alone", () => {
    const together = linesOf(equilibriumScene(sampleDossier), "ring bond").filter(
      (line) => line.group === "B/0",
    );
    const alone = linesOf(chairScene(sampleDossier, "B"), "ring bond");
    const shapes = (lines: readonly SceneLine[]) =>
      lines.map((line) =>
        [line.to.x - line.from.x, line.to.y - line.from.y].map((value) => value.toFixed(6)),
      );
    expect(shapes(together)).toEqual(shapes(alone));
  });
});

describe("A chair drawn from coordinates that are turned and shifted", () => {
  test("is the same drawing: the camera goes by the ring, not by the axes of the file", () => {
    const turned = (dossier: Dossier): Dossier => ({
      ...dossier,
      conformers: dossier.conformers.map((conformer) => ({
        ...conformer,
        geometry: {
          atoms: conformer.geometry.atoms.map((atom) => ({
            ...atom,
            x: Math.cos(1) * atom.x - Math.sin(1) * atom.y + 3,
            y: Math.sin(1) * atom.x + Math.cos(1) * atom.y - 2,
            z: atom.z + 5,
          })),
        },
      })),
    });
    const [first, second] = [equilibriumScene(sampleDossier), equilibriumScene(turned(sampleDossier))];
    const rounded = (scene: Scene) => linesOf(scene, "ring bond").map((line) => line.from.x.toFixed(3));
    expect(rounded(second)).toEqual(rounded(first));
  });
});

interface Corner {
  readonly x: number;
  readonly y: number;
}

/** Corners of the ring in the order of its list, from the lines that meet there. */
function corners(scene: Scene, dossier: Dossier): Corner[] {
  const atoms = dossier.rings[0]!.atoms;
  return atoms.map((atom, index) => {
    const next = atoms[(index + 1) % 6]!;
    const bond = linesOf(scene, "ring bond").find(
      (line) => line.atoms[0] === atom && line.atoms[1] === next,
    )!;
    return bond.from;
  });
}

function ringsOf(scene: Scene): readonly (readonly SceneLine[])[] {
  const bonds = linesOf(scene, "ring bond");
  return [...new Set(bonds.map((line) => line.group))].map((group) =>
    bonds.filter((line) => line.group === group),
  );
}

function middleDepth(line: SceneLine): number {
  return (line.depth![0] + line.depth![1]) / 2;
}

function cross(a: SceneLine, b: SceneLine): boolean {
  const side = (line: SceneLine, x: number, y: number) =>
    (line.to.x - line.from.x) * (y - line.from.y) - (line.to.y - line.from.y) * (x - line.from.x);
  return (
    side(a, b.from.x, b.from.y) * side(a, b.to.x, b.to.y) < 0 &&
    side(b, a.from.x, a.from.y) * side(b, a.to.x, a.to.y) < 0
  );
}
