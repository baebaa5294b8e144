import { createRequire } from "node:module";
import type * as OpenChemLib from "openchemlib";
import { describe, expect, test } from "vitest";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";
import { type Molecule, mirrorImage } from "../../src/structure/Molecule.ts";
import { randomRings } from "../generators/randomRings.ts";

/**
 * CIP descriptors of this program beside those of OpenChemLib, atom by atom. OpenChemLib gives no r and s and leaves
 * centres open that hang on them, so the two may differ for a few reasons only; each reason is checked, and a
 * difference without one fails.
 *
 * source: OpenChemLib 9.25.0 (npm `openchemlib`, BSD), a general-purpose library with a labeller of its own; IUPAC
 * Recommendations 2013, from memory, P-92.1.4 (rules 1 to 5, each used only where the ones before it do not decide) and P-92.1.4.3
 * (rule 2, isotopes); Prelog and Helmchen, Angew. Chem. Int. Ed. Engl. 1982, 21, 567 (r and s keep on reflection, R and S
 * change).
 */
const library = createRequire(import.meta.url)("openchemlib") as typeof OpenChemLib;
const toolkit = await loadToolkit();

type Label = "R" | "S" | "r" | "s" | "none";
interface Centre {
  readonly where: string;
  readonly atom: number;
  readonly ours: Label;
  readonly oursMirrored: Label;
  readonly theirs: Label;
  /** Their label in the mirror image; asked for a few centres only. */
  theirsMirrored(): Label;
  /** Two of the neighbours are equal as long as no configuration counts, so that rules 1 and 2 cannot decide. */
  tied(): boolean;
}

const CENTRES = randomRings({ seed: 501, count: 560 }).flatMap(({ smiles }) => centresOf(smiles));
const labelled = CENTRES.filter(({ ours, theirs }) => ours !== "none" || theirs !== "none");
const same = labelled.filter(({ ours, theirs }) => ours === theirs);
const different = labelled.filter(({ ours, theirs }) => ours !== theirs);
const places = (list: readonly Centre[]) =>
  list.map(({ where, ours, theirs }) => `${where} ${ours}/${theirs}`);

describe(`CIP descriptors at ${labelled.length} centres of 560 drawn molecules (source: OpenChemLib 9.25.0; IUPAC 2013, P-92.1.4)`, () => {
  test(`are the same at ${same.length} centres, and wherever constitution alone decides`, () => {
    expect(same.length).toBeGreaterThan(2000);
    expect(places(different.filter(({ tied }) => !tied()))).toEqual([]);
  });

  const silent = different.filter(({ theirs }) => theirs === "none");
  const pseudoasymmetric = silent.filter(({ ours }) => ours === "r" || ours === "s");
  test(`are r or s at ${pseudoasymmetric.length} centres and rest on others at ${silent.length - pseudoasymmetric.length}, where OpenChemLib gives none`, () => {
    expect(pseudoasymmetric.length).toBeGreaterThan(0);
    expect(places(silent.filter(({ tied }) => !tied()))).toEqual([]);
  });

  const other = different.filter(({ theirs }) => theirs !== "none");
  test(`differ at ${other.length} centres, where OpenChemLib gives one letter to both mirror images and so has used rule 5 for R or S`, () => {
    expect(places(other.filter((centre) => centre.ours === "none"))).toEqual([]);
    expect(
      places(other.filter((centre) => !centre.tied() || centre.theirs !== centre.theirsMirrored())),
    ).toEqual([]);
    expect(other.length).toBeLessThan(labelled.length / 200);
  });

  test("change from R to S on reflection, and stay r or s", () => {
    const reflected: Record<Label, Label> = { R: "S", S: "R", r: "r", s: "s", none: "none" };
    expect(places(CENTRES.filter(({ ours, oursMirrored }) => oursMirrored !== reflected[ours]))).toEqual([]);
  });
});

/**
 * Spiro atoms whose two tied branches deuterium tells apart. Rule 1 ranks the other two above both: a branch that
 * reaches oxygen, or a fork, where the tied ones have CH2. Seen from the side away from the lowest branch, the rest run:
 */
const RANKED_BY_HAND: Readonly<Record<string, Label>> = {
  // O > C9 (reaches OCH2) > CHD > C3; from C3, "@@" puts C9, O, CHD clockwise, so O, C9, CHD from the other side are too.
  "C1CCC[C@@]2(OCCCC2)[C@H]1[2H] atom 4": "R",
  // C9 (next to the fork) > C1 > C3 (next to CHD) > C8; "@" puts C8, C3, C9 counter-clockwise from C1.
  "C1C[C@]2(C[C@@H]([2H])CCC2)C[C@H]1[C@H](O)c1ccccc1 atom 2": "S",
};
const isotopic = [
  ...Object.keys(RANKED_BY_HAND).map((where) => where.replace(/ atom .*/, "")),
  ...randomRings({ seed: 503, count: 160, isotopes: true, groups: [0, 3] }).map(({ smiles }) => smiles),
];
const carbon = isotopic.filter((smiles) => smiles.includes("13C"));
const deuterated = isotopic.filter((smiles) => smiles.includes("2H"));

