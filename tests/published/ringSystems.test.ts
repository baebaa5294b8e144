import { describe, expect, test } from "vitest";
import { orientationOf } from "../../src/conformers/Chair.ts";
import { type Arrangement, enumerateConformers } from "../../src/conformers/enumerateConformers.ts";
import { analyseRings } from "../../src/structure/analyseRings.ts";
import { chiralityOf } from "../../src/structure/chiralityOf.ts";
import { findOpenCentres } from "../../src/structure/findOpenCentres.ts";
import { findRings } from "../../src/structure/findRings.ts";
import { fusionsOf } from "../../src/structure/fusionsOf.ts";
import { bareServices } from "../conformers/bareServices.ts";

/**
 * Numbers of all-chair conformers and the places of the ring bonds at the fusion atoms.
 *
 * source: W. S. Johnson, J. Am. Chem. Soc. 1953, 75, 1498 (fused systems by chairs and gauche contacts); E. L. Eliel,
 * S. H. Wilen, L. N. Mander, Stereochemistry of Organic Compounds, 1994, sections 11-4 and 11-5 (hydrindanes, decalins,
 * perhydrophenanthrenes, perhydroanthracenes, bridged rings); E. L. Eliel, N. L. Allinger, S. J. Angyal, G. A. Morrison,
 * Conformational Analysis, 1965, chapters 2, 4 and 5 (steroids, spiro and heterocyclic systems). All from memory.
 */
const SOURCE = "(source: Johnson 1953; Eliel, Wilen & Mander 1994, sections 11-4 and 11-5, from memory)";

async function systemOf(smiles: string) {
  const services = await bareServices();
  const read = services.toolkit.read(smiles);
  if (!read.ok) throw new Error(`${smiles}: ${read.reason}`);
  return findOpenCentres(read.molecule, services.toolkit).members.map(
    ({ molecule, canonicalSmiles, mirrorSmiles }) => {
      const search = findRings(molecule);
      if (!search.ok) throw new Error(search.refusal.message);
      const rings = analyseRings(molecule, search.rings, { ring: null, atoms: new Map() }, services);
      const conformers = enumerateConformers(molecule, rings)!;
      const fusions = new Map(
        rings.flatMap((ring) =>
          fusionsOf(ring).map(
            ({ atoms, relation }) => [[...atoms].sort((a, b) => a - b).join(), relation] as const,
          ),
        ),
      );
      return {
        molecule,
        pair: [canonicalSmiles, mirrorSmiles].sort().join(" "),
        rings,
        conformers,
        fusions: [...fusions.values()].sort().join(" "),
        chirality: chiralityOf(molecule, services.toolkit),
      };
    },
  );
}

/** Letters of the bonds between rings, ring by ring: `ae ae`. */
function fusionLetters({ chairs }: Arrangement): string {
  return chairs
    .map((chair) =>
      chair.ring.branches
        .map((branch) => (orientationOf(chair, branch) === "axial" ? "a" : "e"))
        .sort()
        .join(""),
    )
    .join(" ");
}

