import { describe, expect, test } from "vitest";
import type { Dossier, Geometry } from "../../src/dossier/Dossier.ts";
import { chairScene } from "../../src/drawing/chairScene.ts";
import { chooseCameras } from "../../src/drawing/chooseCameras.ts";
import { equilibriumScene } from "../../src/drawing/equilibriumScene.ts";
import { BOND } from "../../src/drawing/measures.ts";
import { placeSystem } from "../../src/drawing/placeSystem.ts";
import type { Point, Scene, SceneLine } from "../../src/drawing/Scene.ts";
import { viewSystem } from "../../src/drawing/viewSystem.ts";
import { between, collisions, directionOf, linesOf, textsOf, wordsOf } from "./sceneParts.ts";
import { systems } from "./systems.ts";

const scenesOf = (dossier: Dossier) =>
  dossier.conformers.map((conformer) => chairScene(dossier, conformer.id));
const keyOf = (atoms: readonly number[]) => [...atoms].sort((a, b) => a - b).join();
const lengthOf = ({ from, to }: SceneLine) => Math.hypot(to.x - from.x, to.y - from.y);

/** Where every ring atom of a conformer stands; a figure of one system does not shift it. */
function cornersOf(dossier: Dossier, index = 0): ReadonlyMap<number, Point> {
  const body = placeSystem(dossier, dossier.conformers[index]!, dossier.systems[0]!, false);
  const view = viewSystem(body, chooseCameras(dossier, false)[0]!);
  return new Map(view.vertices.map(({ atom, at }) => [atom, at]));
}

function middle(corners: ReadonlyMap<number, Point>, atoms: readonly number[]): Point {
  const points = atoms.map((atom) => corners.get(atom)!);
  return {
    x: points.reduce((sum, { x }) => sum + x, 0) / points.length,
    y: points.reduce((sum, { y }) => sum + y, 0) / points.length,
  };
}

describe.each(Object.entries(systems))("The drawing of %s", (_name, dossier) => {
  const scenes = scenesOf(dossier);
  const [system] = dossier.systems;

  test("has every ring bond once, double ones as two lines", () => {
    for (const [index, scene] of scenes.entries()) {
      const corners = cornersOf(dossier, index);
      const lines = linesOf(scene, "ring bond");
      expect([...new Set(lines.map((line) => keyOf(line.atoms)))].sort()).toEqual(
        system!.bonds.map(({ from, to }) => keyOf([from, to])).sort(),
      );
      for (const { from, to, order } of system!.bonds) {
        const own = lines.filter((line) => keyOf(line.atoms) === keyOf([from, to]));
        const [a, b] = [corners.get(from)!, corners.get(to)!];
        const drawn = own.reduce((sum, line) => sum + lengthOf(line), 0);
        expect(drawn).toBeLessThan(order * Math.hypot(a.x - b.x, a.y - b.y) + 1);
        if (order === 2) expect(own.length).toBeGreaterThanOrEqual(2);
      }
    }
  });

  test("has no label on a bond or on another, with hydrogens or without", () => {
    expect(collisions(equilibriumScene(dossier))).toEqual([]);
    expect(collisions(equilibriumScene(dossier, { hydrogens: true }))).toEqual([]);
  });

  test("numbers every atom that has a locant once", () => {
    const locants = new Map(
      dossier.rings.flatMap((ring) =>
        ring.atoms.map((atom, k): [number, string] => [atom, ring.locants[k]!]),
      ),
    );
    for (const scene of scenes) {
      expect(
        textsOf(scene, "locant")
          .map((text) => `${text.atoms[0]} ${wordsOf(text)}`)
          .sort(),
      ).toEqual([...locants].map(([atom, locant]) => `${atom} ${locant}`).sort());
    }
  });

  test("leaves a gap in a farther bond where a nearer one crosses it", () => {
    for (const scene of scenes) {
      const lines = linesOf(scene, "ring bond", "axial bond", "equatorial bond", "group bond");
      for (const [index, line] of lines.entries()) {
        for (const other of lines.slice(0, index)) {
          if (line.atoms.some((atom) => other.atoms.includes(atom))) continue;
          expect(cross(line, other), `${line.atoms} and ${other.atoms}`).toBe(false);
        }
      }
    }
  });

  test("is the same however the coordinates are turned and shifted, and every time", () => {
    const rounded = (scene: Scene) =>
      scene.items.flatMap((item) =>
        item.kind === "line" ? [`${item.from.x.toFixed(2)} ${item.from.y.toFixed(2)}`] : [],
      );
    const { id } = dossier.conformers[0]!;
    expect(rounded(chairScene(turned(dossier), id))).toEqual(rounded(chairScene(dossier, id)));
  });

  test("is described with every ring and how the rings are joined", () => {
    const [scene] = scenes;
    for (const ring of dossier.rings.keys()) {
      if (dossier.rings.length > 1) expect(scene!.description).toContain(`ring ${ring + 1}, `);
    }
    expect(scene!.description).toMatch(/fused|spiro|bridge/);
  });
});

