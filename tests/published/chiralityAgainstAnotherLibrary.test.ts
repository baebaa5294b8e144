import { createRequire } from "node:module";
import type * as OpenChemLib from "openchemlib";
import { expect, test } from "vitest";
import { chiralityOf } from "../../src/structure/chiralityOf.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";
import type { Molecule } from "../../src/structure/Molecule.ts";
import { isMirrorImageSuperimposable } from "../generators/isMirrorImageSuperimposable.ts";
import { randomRings } from "../generators/randomRings.ts";

/**
 * Chiral or not, by three ways that share no code: this program, which compares InChI; OpenChemLib, whose identity code
 * of a molecule is compared with that of its mirror image; and the definition itself, a search for a permutation of
 * the atoms that keeps every bond and reverses every centre.
 *
 * source: OpenChemLib 9.25.0 (npm `openchemlib`, BSD), a general-purpose library; IUPAC Basic terminology of
 * stereochemistry 1996, "chirality" (not superimposable on the mirror image).
 */
const library = createRequire(import.meta.url)("openchemlib") as typeof OpenChemLib;
const toolkit = await loadToolkit();

const MOLECULES = [
  ...randomRings({ seed: 404, count: 150, groups: [0, 1] }),
  ...randomRings({ seed: 405, count: 150, groups: [1, 4] }),
  ...randomRings({ seed: 406, count: 60, groups: [0, 2], kinds: ["cyclohexane", "decalin", "linked"] }),
].map(({ smiles }) => {
  const read = toolkit.read(smiles);
  if (!read.ok) throw new Error(`${smiles}: ${read.reason}`);
  return {
    smiles,
    molecule: read.molecule,
    ours: chiralityOf(read.molecule, toolkit) === "chiral",
    theirs: identityCode(smiles) !== identityCode(mirrored(smiles)),
    exact: !isMirrorImageSuperimposable(everyCentreGiven(read.molecule)),
  };
});
const missed = MOLECULES.filter(({ ours, exact }) => ours !== exact);
const chiral = MOLECULES.filter(({ ours }) => ours).length;
const counts = `${MOLECULES.length} drawn molecules, ${chiral} chiral and ${MOLECULES.length - chiral} not`;

test(`${counts}: wherever this program and OpenChemLib differ, the definition says as this program does (source: OpenChemLib 9.25.0)`, () => {
  expect(MOLECULES.length).toBeGreaterThanOrEqual(300);
  expect(chiral).toBeGreaterThan(150);
  expect(MOLECULES.length - chiral).toBeGreaterThan(60);
  const differing = MOLECULES.filter(({ ours, theirs }) => ours !== theirs);
  expect(differing.filter(({ ours, exact }) => ours !== exact).map(({ smiles }) => smiles)).toEqual([]);
  expect(differing.filter(({ molecule }) => spiroAtoms(molecule).length === 0)).toEqual([]);
});

test(`the definition agrees on all but ${missed.length}, each of which has a spiro atom that is a centre by its rings alone (source: IUPAC 1996, chirality)`, () => {
  for (const { smiles, molecule, ours } of missed) {
    expect(ours, smiles).toBe(false);
    const dropped = spiroAtoms(molecule).filter((atom) => molecule.atoms[atom]!.stereo === null);
    expect(dropped.length, smiles).toBeGreaterThan(0);
  }
  expect(missed.length).toBeLessThan(MOLECULES.length / 50);
});

function identityCode(smiles: string): string {
  const molecule = library.Molecule.fromSmiles(smiles, { noCoordinates: true });
  // Without this call the code would leave the configurations out.
  molecule.ensureHelperArrays(library.Molecule.cHelperCIP);
  return molecule.getIDCode();
}

function mirrored(smiles: string): string {
  return smiles.replace(/@+/g, (mark) => (mark === "@" ? "@@" : "@"));
}

/**
 * A reader drops the mark of an atom that it thinks no centre. Any sense put there is harmless: at an atom that is no
 * centre both senses mean the same molecule, and at a single one that was missed both are enantiomers.
 */
function everyCentreGiven(molecule: Molecule): Molecule {
  return {
    ...molecule,
    atoms: molecule.atoms.map((atom) =>
      atom.stereo === null &&
      !atom.aromatic &&
      atom.element === "C" &&
      atom.hydrogens <= 1 &&
      atom.neighbours.length + atom.hydrogens === 4
        ? { ...atom, stereo: "cw" }
        : atom,
    ),
  };
}

/** Atoms at which two rings meet that have nothing else in common. */
function spiroAtoms(molecule: Molecule): number[] {
  return molecule.atoms.flatMap(({ index }) => {
    const rings = molecule.rings.filter((ring) => ring.includes(index));
    const alone = rings.some((first, place) =>
      rings.slice(place + 1).some((second) => first.filter((atom) => second.includes(atom)).length === 1),
    );
    return alone ? [index] : [];
  });
}
