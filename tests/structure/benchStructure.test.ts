import { createRequire } from "node:module";
import type { MainModule } from "@rdkit/rdkit";
import fc from "fast-check";
import { beforeAll, describe, expect, it } from "vitest";
import type { Group, RingParent } from "../../src/register/Register.ts";
import { benchStructure, type FaceGroups } from "../../src/structure/benchStructure.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";
import { ringAtomCapacity } from "../../src/structure/ringAtomCapacity.ts";
import { ringFaces } from "../../src/structure/ringFaces.ts";

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
const Me = group("Me", "[*]C");
const OH = group("OH", "[*]O");
const Cl = group("Cl", "[*]Cl");
const Ph = group("Ph", "[*]c1ccccc1");
const D = group("D", "[*][2H]");
const oxo = group("=O", "[*]=O");
const cyclohexyl = group("cyclohexyl", "[*]C1CCCCC1");
const norbornyl = group("big", "[*]C1CC2CCC1C2");

const ring = (name: string, elements: string): RingParent => ({
  name,
  aliases: [],
  elements: elements.split(" "),
});
const cyclohexane = ring("cyclohexane", "C C C C C C");
const PARENTS: readonly RingParent[] = [
  cyclohexane,
  ring("oxane", "O C C C C C"),
  ring("thiane", "S C C C C C"),
  ring("selenane", "Se C C C C C"),
  ring("piperidine", "N C C C C C"),
  ring("phosphinane", "P C C C C C"),
  ring("arsinane", "As C C C C C"),
  ring("silinane", "Si C C C C C"),
  ring("germinane", "Ge C C C C C"),
  ring("borinane", "B C C C C C"),
  ring("1,3-dioxane", "O C O C C C"),
  ring("1,4-dioxane", "O C C O C C"),
  ring("1,3-dithiane", "S C S C C C"),
  ring("1,3-oxathiane", "O C S C C C"),
  ring("1,4-oxathiane", "O C C S C C"),
  ring("morpholine", "O C C N C C"),
  ring("thiomorpholine", "S C C N C C"),
  ring("piperazine", "N C C N C C"),
  ring("hexahydropyrimidine", "N C N C C C"),
  ring("1,3,5-trithiane", "S C S C S C"),
];

const bench = (parent: RingParent, groups: Record<number, FaceGroups>) =>
  benchStructure(parent, new Map(Object.entries(groups).map(([locant, faces]) => [Number(locant), faces])));

function withMol<T>(smiles: string, use: (mol: NonNullable<ReturnType<MainModule["get_mol"]>>) => T): T {
  const mol = rdkit.get_mol(smiles);
  if (mol === null) throw new Error(`RDKit refuses ${smiles}`);
  try {
    return use(mol);
  } finally {
    mol.delete();
  }
}
const canonical = (smiles: string) => withMol(smiles, (mol) => mol.get_smiles());
const descriptors = (smiles: string) =>
  withMol(smiles, (mol) => {
    const tags = JSON.parse(mol.get_stereo_tags()) as { CIP_atoms: [number, string][] };
    return new Map(tags.CIP_atoms.map(([atom, tag]) => [atom, tag.replace(/[()]/g, "")]));
  });
/** CIP descriptors at the given locants. */
const at = (structure: { smiles: string; ringLocants: readonly number[] }, ...locants: number[]) =>
  locants.map((locant) => descriptors(structure.smiles).get(structure.ringLocants[locant - 1]!) ?? "none");