describe("All-chair systems (source: IUPAC Basic Terminology of Stereochemistry 1996, axial, equatorial)", () => {
  const upright = ["trans-decalin", "trans-decalin groups", "trans-decalone", "perhydroanthracene"];

  test.each([...upright, "steroid", "steroid groups"])(
    "%s: axial bonds are vertical within 1°, to groups and to hydrogens at fusion atoms",
    (name) => {
      const [scene] = scenesOf(systems[name]!);
      // Where the five-membered ring begins, angles are not tetrahedral.
      const strained = name.startsWith("steroid") ? [12, 13] : [];
      const bonds = [...linesOf(scene!, "axial bond"), ...linesOf(scene!, "hydrogen bond")].filter(
        (line) => !strained.includes(line.atoms[0]!),
      );
      expect(bonds.length).toBeGreaterThan(1);
      for (const line of bonds) expect(between(directionOf(line), 90), `${line.atoms}`).toBeLessThan(1);
    },
  );

  test("trans-decalin: an equatorial bond is parallel to the ring bonds one removed", () => {
    const [scene] = scenesOf(systems["trans-decalin groups"]!);
    const bond = linesOf(scene!, "equatorial bond").find((line) => line.atoms[0] === 2)!;
    for (const pair of [
      [0, 1],
      [3, 4],
    ]) {
      const ringBond = linesOf(scene!, "ring bond").find((line) => keyOf(line.atoms) === keyOf(pair))!;
      expect(between(directionOf(bond), directionOf(ringBond))).toBeLessThan(1);
    }
  });

  test("trans-decalin: the bonds that leave each ring into the other are parallel to ring bonds of the first", () => {
    const [scene] = scenesOf(systems["trans-decalin"]!);
    const direction = (pair: readonly number[]) =>
      directionOf(linesOf(scene!, "ring bond").find((line) => keyOf(line.atoms) === keyOf(pair))!);
    expect(between(direction([5, 6]), direction([0, 1]))).toBeLessThan(1);
    expect(between(direction([0, 9]), direction([4, 5]))).toBeLessThan(1);
  });
});

describe("What the trade is used to see (common practice)", () => {
  test("trans-decalin is two chairs side by side that share a bond (common practice)", () => {
    const dossier = systems["trans-decalin"]!;
    const [first, second] = dossier.rings.map((ring) => middle(cornersOf(dossier), ring.atoms));
    expect(Math.abs(first!.x - second!.x)).toBeGreaterThan(1.3 * BOND);
    expect(Math.abs(first!.y - second!.y)).toBeLessThan(0.5 * BOND);
  });

  test("a steroid has its angular methyls up, ring A to the left and ring D to the right (common practice)", () => {
    for (const name of ["steroid", "steroid groups"]) {
      const dossier = systems[name]!;
      const [scene] = scenesOf(dossier);
      const corners = cornersOf(dossier);
      const ringD = middle(corners, [12, 13, 14, 15, 16]);
      expect(middle(corners, dossier.rings[0]!.atoms).x).toBeLessThan(ringD.x);
      const methyls = linesOf(scene!, "axial bond").filter((line) => [9, 12].includes(line.atoms[0]!));
      expect(methyls).toHaveLength(2);
      for (const line of methyls) expect(line.to.y).toBeLessThan(line.from.y);
    }
  });

  test("hydrogens at fusion atoms are always drawn, bridgeheads stay bare (common practice)", () => {
    const atoms = (name: string) =>
      textsOf(scenesOf(systems[name]!)[0]!, "hydrogen label")
        .map((text) => text.atoms[0]!)
        .sort((a, b) => a - b);
    expect(atoms("trans-decalin")).toEqual([0, 5]);
    expect(atoms("cis-decalin groups")).toEqual([0]);
    expect(atoms("steroid")).toEqual([4, 7, 8, 13]);
    expect(atoms("adamantane")).toEqual([]);
    expect(atoms("spiro")).toEqual([]);
  });
});

describe("A group that two rings share", () => {
  const [a, b] = scenesOf(systems["cis-decalin groups"]!);

  test("has no accent and a letter for each ring where it is axial in one and equatorial in the other", () => {
    for (const scene of [a!, b!]) {
      const cue = textsOf(scene, "orientation cue").find((text) => text.atoms[0] === 5)!;
      expect(wordsOf(cue).split("/").sort()).toEqual(["a", "e"]);
      expect(cue.runs.every((run) => run.ink === "ink")).toBe(true);
      expect(linesOf(scene, "group bond").map((line) => line.ink)).toEqual(["ink"]);
    }
  });

  test("takes one letter where both rings agree", () => {
    const [scene] = scenesOf(systems["trans-decalin groups"]!);
    const cue = textsOf(scene!, "orientation cue").filter((text) => text.atoms[0] === 5);
    expect(cue.map(wordsOf)).toEqual(["a"]);
  });
});

