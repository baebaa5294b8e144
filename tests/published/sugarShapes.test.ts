import { beforeAll, describe, expect, test } from "vitest";
import { analyseCompound } from "../../src/dossier/analysis/analyseCompound.ts";
import type { Services } from "../../src/dossier/analysis/Services.ts";
import type { Conformer } from "../../src/dossier/Dossier.ts";
import { loadServices } from "../../src/site/loadServices.ts";

/**
 * Sugars whose ring shapes every textbook of carbohydrate chemistry gives: the symbol depends on the absolute
 * configuration, so that these hold the sides of the ring from SMILES to symbol.
 *
 * source: JCBN, Pure Appl. Chem. 1981, 53, 1901 and 2-Carb-7 (D-glucopyranose ⁴C₁, its enantiomer ¹C₄); Brown & Levy,
 * Acta Cryst. B 1979, 35, 656 (α-D-glucose by neutron diffraction, torsions); Park, Kim & Jeffrey, Acta Cryst. B 1971,
 * 27, 220 (1,6-anhydro-β-D-glucopyranose, ¹C₄). All from memory.
 */
let services: Services;
beforeAll(async () => {
  services = await loadServices({ mechanics: true });
});

function conformers(smiles: string): readonly Conformer[] {
  const result = analyseCompound(
    { smiles, ringLocants: null, temperature_K: 298.15, solvent: null, enumerateStereoisomers: false },
    services,
  );
  if (!result.ok) throw new Error(result.refusal.message);
  return result.analysis.conformers;
}

function ringOf(smiles: string, orientations: string) {
  const found = conformers(smiles).find(
    ({ positions }) => positions.map(({ orientation }) => orientation[0]).join("") === orientations,
  );
  return found!.relaxed!.puckering[0]!;
}

describe("Shapes of pyranose rings", () => {
  test.each([
    ["β-D-glucopyranose", "OC[C@H]1O[C@@H](O)[C@H](O)[C@@H](O)[C@@H]1O", "eeeee", "^4C_1"],
    ["β-L-glucopyranose", "OC[C@@H]1O[C@H](O)[C@@H](O)[C@H](O)[C@H]1O", "eeeee", "^1C_4"],
    ["α-D-glucopyranose", "OC[C@H]1O[C@H](O)[C@H](O)[C@@H](O)[C@@H]1O", "aeeee", "^4C_1"],
    ["β-D-fructopyranose", "OC[C@@]1(O)OC[C@@H](O)[C@@H](O)[C@@H]1O", "eaeea", "^2C_5"],
    ["α-L-rhamnopyranose", "C[C@@H]1O[C@@H](O)[C@H](O)[C@H](O)[C@H]1O", "aaeee", "^1C_4"],
  ])(
    "%s with its usual places is the chair that handbooks name (source: JCBN 1981, from memory)",
    (_name, smiles, orientations, symbol) => {
      const shape = ringOf(smiles, orientations);
      expect(shape.symbol).toBe(symbol);
      expect(shape.nearest).toBe("chair");
      // Real pyranoses lie within about 10° of the pole.
      expect(shape.distance_deg).toBeLessThan(10);
    },
  );

  test("α-D-glucopyranose has the torsions of the crystal within 6°, with their signs (source: Brown & Levy 1979, from memory)", () => {
    const { torsions_deg } = ringOf("OC[C@H]1O[C@H](O)[C@H](O)[C@@H](O)[C@@H]1O", "aeeee");
    // About O5–C1, C1–C2, C2–C3, C3–C4, C4–C5, C5–O5; a force field in the gas phase is not the crystal.
    for (const [k, published] of [-61, 54, -51, 53, -57, 62].entries()) {
      expect(Math.abs(torsions_deg[k]! - published)).toBeLessThan(6);
    }
  });

  test("1,6-anhydro-β-D-glucopyranose is ¹C₄, flattened at the oxygen towards the envelope E_O (source: Park, Kim & Jeffrey 1971, from memory)", () => {
    const [only] = conformers("O[C@@H]1[C@@H](O)[C@H]2CO[C@H](O2)[C@@H]1O");
    const shape = only!.relaxed!.puckering[0]!;
    expect(shape.symbol).toBe("^1C_4");
    // The envelope lies at θ = 125°, φ = 180°.
    expect(shape.theta_deg).toBeLessThan(175);
    expect(Math.abs(shape.phi_deg! - 180)).toBeLessThan(20);
  });
});
