import { describe, expect, test } from "vitest";
import { type Chair, orientationOf } from "../../../src/conformers/Chair.ts";
import type { Arrangement } from "../../../src/conformers/enumerateConformers.ts";
import { type Embedded, embed } from "../../../src/conformers/geometry/embed.ts";
import { bondBetween } from "../../../src/structure/Molecule.ts";
import { arrangementsOf, placeOf, torsionOf } from "./builtConformers.ts";

type Vector = readonly [number, number, number];
const at = ({ coordinates }: Embedded, i: number): Vector => {
  const { x, y, z } = placeOf(coordinates, i);
  return [x, y, z];
};
const minus = (a: Vector, b: Vector): Vector => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
const dot = (a: Vector, b: Vector) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const apart = (built: Embedded, i: number, j: number) => Math.hypot(...minus(at(built, i), at(built, j)));
const pointOf = ({ points }: Embedded, atom: number) => points.findIndex((point) => point.atom === atom);

const turn = (degrees: number) => Math.abs(((((degrees + 180) % 360) + 360) % 360) - 180);

async function built(smiles: string): Promise<readonly { arrangement: Arrangement; built: Embedded }[]> {
  return (await arrangementsOf(smiles)).map((arrangement) => {
    const result = embed(arrangement, null);
    if (result === null) throw new Error(`${smiles} is not built`);
    return { arrangement, built: result };
  });
}

/** Cosine of the angle between a bond and the axis of a ring: 1 for axial bonds, 1/3 for equatorial ones. */
function alongAxis(structure: Embedded, { ring }: Chair, from: number, to: number): number {
  const places = ring.atoms.map((atom) => at(structure, pointOf(structure, atom)));
  const axis = places.reduce<Vector>(
    (sum, place, k) => {
      const area = cross(place, places[(k + 1) % 6]!);
      return [sum[0] + area[0], sum[1] + area[1], sum[2] + area[2]];
    },
    [0, 0, 0],
  );
  const bond = minus(at(structure, pointOf(structure, to)), at(structure, pointOf(structure, from)));
  return Math.abs(dot(bond, axis)) / Math.sqrt(dot(bond, bond) * dot(axis, axis));
}

const MOLECULES: readonly (readonly [name: string, smiles: string])[] = [
  ["cyclohexane", "C1CCCCC1"],
  ["1,1-dimethylcyclohexane", "CC1(C)CCCCC1"],
  ["3,3-dimethylcyclohexanol", "CC1(C)CCC[C@H](O)C1"],
  ["1,1-difluorocyclohexane", "FC1(F)CCCCC1"],
  ["menthol", "C[C@@H]1CC[C@@H](C(C)C)[C@H](O)C1"],
  ["trans-decalin", "C1CC[C@@H]2CCCC[C@H]2C1"],
  ["cis-decalin", "C1CC[C@H]2CCCC[C@H]2C1"],
  ["trans-hydrindane", "C1CC[C@@H]2CCC[C@H]2C1"],
  ["spiro[5.5]undecane", "C1CCC2(CC1)CCCCC2"],
  ["1,7-dioxaspiro[5.5]undecane", "C1CCOC2(C1)CCCCO2"],
  ["a spiro acetal of cyclohexanone with gem-dimethyl", "CC1(C)OCC2(CO1)CCCCC2"],
  ["adamantane", "C1C2CC3CC1CC(C2)C3"],
  ["bicyclo[3.3.1]nonane", "C1CC2CCCC(C1)C2"],
  ["bicyclo[2.2.2]octane", "C1CC2CCC1CC2"],
  ["norbornane", "C1CC2CCC1C2"],
  ["N-methylpiperidine", "CN1CCCCC1"],
  ["cyclohexene", "C1CCC=CC1"],
  ["tetralin", "c1ccc2c(c1)CCCC2"],
  ["5α-androstan-17β-ol", "C[C@]12CC[C@H]3[C@H]([C@@H]1CC[C@@H]2O)CC[C@@H]1[C@]3(C)CCCC1"],
];