describe("Two conformers of a system", () => {
  test("keep the atoms of the leading ring at their ends of the drawing", () => {
    const dossier = systems["cis-decalin groups"]!;
    const scenes = scenesOf(dossier);
    const lead = Number(linesOf(scenes[0]!, "ring bond")[0]!.group.split("/")[1]);
    const { atoms } = dossier.rings[lead]!;
    const places = scenes.map((_, index) => {
      const corners = cornersOf(dossier, index);
      const centre = middle(corners, atoms).x;
      return atoms.map((atom) => corners.get(atom)!.x - centre);
    });
    for (const index of atoms.keys()) {
      expect(Math.abs(places[0]![index]! - places[1]![index]!)).toBeLessThan(BOND / 3);
    }
  });
});

describe("A double bond", () => {
  test("to an oxygen outside the ring is two lines of equal length", () => {
    const [scene] = scenesOf(systems["trans-decalone"]!);
    const lines = linesOf(scene!, "group bond").filter((line) => line.atoms[0] === 1);
    expect(lines).toHaveLength(2);
    expect(between(directionOf(lines[0]!), directionOf(lines[1]!))).toBeLessThan(0.01);
    expect(textsOf(scene!, "group label").map(wordsOf)).toContain("O");
  });

  test("in an aromatic ring has its second line inside that ring", () => {
    for (const [index, scene] of scenesOf(systems["tetralin"]!).entries()) {
      const corners = cornersOf(systems["tetralin"]!, index);
      const centre = middle(corners, [0, 5, 6, 7, 8, 9]);
      for (const pair of [
        [0, 5],
        [6, 7],
        [8, 9],
      ]) {
        const own = linesOf(scene, "ring bond").filter((line) => keyOf(line.atoms) === keyOf(pair));
        const away = (line: SceneLine) =>
          Math.hypot((line.from.x + line.to.x) / 2 - centre.x, (line.from.y + line.to.y) / 2 - centre.y);
        const inner = own.reduce((best, line) =>
          line.width === line.endWidth && away(line) < away(best) ? line : best,
        );
        const [from, to] = pair.map((atom) => corners.get(atom)!);
        expect(away(inner)).toBeLessThan(
          Math.hypot((from!.x + to!.x) / 2 - centre.x, (from!.y + to!.y) / 2 - centre.y),
        );
      }
    }
  });
});

describe("The words for joined rings", () => {
  const words = (name: string) => scenesOf(systems[name]!)[0]!.description;

  test("say cis or trans and where", () => {
    expect(words("trans-decalin")).toContain("Ring 1 and ring 2 are fused trans at 4a and 8a.");
    expect(words("cis-decalin")).toContain("Ring 1 and ring 2 are fused cis at 4a and 8a.");
    expect(words("steroid")).toContain("ring 3 and a five-membered ring are fused trans at 13 and 14");
  });

  test("name spiro atoms, bridges and rings that are not analysed", () => {
    expect(words("spiro")).toContain("Ring 1 and ring 2 share atom 6 (spiro).");
    expect(words("adamantane")).toContain("Ring 1, ring 2, ring 3 and ring 4 bridge each other.");
    expect(words("tetralin")).toContain("fused at 4a and 8a");
    expect(words("tetralin")).toContain("an aromatic six-membered ring");
  });

  test("tell groups that are neither axial nor equatorial", () => {
    expect(words("trans-decalone")).toContain("=O at 1");
  });
});

function cross(a: SceneLine, b: SceneLine): boolean {
  const side = (line: SceneLine, x: number, y: number) =>
    (line.to.x - line.from.x) * (y - line.from.y) - (line.to.y - line.from.y) * (x - line.from.x);
  return (
    side(a, b.from.x, b.from.y) * side(a, b.to.x, b.to.y) < 0 &&
    side(b, a.from.x, a.from.y) * side(b, a.to.x, a.to.y) < 0
  );
}

/** The same record with its coordinates turned about two axes and shifted. */
function turned(dossier: Dossier): Dossier {
  const turn = ({ x, y, z, ...rest }: Geometry["atoms"][number]) => {
    const [u, v] = [Math.cos(1) * x - Math.sin(1) * y, Math.sin(1) * x + Math.cos(1) * y];
    const [w, t] = [Math.cos(2) * v - Math.sin(2) * z, Math.sin(2) * v + Math.cos(2) * z];
    return { ...rest, x: u + 3, y: w - 2, z: t + 1 };
  };
  return {
    ...dossier,
    conformers: dossier.conformers.map((conformer) => ({
      ...conformer,
      geometry: { atoms: conformer.geometry.atoms.map(turn) },
    })),
  };
}
