import { createRequire } from "node:module";
import type { MainModule } from "@rdkit/rdkit";
import { beforeAll, describe, expect, it } from "vitest";
import type { Group, RingParent } from "../../src/register/Register.ts";
import { benchStructure, type FaceGroups } from "../../src/structure/benchStructure.ts";

/**
 * Configurations written with faces, against SMILES and descriptors that were written by others.
 *
 * Sources: IUPAC-IUBMB Nomenclature of Carbohydrates 1996, 2-Carb-5.4 (the Haworth representation: ring seen
 * from above, numbered clockwise) with the textbook Haworth formula of beta-D-glucopyranose; its SMILES and
 * descriptors and those of (-)-menthol as in the PubChem records CID 64689 and 16666, from memory.
 * The library (RDKit) only compares: it reads both SMILES and assigns CIP descriptors by itself.
 */
let rdkit: MainModule;
beforeAll(async () => {
  const initialise = createRequire(import.meta.url)("@rdkit/rdkit") as () => Promise<MainModule>;
  rdkit = await initialise();
});

const group = (key: string, smiles: string): Group => ({
  key,
  aliases: [],
  prefix: key,
  smiles,
  label: key,
  labelReversed: key,
  groupClass: "any",
});
const OH = group("OH", "[*]O");
const Me = group("Me", "[*]C");
const iPr = group("i-Pr", "[*]C(C)C");
const CH2OH = group("CH2OH", "[*]CO");
const ring = (name: string, elements: string): RingParent => ({
  name,
  aliases: [],
  elements: elements.split(" "),
});

function read(smiles: string): { canonical: string; descriptors: Map<number, string> } {
  const mol = rdkit.get_mol(smiles);
  if (mol === null) throw new Error(`refused: ${smiles}`);
  try {
    const tags = JSON.parse(mol.get_stereo_tags()) as { CIP_atoms: [number, string][] };
    return {
      canonical: mol.get_smiles(),
      descriptors: new Map(tags.CIP_atoms.map(([atom, tag]) => [atom, tag.replace(/[()]/g, "")])),
    };
  } finally {
    mol.delete();
  }
}

function bench(parent: RingParent, groups: Record<number, FaceGroups>) {
  const structure = benchStructure(
    parent,
    new Map(Object.entries(groups).map(([locant, faces]) => [Number(locant), faces])),
  );
  const { canonical, descriptors } = read(structure.smiles);
  return {
    canonical,
    at: (...locants: number[]) => locants.map((k) => descriptors.get(structure.ringLocants[k - 1]!)),
  };
}

describe("faces up and down", () => {
  it("are those of the Haworth formula: beta-D-glucopyranose (source: 2-Carb-5.4; PubChem CID 64689, from memory)", () => {
    const glucose = bench(ring("oxane", "O C C C C C"), {
      2: { up: OH },
      3: { down: OH },
      4: { up: OH },
      5: { down: OH },
      6: { up: CH2OH },
    });
    expect(glucose.canonical).toBe(read("C([C@@H]1[C@H]([C@@H]([C@H]([C@@H](O1)O)O)O)O)O").canonical);
    expect(glucose.at(2, 3, 4, 5, 6)).toEqual(["R", "R", "S", "S", "R"]);
  });

  it("give (1R,2S,5R)-menthol, all three groups equatorial in one chair (source: PubChem CID 16666, from memory)", () => {
    const menthol = bench(ring("cyclohexane", "C C C C C C"), {
      1: { up: OH },
      2: { down: iPr },
      5: { up: Me },
    });
    expect(menthol.canonical).toBe(read("C[C@@H]1CC[C@H]([C@@H](C1)O)C(C)C").canonical);
    expect(menthol.at(1, 2, 5)).toEqual(["R", "S", "R"]);
  });
});
