import { describe, expect, test } from "vitest";
import type { Dossier, Structure } from "../../src/dossier/Dossier.ts";
import type { ScenePolygon } from "../../src/drawing/Scene.ts";
import { wedgeScene } from "../../src/drawing/wedgeScene.ts";
import { sampleDossier } from "./makeDossier.ts";
import { collisions, linesOf, textsOf, wordsOf } from "./sceneParts.ts";

const polygonsOf = (dossier: Dossier) =>
  wedgeScene(dossier).items.filter((item): item is ScenePolygon => item.kind === "polygon");

/** Atoms as [element, x, y, hydrogens, charge, isotope], bonds as [from, to, order]. */
function structure(
  atoms: readonly (readonly [string, number, number, number?, number?, number?])[],
  bonds: readonly (readonly [number, number, (1 | 2 | 3)?])[],
): Structure {
  return {
    atoms: atoms.map(([element, x, y, hydrogens = 0, charge = 0, isotope = 0]) => ({
      element,
      x,
      y,
      hydrogens,
      charge,
      isotope,
    })),
    bonds: bonds.map(([from, to, order = 1]) => ({ from, to, order, aromatic: false, wedge: null })),
  };
}
const flat = (drawn: Structure): Dossier => ({
  ...sampleDossier,
  structure: drawn,
  rings: [],
  identity: { ...sampleDossier.identity, stereocentres: [] },
});
const lettersOf = (drawn: Structure) => textsOf(wedgeScene(flat(drawn)), "atom label").map(wordsOf);

describe("Wedges (source: IUPAC Graphical Representation of Stereochemical Configuration 2006, PAC 78, 1897)", () => {
  test("have their narrow end at the stereocentre", () => {
    for (const bond of sampleDossier.structure.bonds.filter((each) => each.wedge !== null)) {
      const wedge = polygonsOf(sampleDossier).find(
        (item) => item.atoms[0] === bond.from && item.atoms[1] === bond.to,
      )!;
      const [a, b, c, d] = wedge.points as [
        ScenePolygon["points"][0],
        ScenePolygon["points"][0],
        ScenePolygon["points"][0],
        ScenePolygon["points"][0],
      ];
      const [narrow, wide] = [Math.hypot(a.x - d.x, a.y - d.y), Math.hypot(b.x - c.x, b.y - c.y)];
      expect(wide).toBeGreaterThan(3 * narrow);
      const centre = linesOf(wedgeScene(sampleDossier), "bond").find(
        (line) => line.atoms[0] === bond.from,
      )!.from;
      expect(Math.hypot(centre.x - (a.x + d.x) / 2, centre.y - (a.y + d.y) / 2)).toBeLessThan(0.01);
    }
  });

  test("that are hashed have bars across the bond that grow from the stereocentre outwards", () => {
    const hashed: Dossier = {
      ...sampleDossier,
      structure: {
        ...sampleDossier.structure,
        bonds: sampleDossier.structure.bonds.map((bond) =>
          bond.wedge === null ? bond : { ...bond, wedge: "hashed" },
        ),
      },
    };
    const bars = linesOf(wedgeScene(hashed), "hash").filter((line) => line.atoms[0] === 1);
    const lengths = bars.map(({ from, to }) => Math.hypot(to.x - from.x, to.y - from.y));
    expect(bars.length).toBeGreaterThanOrEqual(4);
    expect(lengths).toEqual([...lengths].sort((a, b) => a - b));
    expect(lengths.at(-1)).toBeGreaterThan(3 * lengths[0]!);
    expect(polygonsOf(hashed)).toEqual([]);
  });
});

