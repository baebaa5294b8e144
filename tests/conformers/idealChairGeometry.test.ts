import { describe, expect, test } from "vitest";
import { enumerateConformers } from "../../src/conformers/enumerateConformers.ts";
import { idealChairGeometry, type PlacedAtom } from "../../src/conformers/idealChairGeometry.ts";
import { analyseRings } from "../../src/structure/analyseRings.ts";
import { findRings } from "../../src/structure/findRings.ts";
import { bareServices } from "./bareServices.ts";

async function chairs(smiles: string) {
  const services = await bareServices();
  const read = services.toolkit.read(smiles);
  if (!read.ok) throw new Error(read.reason);
  const search = findRings(read.molecule);
  if (!search.ok) throw new Error(search.refusal.message);
  const rings = analyseRings(read.molecule, search.rings, { ring: null, atoms: new Map() }, services);
  return enumerateConformers(read.molecule, rings)!.map(({ chairs: [chair] }) => ({
    chair: chair!,
    atoms: idealChairGeometry(read.molecule, chair!),
  }));
}

type Vector = readonly [number, number, number];
const between = (a: PlacedAtom, b: PlacedAtom): Vector => [b.x - a.x, b.y - a.y, b.z - a.z];
const length = (v: Vector) => Math.hypot(...v);
const angle = (a: Vector, b: Vector) =>
  (Math.acos((a[0] * b[0] + a[1] * b[1] + a[2] * b[2]) / length(a) / length(b)) * 180) / Math.PI;

describe("The ideal chair", () => {
  // source: cyclohexane by electron diffraction, C–C 1.536 Å, C–C–C 111.4°, torsion 54.9° from cos ω = −cos α/(1 + cos α);
  // values from memory. Coordinates are kept to 0.0001 Å, so lengths to 0.001 Å and angles to 0.1° must hold.
  test("has the bond length, angle and torsion of cyclohexane (source: electron diffraction, from memory)", async () => {
    for (const { chair, atoms } of await chairs("C1CCCCC1")) {
      const ring = chair.ring.atoms.map((index) => atoms.find((a) => a.atom === index)!);
      const at = (i: number) => ring[i % 6]!;
      for (let i = 0; i < 6; i++) {
        expect(length(between(at(i), at(i + 1)))).toBeCloseTo(1.536, 3);
        expect(angle(between(at(i + 1), at(i)), between(at(i + 1), at(i + 2)))).toBeCloseTo(111.4, 0);
      }
    }
  });

  test("has axial bonds along its threefold axis, alternately up and down", async () => {
    for (const { chair, atoms } of await chairs("C1CCCCC1")) {
      chair.ring.atoms.forEach((index, i) => {
        const own = atoms.find((a) => a.atom === index)!;
        const axial = atoms.filter((a) => a.parent === index).map((a) => between(own, a));
        const vertical = axial.filter((v) => Math.hypot(v[0], v[1]) < 1e-6);
        expect(vertical).toHaveLength(1);
        expect(Math.sign(vertical[0]![2])).toBe(chair.sign * (i % 2 === 0 ? 1 : -1));
      });
    }
  });

  test("has each equatorial bond parallel to the two ring bonds one removed", async () => {
    for (const { chair, atoms } of await chairs("C1CCCCC1")) {
      const ring = chair.ring.atoms.map((index) => atoms.find((a) => a.atom === index)!);
      ring.forEach((own, i) => {
        const equatorial = atoms
          .filter((a) => a.parent === own.atom)
          .map((a) => between(own, a))
          .find((v) => Math.hypot(v[0], v[1]) > 0.5)!;
        for (const [a, b] of [
          [i + 1, i + 2],
          [i + 5, i + 4],
        ]) {
          const bond = between(ring[b! % 6]!, ring[a! % 6]!);
          const turn = angle(equatorial, bond);
          expect(Math.min(turn, 180 - turn)).toBeLessThan(0.1);
        }
      });
    }
  });

  test("puts a group on the face that its configuration demands, whatever the chair", async () => {
    for (const { chair, atoms } of await chairs("C[C@H]1CC[C@@H](O)CC1")) {
      for (const substituent of chair.ring.substituents) {
        const own = atoms.find((a) => a.atom === substituent.ringAtom)!;
        const group = atoms.find((a) => a.atom === substituent.atom)!;
        const hydrogen = atoms.find((a) => a.parent === substituent.ringAtom && a.atom === null)!;
        expect(group.z > hydrogen.z).toBe(chair.faces.get(substituent.atom) === "up");
        expect(length(between(own, group))).toBeGreaterThan(1.3);
      }
    }
  });
});
