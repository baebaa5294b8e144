import { createRequire } from "node:module";
import type * as Library from "openchemlib";
import { describe, expect, test } from "vitest";
import { embed } from "../../../src/conformers/geometry/embed.ts";
import type { RestrainedPoint } from "../../../src/conformers/geometry/moleculeRestraints.ts";
import type { Coordinates } from "../../../src/conformers/geometry/placePoints.ts";
import { findOpenCentres } from "../../../src/structure/findOpenCentres.ts";
import { findOpenDoubleBonds } from "../../../src/structure/findOpenDoubleBonds.ts";
import type { Molecule } from "../../../src/structure/Molecule.ts";
import { randomRings } from "../../generators/randomRings.ts";
import { bareServices } from "../bareServices.ts";
import { arrangementsOf } from "./builtConformers.ts";

/**
 * The configurations of built coordinates as another library reads them from space.
 *
 * source: OpenChemLib (npm `openchemlib` 9.25.0). It reads the SMILES on one side, and on the other a molfile that holds
 * nothing but elements, charges, bond orders and our coordinates; both must have one canonical code.
 */
const OCL = createRequire(import.meta.url)("openchemlib") as typeof Library;

/** A molfile (V2000) without any mark of stereo: whoever reads it must take the senses from the coordinates. */
function molfile(molecule: Molecule, points: readonly RestrainedPoint[], coordinates: Coordinates): string {
  const column = (value: number, width: number) => String(value).padStart(width);
  const bonds = [
    ...molecule.bonds.map(({ from, to, order }) => [from, to, order] as const),
    ...points.flatMap(({ atom, parent }, i) => (atom === null ? [[parent!, i, 1] as const] : [])),
  ];
  return [
    "",
    "  test    3D",
    "",
    `${column(points.length, 3)}${column(bonds.length, 3)}  0  0  1  0  0  0  0  0999 V2000`,
    ...points.map(({ element }, i) => {
      const place = [0, 1, 2].map((k) => coordinates[3 * i + k]!.toFixed(4).padStart(10)).join("");
      return `${place} ${element.padEnd(3)} 0  0  0  0  0  0  0  0  0  0  0  0`;
    }),
    ...bonds.map(([a, b, order]) => `${column(a + 1, 3)}${column(b + 1, 3)}${column(order, 3)}  0`),
    ...molecule.atoms
      .filter(({ charge }) => charge !== 0)
      .map(({ index, charge }) => `M  CHG  1${column(index + 1, 4)}${column(charge, 4)}`),
    "M  END",
  ].join("\n");
}

/** Conformers of a SMILES whose configuration, read from space, is not that of the SMILES. */
async function compare(smiles: string, most: number) {
  const asked = OCL.Molecule.fromSmiles(smiles).getIDCode();
  const arrangements = (await arrangementsOf(smiles)).slice(0, most);
  const wrong = arrangements.flatMap((arrangement, n) => {
    const built = embed(arrangement, null);
    if (built === null) return [`${smiles}: conformer ${n} is not built`];
    const text = molfile(arrangement.molecule, built.points, built.coordinates);
    const found = OCL.Molecule.fromMolfile(text).getIDCode();
    return found === asked ? [] : [`${smiles}: conformer ${n} has another configuration`];
  });
  return { built: arrangements.length, wrong };
}

describe("The configurations of built coordinates (source: OpenChemLib 9.25.0, stereo read from coordinates)", () => {
  test.each([
    ["cis-1,2-dimethylcyclohexane", "C[C@H]1CCCC[C@H]1C", 2],
    ["trans-1,2-dimethylcyclohexane", "C[C@H]1CCCC[C@@H]1C", 2],
    ["cis-4-methylcyclohexanol", "C[C@H]1CC[C@H](O)CC1", 2],
    ["trans-4-methylcyclohexanol", "C[C@H]1CC[C@@H](O)CC1", 2],
    ["menthol", "C[C@@H]1CC[C@@H](C(C)C)[C@H](O)C1", 2],
    ["all-trans hexachlorocyclohexane", "Cl[C@@H]1[C@H](Cl)[C@@H](Cl)[C@H](Cl)[C@@H](Cl)[C@H]1Cl", 2],
    ["trans-decalin", "C1CC[C@@H]2CCCC[C@H]2C1", 1],
    ["cis-decalin", "C1CC[C@H]2CCCC[C@H]2C1", 2],
    ["trans-hydrindane", "C1CC[C@@H]2CCC[C@H]2C1", 1],
    ["spiro[5.5]undecane with two groups", "C[C@H]1CCC[C@]2(C1)CCC[C@@H](O)C2", 4],
    ["adamantane", "C1C2CC3CC1CC(C2)C3", 1],
    ["5α-androstan-17β-ol", "C[C@]12CC[C@H]3[C@H]([C@@H]1CC[C@@H]2O)CC[C@@H]1[C@]3(C)CCCC1", 1],
    ["5β-androstan-17β-ol", "C[C@]12CC[C@H]3[C@H]([C@@H]1CC[C@@H]2O)CC[C@H]1[C@]3(C)CCCC1", 1],
    ["a sulfoxide in the ring", "O=[S@]1CCC[C@@H](C)C1", 2],
    ["a sulfoxide beside the ring", "C[S@](=O)[C@H]1CC[C@H](C)CC1", 2],
    ["E and Z groups", "C/C=C/[C@H]1CC[C@H](/C=C\\C)CC1", 2],
    ["a cyclohexene", "C[C@H]1CC=CC[C@H]1C", 2],
    ["a tetralin", "C[C@H]1CC[C@@H](O)c2ccccc12", 2],
    ["a 4-tert-butylcyclohexanecarboxamide", "CC(C)(C)[C@H]1CC[C@@H](C(=O)NC)CC1", 2],
    ["a fused cyclopropane", "C[C@@H]1CC[C@H]2[C@@H](C1)C2(C)C", 2],
  ])("are those of the SMILES: %s (%s)", async (_name, smiles, most) => {
    const { built, wrong } = await compare(smiles, most);
    expect(built).toBe(most);
    expect(wrong).toEqual([]);
  });

  test("are those of the SMILES for 150 random molecules with all centres given", async () => {
    const { toolkit } = await bareServices();
    let molecules = 0;
    let conformers = 0;
    const wrong: string[] = [];
    for (const { smiles } of randomRings({ seed: 5, count: 400 })) {
      if (molecules >= 150) break;
      const read = toolkit.read(smiles);
      // What is open in the SMILES cannot be compared: the coordinates always decide.
      if (!read.ok || findOpenDoubleBonds(read.molecule, toolkit).length > 0) continue;
      if (findOpenCentres(read.molecule, toolkit).centres.length > 0) continue;
      const result = await compare(smiles, 2);
      if (result.built === 0) continue;
      molecules += 1;
      conformers += result.built;
      wrong.push(...result.wrong);
    }
    expect(wrong).toEqual([]);
    expect(molecules).toBe(150);
    expect(conformers).toBeGreaterThan(200);
  }, 120_000);
});
