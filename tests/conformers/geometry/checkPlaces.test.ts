import { describe, expect, test } from "vitest";
import { checkPlaces } from "../../../src/conformers/geometry/checkPlaces.ts";
import { embed } from "../../../src/conformers/geometry/embed.ts";
import { mirrorImage } from "../../../src/structure/Molecule.ts";
import { arrangementsOf, torsionOf } from "./builtConformers.ts";

/** trans-1,2-Dimethylcyclohexane, built; every test changes one thing. */
async function example() {
  const [arrangement] = await arrangementsOf("C[C@H]1CCCC[C@@H]1C");
  const { points, coordinates, torsions } = embed(arrangement!, null)!;
  return { molecule: arrangement!.molecule, points, coordinates, torsions };
}

describe("The check of coordinates", () => {
  test("accepts what was asked for", async () => {
    const { molecule, points, coordinates, torsions } = await example();
    expect(checkPlaces(molecule, points, coordinates, torsions, 35)).toBe(true);
  });

  test("refuses the mirror image of the substance", async () => {
    const { molecule, points, coordinates, torsions } = await example();
    expect(checkPlaces(mirrorImage(molecule), points, coordinates, torsions, 35)).toBe(false);
  });

  test("refuses coordinates reflected in a plane, with every torsion reversed to match", async () => {
    const { molecule, points, coordinates, torsions } = await example();
    const reflected = coordinates.map((value, k) => (k % 3 === 0 ? -value : value));
    const reversed = torsions.map(({ atoms, degrees }) => ({ atoms, degrees: -degrees }));
    expect(checkPlaces(molecule, points, reflected, reversed, 35)).toBe(false);
  });

  test("refuses a ring torsion off by more than the tolerance, or of the other sign", async () => {
    const { molecule, points, coordinates, torsions } = await example();
    const [first, ...others] = torsions;
    const found = torsionOf(points, coordinates, first!.atoms);
    const withFirst = (degrees: number) => [{ ...first!, degrees }, ...others];
    expect(checkPlaces(molecule, points, coordinates, withFirst(found + Math.sign(found) * 20), 35)).toBe(
      true,
    );
    expect(checkPlaces(molecule, points, coordinates, withFirst(found + Math.sign(found) * 40), 35)).toBe(
      false,
    );
    expect(checkPlaces(molecule, points, coordinates, withFirst(-Math.sign(found) * 15), 90)).toBe(false);
  });

  test("refuses a bond that is folded through the other three, although those keep their sense", async () => {
    const { molecule, points, coordinates, torsions } = await example();
    const centre = molecule.atoms.find(({ stereo }) => stereo !== null)!;
    const first = centre.neighbours[0]!;
    // The first listed neighbour is carried to the far side of the centre; nothing else moves.
    const folded = coordinates.slice();
    for (let k = 0; k < 3; k++) {
      const own = coordinates[3 * centre.index + k]!;
      folded[3 * first + k] = 2 * own - coordinates[3 * first + k]!;
    }
    const withoutIt = torsions.filter(({ atoms }) => !atoms.includes(first));
    expect(checkPlaces(molecule, points, coordinates, withoutIt, 35)).toBe(true);
    expect(checkPlaces(molecule, points, folded, withoutIt, 35)).toBe(false);
  });
});