describe("An isotope", () => {
  test(`changes no descriptor that rule 1 has settled, in ${carbon.length} molecules with carbon-13 (source: OpenChemLib 9.25.0 on the same molecules without it; IUPAC 2013, P-92.1.4.3)`, () => {
    let settled = 0;
    for (const smiles of carbon) {
      const labels = new Map(centresOf(smiles).map(({ ours }, atom) => [atom, ours]));
      centresOf(smiles.replaceAll("13C", "C")).forEach(({ theirs, tied }, atom) => {
        if (theirs === "none" || tied()) return;
        settled += 1;
        expect(labels.get(atom), `${smiles} atom ${atom}`).toBe(theirs);
      });
    }
    expect(settled).toBeGreaterThan(200);
  });

  const centres = deuterated.flatMap((smiles) => centresOf(smiles).map((centre) => ({ ...centre, smiles })));
  const alike = centres.filter(({ ours, theirs }) => ours !== "none" && ours === theirs);
  const apart = centres.filter(({ ours, theirs, tied }) => ours !== theirs && !tied());
  test(`of hydrogen leaves ${alike.length} centres alike in ${deuterated.length} molecules; at ${apart.length} OpenChemLib weighs it before rule 1 is done (source: OpenChemLib 9.25.0; IUPAC 2013, P-92.1.4.3)`, () => {
    expect(alike.length).toBeGreaterThan(250);
    // Rule 1 has settled a centre that keeps its descriptor when the isotope becomes plain hydrogen.
    const unsettled = apart.filter(({ smiles, atom, ours }) => {
      const molecule = read(smiles);
      const natural = { ...molecule, atoms: molecule.atoms.map((entry) => ({ ...entry, isotope: 0 })) };
      return toolkit.descriptors(natural).atoms.get(atom) !== ours;
    });
    expect(Object.fromEntries(unsettled.map(({ where, ours }) => [where, ours]))).toEqual(RANKED_BY_HAND);
  });
});

function read(smiles: string): Molecule {
  const answer = toolkit.read(smiles);
  if (!answer.ok) throw new Error(`${smiles}: ${answer.reason}`);
  return answer.molecule;
}

/** Every atom with both readings of it, in the order of the SMILES. */
function centresOf(smiles: string): Centre[] {
  const molecule = read(smiles);
  const ours = toolkit.descriptors(molecule).atoms;
  const oursMirrored = toolkit.descriptors(mirrorImage(molecule)).atoms;
  const theirs = theirLabels(smiles);
  const theirsMirrored = once(() =>
    theirLabels(smiles.replace(/@+/g, (mark) => (mark === "@" ? "@@" : "@"))),
  );
  const plain = once(() => {
    const unmarked = library.Molecule.fromSmiles(smiles.replaceAll("@", ""), { noCoordinates: true });
    unmarked.ensureHelperArrays(library.Molecule.cHelperSymmetrySimple);
    return unmarked;
  });
  expect(theirs.map(({ element }) => element)).toEqual(
    molecule.atoms.map(({ atomicNumber }) => atomicNumber),
  );
  return molecule.atoms.map(({ index, neighbours }) => ({
    where: `${smiles} atom ${index}`,
    atom: index,
    ours: (ours.get(index) ?? "none") as Label,
    oursMirrored: (oursMirrored.get(index) ?? "none") as Label,
    theirs: theirs[index]!.label,
    theirsMirrored: () => theirsMirrored()[index]!.label,
    tied: () => new Set(neighbours.map((next) => plain().getSymmetryRank(next))).size < neighbours.length,
  }));
}

function once<T>(make: () => T): () => T {
  let made: { readonly value: T } | undefined;
  return () => {
    made ??= { value: make() };
    return made.value;
  };
}

function theirLabels(smiles: string): { element: number; label: Label }[] {
  const { Molecule: Theirs } = library;
  const molecule = Theirs.fromSmiles(smiles, { noCoordinates: true });
  molecule.ensureHelperArrays(Theirs.cHelperCIP);
  // Plain hydrogens written as atoms would come last there; none are drawn.
  return Array.from({ length: molecule.getAtoms() }, (_, atom) => {
    const parity = molecule.getAtomCIPParity(atom);
    const known = parity === Theirs.cAtomCIPParityRorM || parity === Theirs.cAtomCIPParitySorP;
    const label = known ? (parity === Theirs.cAtomCIPParityRorM ? "R" : "S") : "none";
    return { element: molecule.getAtomicNo(atom), label };
  });
}