describe("bench notation written as SMILES", () => {
  it("gives the dimethylcyclohexanes of the textbook SMILES (common practice, read by RDKit)", () => {
    const pairs: [number, "up" | "down", string][] = [
      [2, "up", "C[C@H]1CCCC[C@H]1C"],
      [3, "up", "C[C@H]1CCC[C@@H](C)C1"],
      [4, "up", "C[C@H]1CC[C@@H](C)CC1"],
      [4, "down", "C[C@H]1CC[C@H](C)CC1"],
    ];
    const made = pairs.map(([locant, face]) =>
      bench(cyclohexane, { 1: { up: Me }, [locant]: { [face]: Me } }),
    );
    expect(made.map(({ smiles }) => canonical(smiles))).toEqual(
      pairs.map(([, , smiles]) => canonical(smiles)),
    );
  });

  it("gives the CIP descriptors that cis and trans have (common practice)", () => {
    const both = (locant: number, face: "up" | "down") =>
      at(bench(cyclohexane, { 1: { up: Me }, [locant]: { [face]: Me } }), 1, locant);
    expect(both(4, "up")).toEqual(["s", "s"]);
    expect(both(4, "down")).toEqual(["r", "r"]);
    expect(new Set(both(2, "up"))).toEqual(new Set(["R", "S"]));
    expect(new Set(both(2, "down")).size).toBe(1);
    expect(new Set(both(3, "up"))).toEqual(new Set(["R", "S"]));
    expect(new Set(both(3, "down")).size).toBe(1);
  });

  it("honours the absolute sense of up, worked by hand for 2-methyloxane", () => {
    // Ring seen from above, locants clockwise, C2 at twelve o'clock: O1 lies lower left, C3 lower right, the
    // methyl group comes towards the viewer, the hydrogen points away. Priorities: O1 > C3 (C,H,H) > CH3 (H,H,H).
    // The hydrogen is at the back, so the viewer reads O1 (lower left) -> C3 (lower right) -> methyl (top):
    // counter-clockwise, hence S.
    expect(at(bench(ring("oxane", "O C C C C C"), { 2: { up: Me } }), 2)).toEqual(["S"]);
    expect(at(bench(ring("oxane", "O C C C C C"), { 2: { down: Me } }), 2)).toEqual(["R"]);
  });

  it("names the SMILES atoms at locants 1 to 6 whatever hangs on the ring", () => {
    const { smiles, ringLocants } = bench(ring("oxane", "O C C C C C"), {
      2: { up: Ph },
      4: { up: Cl, down: Me },
    });
    withMol(smiles, (mol) => {
      const json = JSON.parse(mol.get_json()) as {
        molecules: { atoms: { z?: number }[]; bonds: { atoms: [number, number] }[] }[];
      };
      const { atoms, bonds } = json.molecules[0]!;
      expect(ringLocants.map((atom) => atoms[atom]?.z ?? 6)).toEqual([8, 6, 6, 6, 6, 6]);
      for (const [index, atom] of ringLocants.entries()) {
        const next = ringLocants[(index + 1) % 6]!;
        expect(bonds.some(({ atoms: pair }) => pair.includes(atom) && pair.includes(next))).toBe(true);
      }
    });
  });

  it("keeps the rings of the groups apart from the parent ring", () => {
    const { smiles } = bench(cyclohexane, { 1: { up: norbornyl }, 4: { up: cyclohexyl }, 6: { down: Ph } });
    withMol(smiles, (mol) =>
      expect(JSON.parse(mol.get_descriptors())).toMatchObject({
        NumRings: 5,
        NumAromaticRings: 1,
        NumBridgeheadAtoms: 2,
      }),
    );
  });

  it("writes no mark where both faces carry the same group, and an ammonium ion for two groups on nitrogen", () => {
    expect(bench(cyclohexane, { 1: { up: Me, down: Me } }).smiles).not.toContain("@");
    expect(bench(ring("piperidine", "N C C C C C"), { 1: { up: Me } }).smiles).not.toContain("@");
    expect(canonical(bench(ring("piperidine", "N C C C C C"), { 1: { up: Me, down: Me } }).smiles)).toBe(
      canonical("C[N+]1(C)CCCCC1"),
    );
  });

  it("tells cis from trans at sulfoxides, phosphorus and deuterium", () => {
    const differ = (parent: RingParent, a: Record<number, FaceGroups>, b: Record<number, FaceGroups>) =>
      expect(canonical(bench(parent, a).smiles)).not.toBe(canonical(bench(parent, b).smiles));
    const thiane = ring("thiane", "S C C C C C");
    differ(thiane, { 1: { up: oxo }, 4: { up: Me } }, { 1: { down: oxo }, 4: { up: Me } });
    const phosphinane = ring("phosphinane", "P C C C C C");
    differ(phosphinane, { 1: { up: Ph }, 4: { up: Me } }, { 1: { down: Ph }, 4: { up: Me } });
    differ(cyclohexane, { 1: { up: D }, 4: { up: OH } }, { 1: { down: D }, 4: { up: OH } });
  });

  const face = fc.constantFrom(Me, OH, Cl, Ph, D, cyclohexyl, norbornyl);
  const locants = fc.uniqueArray(
    fc.record({ locant: fc.integer({ min: 1, max: 6 }), up: fc.option(face), down: fc.option(face) }),
    { selector: (entry) => entry.locant, maxLength: 6 },
  );
  const placeable = (
    parent: RingParent,
    entries: { locant: number; up: Group | null; down: Group | null }[],
  ) => {
    const groups = new Map<number, FaceGroups>();
    for (const { locant, up, down } of entries) {
      const room = ringAtomCapacity(parent.elements[locant - 1]!).single;
      const faces: FaceGroups = {
        ...(up !== null && room > 0 ? { up } : {}),
        ...(down !== null && room > 1 ? { down } : {}),
      };
      if (faces.up !== undefined || faces.down !== undefined) groups.set(locant, faces);
    }
    return groups;
  };

  it("is readable for every parent ring and any groups, and the view from below gives the same substance", () => {
    fc.assert(
      fc.property(fc.constantFrom(...PARENTS), locants, (parent, entries) => {
        const groups = placeable(parent, entries);
        const direct = canonical(benchStructure(parent, groups).smiles);
        // Turned over, the locants run the other way round and the faces change places.
        const turned = ring(parent.name, [...parent.elements].reverse().join(" "));
        const turnedGroups = new Map(
          [...groups].map(([locant, { up, down }]) => [
            7 - locant,
            { ...(down === undefined ? {} : { up: down }), ...(up === undefined ? {} : { down: up }) },
          ]),
        );
        expect(canonical(benchStructure(turned, turnedGroups).smiles)).toBe(direct);
      }),
      { seed: 6, numRuns: 300 },
    );
  });

  it("does not depend on which locant stands first", () => {
    fc.assert(
      fc.property(locants, fc.integer({ min: 1, max: 5 }), (entries, shift) => {
        const groups = placeable(cyclohexane, entries);
        const shifted = new Map(
          [...groups].map(([locant, faces]) => [((locant - 1 + shift) % 6) + 1, faces]),
        );
        expect(canonical(benchStructure(cyclohexane, shifted).smiles)).toBe(
          canonical(benchStructure(cyclohexane, groups).smiles),
        );
      }),
      { seed: 61, numRuns: 200 },
    );
  });

  it("puts every group on the face where the structure's own reading finds it", async () => {
    const toolkit = await loadToolkit();
    const firstAtom = new Map([
      ["Me", "C"],
      ["OH", "O"],
      ["Cl", "Cl"],
      ["=O", "O"],
    ]);
    const simple = fc.option(fc.constantFrom(Me, OH, Cl));
    const entries = fc.uniqueArray(
      fc.record({ locant: fc.integer({ min: 1, max: 6 }), up: simple, down: simple }),
      { selector: ({ locant }) => locant, minLength: 1, maxLength: 6 },
    );
    let compared = 0;
    fc.assert(
      fc.property(fc.constantFrom(...PARENTS), entries, (parent, chosen) => {
        const groups = new Map(placeable(parent, chosen));
        for (const { locant, up } of chosen) {
          // Sulfoxides: wherever a group was drawn for a sulfur atom, oxygen stands on that face instead.
          if (["S", "Se", "Te"].includes(parent.elements[locant - 1]!)) {
            groups.set(locant, up === null ? { down: oxo } : { up: oxo });
          }
        }
        const { smiles, ringLocants } = benchStructure(parent, groups);
        const read = toolkit.read(smiles);
        if (!read.ok) throw new Error(`${smiles}: ${read.reason}`);
        const element = (atom: number | null) =>
          atom === null ? undefined : read.molecule.atoms[atom]!.element;
        for (const [index, site] of ringFaces(read.molecule, ringLocants).entries()) {
          if (site.faces !== "fixed") continue;
          const { up, down } = groups.get(index + 1) ?? {};
          compared += 1;
          expect([element(site.up), element(site.down)]).toEqual(
            [up, down].map((hung) => (hung === undefined ? undefined : firstAtom.get(hung.key))),
          );
        }
      }),
      { seed: 62, numRuns: 1000 },
    );
    expect(compared).toBeGreaterThan(200);
  });
});