describe("A flat diagram", () => {
  test("has one bond length", () => {
    const lengths = linesOf(wedgeScene(sampleDossier), "bond").map(({ from, to }) =>
      Math.hypot(to.x - from.x, to.y - from.y),
    );
    expect(Math.max(...lengths) - Math.min(...lengths)).toBeLessThan(0.1);
  });

  test("has letters for heteroatoms only, with hydrogens on the side away from the bond", () => {
    expect(lettersOf(sampleDossier.structure)).toEqual(["HO"]);
    expect(
      lettersOf(
        structure(
          [
            ["C", 0, 0, 3],
            ["O", 1.5, 0, 1],
          ],
          [[0, 1]],
        ),
      ),
    ).toEqual(["OH"]);
    expect(
      lettersOf(
        structure(
          [
            ["C", 0, 0, 3],
            ["N", -1.5, 0, 2],
          ],
          [[0, 1]],
        ),
      ),
    ).toEqual(["H2N"]);
    expect(
      lettersOf(
        structure(
          [
            ["C", 0, 0, 3],
            ["N", 1.5, 0, 3, 1],
          ],
          [[0, 1]],
        ),
      ),
    ).toEqual(["NH3+"]);
    expect(
      lettersOf(
        structure(
          [
            ["C", 0, 0, 3],
            ["O", 1.5, 0, 0, -1],
          ],
          [[0, 1]],
        ),
      ),
    ).toEqual(["O\u2212"]);
  });

  test("stacks the hydrogen of a nitrogen between two bonds above or below it", () => {
    const amine = structure(
      [
        ["C", -1.3, 0.75, 3],
        ["N", 0, 0, 1],
        ["C", 1.3, 0.75, 3],
      ],
      [
        [0, 1],
        [1, 2],
      ],
    );
    const [nitrogen, hydrogen] = textsOf(wedgeScene(flat(amine)), "atom label");
    expect([wordsOf(nitrogen!), wordsOf(hydrogen!)]).toEqual(["N", "H"]);
    expect(hydrogen!.box.top).toBeGreaterThan(nitrogen!.box.bottom);
  });

  test("writes mass numbers, the hydrogen isotopes by their own letters, and a lone carbon in full", () => {
    expect(
      lettersOf(
        structure(
          [
            ["C", 0, 0, 3, 0, 13],
            ["H", -1.5, 0, 0, 0, 2],
          ],
          [[0, 1]],
        ),
      ),
    ).toEqual(["13CH3", "D"]);
    expect(lettersOf(structure([["C", 0, 0, 4]], []))).toEqual(["CH4"]);
  });

  test("draws the second line of a double bond inside its ring, and on both sides at the end of a chain", () => {
    const corners = [0, 1, 2, 3, 4, 5].map((k): [string, number, number, number] => [
      "C",
      1.5 * Math.cos((k * Math.PI) / 3),
      1.5 * Math.sin((k * Math.PI) / 3),
      1,
    ]);
    const benzene = structure(
      corners,
      [0, 1, 2, 3, 4, 5].map((k): [number, number, 1 | 2] => [k, (k + 1) % 6, k % 2 === 0 ? 2 : 1]),
    );
    const radius = ({ from, to }: { from: { x: number; y: number }; to: { x: number; y: number } }) =>
      Math.hypot((from.x + to.x) / 2, (from.y + to.y) / 2);
    const lines = linesOf(wedgeScene(flat(benzene)), "bond");
    expect(lines).toHaveLength(9);
    const outer = Math.max(...lines.map(radius));
    expect(lines.filter((line) => radius(line) < 0.9 * outer)).toHaveLength(3);

    const ketone = structure(
      [
        ["C", 0, 0, 0],
        ["O", 0, 1.5, 0],
        ["C", -1.3, -0.75, 3],
        ["C", 1.3, -0.75, 3],
      ],
      [
        [0, 1, 2],
        [0, 2],
        [0, 3],
      ],
    );
    const pair = linesOf(wedgeScene(flat(ketone)), "bond").filter((line) => line.atoms[1] === 1);
    expect(pair.map((line) => Math.round(line.from.x * 100)).reduce((sum, x) => sum + x, 0)).toBe(0);
  });

  test("numbers the ring atoms and writes the descriptor at each stereocentre, clear of bonds and letters", () => {
    const scene = wedgeScene(sampleDossier);
    expect(textsOf(scene, "locant").map(wordsOf).sort()).toEqual(["1S", "2", "3R", "4", "5", "6"]);
    expect(collisions(scene)).toEqual([]);
    expect(textsOf(wedgeScene(sampleDossier, { locants: false }), "locant")).toEqual([]);
  });
});