describe("Coordinates built from an arrangement", () => {
  test.each(MOLECULES)(
    "have the ring torsions asked for, with their signs: %s (%s)",
    async (_name, smiles) => {
      for (const { built: structure } of await built(smiles)) {
        expect(structure.torsions.length).toBeGreaterThan(0);
        for (const { atoms, degrees } of structure.torsions) {
          const found = torsionOf(structure.points, structure.coordinates, atoms);
          expect(turn(found - degrees)).toBeLessThan(20);
          if (Math.abs(degrees) > 25) expect(Math.sign(found)).toBe(Math.sign(degrees));
        }
      }
    },
  );

  test.each(MOLECULES)(
    "put every atom called axial along the axis, and no other: %s (%s)",
    async (_name, smiles) => {
      for (const { arrangement, built: structure } of await built(smiles)) {
        for (const chair of arrangement.chairs) {
          if (chair.form !== "chair") {
            expect(["half-chair", "boat"]).toContain(chair.form);
            continue;
          }
          const bonds = [...chair.ring.substituents, ...chair.ring.branches];
          expect(bonds.map(({ atom }) => chair.faces.has(atom))).not.toContain(false);
          for (const bond of bonds) {
            const found =
              alongAxis(structure, chair, bond.ringAtom, bond.atom) > 0.67 ? "axial" : "equatorial";
            expect(`${bond.atom} ${found}`).toBe(`${bond.atom} ${orientationOf(chair, bond)}`);
          }
        }
      }
    },
  );

  test.each(MOLECULES)(
    "keep the order of the input, hydrogens last, at sound distances: %s (%s)",
    async (_name, smiles) => {
      for (const { arrangement, built: structure } of await built(smiles)) {
        const { points } = structure;
        const { molecule } = arrangement;
        const heavy = molecule.atoms.length;
        expect(points.slice(0, heavy).map(({ atom }) => atom)).toEqual(
          molecule.atoms.map(({ index }) => index),
        );
        expect(points.slice(heavy).map(({ element, atom, parent }) => [element, atom, parent])).toEqual(
          molecule.atoms.flatMap(({ index, hydrogens }) =>
            Array.from({ length: hydrogens }, () => ["H", null, index]),
          ),
        );
        points.forEach((point, i) => {
          for (let j = i + 1; j < points.length; j++) {
            const other = points[j]!;
            const bonded =
              other.atom === null
                ? other.parent === point.atom && point.atom !== null
                : bondBetween(molecule, point.atom!, other.atom) !== undefined;
            const distance = apart(structure, i, j);
            // Bonds to hydrogen are near 1.1 Å, others near 1.3 to 1.6 Å; hydrogens of one carbon are 1.75 Å apart.
            if (!bonded) expect(distance).toBeGreaterThan(1.5);
            else expect(Math.abs(distance - (other.atom === null ? 1.05 : 1.45))).toBeLessThan(0.2);
          }
        });
      }
    },
  );

  test("turn a group as a rotamer asks", async () => {
    const [arrangement] = await arrangementsOf("CCC1CCCCC1");
    for (const degrees of [60, 180, -60]) {
      const atoms = [3, 2, 1, 0] as const;
      const structure = embed(arrangement!, null, [{ atoms, degrees }])!;
      expect(turn(torsionOf(structure.points, structure.coordinates, atoms) - degrees)).toBeLessThan(15);
    }
  });

  test("are the same bytes on every run", async () => {
    for (const smiles of ["C[C@@H]1CC[C@@H](C(C)C)[C@H](O)C1", "C1CC[C@H]2CCCC[C@H]2C1"]) {
      for (const arrangement of await arrangementsOf(smiles)) {
        const [first, second] = [embed(arrangement, null)!, embed(arrangement, null)!];
        expect(Buffer.from(second.coordinates.buffer).equals(Buffer.from(first.coordinates.buffer))).toBe(
          true,
        );
      }
    }
  });

  test("are refused where no coordinates can have what is asked: trans-decalin with one ring turned over", async () => {
    const [arrangement] = await arrangementsOf("C1CC[C@@H]2CCCC[C@H]2C1");
    const [first, second] = arrangement!.chairs as readonly [Chair, Chair];
    const turned: Chair = { ...second, torsions: second.torsions.map((degrees) => -degrees) };
    expect(embed({ ...arrangement!, chairs: [first, turned] }, null)).toBeNull();
  });
});

describe("Ideal coordinates of a ring system (common practice: chairs lie on the diamond lattice)", () => {
  test.each([
    ["trans-decalin", "C1CC[C@@H]2CCCC[C@H]2C1"],
    ["cis-decalin", "C1CC[C@H]2CCCC[C@H]2C1"],
    ["spiro[5.5]undecane", "C1CCC2(CC1)CCCCC2"],
    ["adamantane", "C1C2CC3CC1CC(C2)C3"],
    ["trans-1-oxadecalin", "C1CC[C@@H]2OCCC[C@H]2C1"],
    ["trans-decalin with an angular methyl group", "C[C@]12CCCC[C@@H]1CCCC2"],
  ])("have bonds of 1.53 Å, torsions of 60° and parallel axial bonds: %s (%s)", async (_name, smiles) => {
    const arrangements = await arrangementsOf(smiles);
    expect(arrangements.length).toBeGreaterThan(0);
    for (const arrangement of arrangements) {
      const atoms = new Set(arrangement.molecule.rings.flat());
      const structure = embed(arrangement, atoms)!;
      for (const { atoms: four } of structure.torsions) {
        expect(Math.abs(torsionOf(structure.points, structure.coordinates, four))).toBeCloseTo(60, 2);
        const [a, b] = [pointOf(structure, four[0]), pointOf(structure, four[1])];
        expect(apart(structure, a, b)).toBeCloseTo(1.53, 3);
      }
      for (const { ring } of arrangement.chairs) {
        const places = ring.atoms.map((atom) => pointOf(structure, atom));
        const axis = cross(
          minus(at(structure, places[2]!), at(structure, places[0]!)),
          minus(at(structure, places[4]!), at(structure, places[0]!)),
        );
        for (const own of places) {
          const bonds = structure.points.flatMap(({ atom, parent }, i) => {
            const isBound =
              parent === null
                ? !ring.atoms.includes(atom!) &&
                  bondBetween(arrangement.molecule, atom!, structure.points[own]!.atom!) !== undefined
                : parent === structure.points[own]!.atom;
            return isBound ? [minus(at(structure, i), at(structure, own))] : [];
          });
          const sines = bonds.map((bond) => {
            const [x, y, z] = cross(bond, axis);
            return Math.hypot(x, y, z) / Math.sqrt(dot(bond, bond) * dot(axis, axis));
          });
          const expected = structure.points[own]!.element === "C" ? 1 : 0;
          expect(sines.filter((sine) => sine < 1e-3)).toHaveLength(expected);
        }
      }
    }
  });
});