describe(`All-chair conformers of named ring systems ${SOURCE}`, () => {
  test.each<[name: string, smiles: string, count: number, letters: string]>([
    ["cyclohexane", "C1CCCCC1", 2, ""],
    ["trans-decalin", "C1CC[C@@H]2CCCC[C@H]2C1", 1, "ee ee"],
    ["cis-decalin", "C1CC[C@H]2CCCC[C@H]2C1", 2, "ae ae"],
    ["trans-hydrindane", "C1CC[C@@H]2CCC[C@H]2C1", 1, "ee"],
    ["cis-hydrindane", "C1CC[C@H]2CCC[C@H]2C1", 2, "ae"],
    ["spiro[5.5]undecane", "C1CCC2(CC1)CCCCC2", 4, "ae ae"],
    ["spiro[4.5]decane", "C1CCC2(C1)CCCCC2", 2, "ae"],
    ["bicyclohexyl", "C1CCC(CC1)C1CCCCC1", 4, " "],
    ["adamantane", "C1C2CC3CC1CC(C2)C3", 1, "aaa aaa aaa aaa"],
    ["hexamethylenetetramine", "C1N2CN3CN1CN(C2)C3", 1, "aaa aaa aaa aaa"],
    ["bicyclo[3.3.1]nonane", "C1CC2CCCC(C1)C2", 1, "aa aa"],
    ["bicyclo[3.2.1]octane", "C1CC2CCC(C1)C2", 1, "aa"],
    [
      "5α-androstan-17β-ol",
      "C[C@]12CC[C@H]3[C@H]([C@@H]1CC[C@@H]2O)CC[C@@H]1[C@]3(C)CCCC1",
      1,
      "ee eeee eeee",
    ],
    [
      "5β-androstan-17β-ol",
      "C[C@]12CC[C@H]3[C@H]([C@@H]1CC[C@@H]2O)CC[C@H]1[C@]3(C)CCCC1",
      1,
      "ae aeee eeee",
    ],
    ["trans-1-oxadecalin", "C1CC[C@@H]2OCCC[C@H]2C1", 1, "ee ee"],
    ["cis-1-oxadecalin", "C1CC[C@H]2OCCC[C@H]2C1", 2, "ae ae"],
    ["trans-decahydroquinoline", "C1CC[C@@H]2NCCC[C@H]2C1", 1, "ee ee"],
    ["cis-decahydroisoquinoline", "C1CC[C@H]2CNCC[C@H]2C1", 2, "ae ae"],
    ["1,7-dioxaspiro[5.5]undecane", "C1CCOC2(C1)CCCCO2", 4, "ae ae"],
    ["cyclohexene, half-chairs", "C1CCC=CC1", 2, ""],
    ["tetralin, half-chairs", "c1ccc2c(c1)CCCC2", 2, ""],
    ["trans-Δ2-octalin, a chair and a half-chair", "C1CC[C@@H]2CC=CC[C@H]2C1", 1, "ee ee"],
    ["cis-Δ2-octalin", "C1CC[C@H]2CC=CC[C@H]2C1", 2, "ae ae"],
    ["norbornane, whose six-membered ring is a boat", "C1CC2CCC1C2", 1, ""],
    ["bicyclo[2.2.2]octane, three boats", "C1CC2CCC1CC2", 1, ""],
    ["quinuclidine, three boats", "C1CN2CCC1CC2", 1, ""],
  ])("%s (%s) has %i", async (_name, smiles, count, letters) => {
    const [system, ...others] = await systemOf(smiles);
    expect(others).toHaveLength(0);
    expect(system!.conformers).toHaveLength(count);
    if (system!.rings.some((ring) => ring.kind === "boat")) {
      expect(system!.conformers[0]!.chairs.every(({ form }) => form === "boat")).toBe(true);
      return;
    }
    const sorted = (text: string) => text.split(" ").sort().join(" ");
    for (const conformer of system!.conformers)
      expect(sorted(fusionLetters(conformer))).toBe(sorted(letters));
  });

  test("quinolizidine has one trans conformer and two cis, which nitrogen inversion joins", async () => {
    const [system] = await systemOf("C1CCN2CCCCC2C1");
    expect(system!.conformers.map(fusionLetters).sort()).toEqual(["ae ae", "ae ae", "ee ee"]);
  });

  test("tropane has N-methyl axial or equatorial in its chair piperidine ring", async () => {
    const [system] = await systemOf("CN1C2CCC1CCC2");
    const places = system!.conformers.map(({ chairs: [chair] }) =>
      orientationOf(chair!, chair!.ring.substituents[0]!),
    );
    expect(places.sort()).toEqual(["axial", "equatorial"]);
  });

  test("the five perhydroanthracenes have 2, 2, 1, 1 and 0; only trans-anti-trans has no chair for its middle ring", async () => {
    expect(await family("C1CCCC2C1CC1CCCCC1C2")).toEqual([
      "cis cis, meso: 2",
      "cis cis, meso: 2",
      "cis trans, chiral: 1",
      "trans trans, chiral: 0",
      "trans trans, meso: 1",
    ]);
  });

  test("the six perhydrophenanthrenes have 2, 2, 1, 1, 1 and 0; only trans-syn-trans has no chair for its middle ring", async () => {
    expect(await family("C1CCC2C(C1)CCC1C2CCCC1")).toEqual([
      "cis cis, chiral: 2",
      "cis cis, meso: 2",
      "cis trans, chiral: 1",
      "cis trans, chiral: 1",
      "trans trans, chiral: 1",
      "trans trans, meso: 0",
    ]);
  });

  test("both mirror images of a pair have the same number", async () => {
    for (const smiles of ["C1CCCC2C1CC1CCCCC1C2", "C1CCC2C(C1)CCC1C2CCCC1"]) {
      const byPair = new Map<string, number[]>();
      for (const { pair, conformers } of await systemOf(smiles))
        byPair.set(pair, [...(byPair.get(pair) ?? []), conformers.length]);
      for (const counts of byPair.values()) expect(new Set(counts).size).toBe(1);
    }
  });
});

/** Each diastereomer of a constitution: how its rings are fused, its chirality, its number of all-chair conformers. */
async function family(smiles: string): Promise<string[]> {
  const seen = new Map<string, string>();
  for (const { pair, fusions, chirality, conformers } of await systemOf(smiles))
    seen.set(pair, `${fusions}, ${chirality}: ${conformers.length}`);
  return [...seen.values()].sort();
}

describe("Angular groups (common practice)", () => {
  test("both angular methyls of 5α-androstan-17β-ol are axial in every six-membered ring that holds them", async () => {
    const [system] = await systemOf("C[C@]12CC[C@H]3[C@H]([C@@H]1CC[C@@H]2O)CC[C@@H]1[C@]3(C)CCCC1");
    const angular = system!.conformers[0]!.chairs.flatMap((chair) =>
      chair.ring.substituents.map((group) => orientationOf(chair, group)),
    );
    expect(angular).toEqual(["axial", "axial", "axial"]);
  });

  test("in 5β-androstan-17β-ol the one at C10 is equatorial in ring A and axial in ring B", async () => {
    const [system] = await systemOf("C[C@]12CC[C@H]3[C@H]([C@@H]1CC[C@@H]2O)CC[C@H]1[C@]3(C)CCCC1");
    const chairs = system!.conformers[0]!.chairs;
    const places = chairs.map(({ ring }, i) =>
      ring.substituents.filter((group) => group.atom === 15).map((group) => orientationOf(chairs[i]!, group)),
    );
    expect(places.flat().sort()).toEqual(["axial", "equatorial"]);
  });
});
