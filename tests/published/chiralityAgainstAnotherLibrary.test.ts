import { createRequire } from "node:module";
import type * as OpenChemLib from "openchemlib";
import { expect, test } from "vitest";
import { readStructure } from "../../src/dossier/analysis/readStructure.ts";
import type { Molecule } from "../../src/structure/Molecule.ts";
import { services } from "../dossier/demoServices.ts";
import { isMirrorImageSuperimposable } from "../generators/isMirrorImageSuperimposable.ts";
import { randomRings } from "../generators/randomRings.ts";

/**
 * Chiral or not, by three ways that share no code: this program, as it says in a dossier; OpenChemLib, whose identity code
 * of a molecule is compared with that of its mirror image; and the definition itself, a search for a permutation of
 * the atoms that keeps every bond and reverses every centre.
 *
 * source: OpenChemLib 9.25.0 (npm `openchemlib`, BSD), a general-purpose library; IUPAC Basic terminology of
 * stereochemistry 1996, "chirality" (not superimposable on the mirror image).
 */
const library = createRequire(import.meta.url)("openchemlib") as typeof OpenChemLib;
const program = await services();

const MOLECULES = [
  ...randomRings({ seed: 404, count: 150, groups: [0, 1] }),
  ...randomRings({ seed: 405, count: 150, groups: [1, 4] }),
  ...randomRings({ seed: 407, count: 60, groups: [0, 2], kinds: ["spiro"] }),
  ...randomRings({ seed: 406, count: 60, groups: [0, 2], kinds: ["cyclohexane", "decalin", "linked"] }),
].map(({ smiles }) => {
  const read = readStructure(smiles, null, program);
  if (!read.ok) throw new Error(`${smiles}: ${read.refusal.message}`);
  const molecule = read.result.written;
  return {
    smiles,
    molecule,
    ours: read.result.identity.chirality === "chiral",
    theirs: identityCode(smiles) !== identityCode(mirrored(smiles)),
    exact: !isMirrorImageSuperimposable(everyCentreGiven(molecule)),
  };
});
const chiral = MOLECULES.filter(({ ours }) => ours).length;
const beyond = MOLECULES.filter(({ ours, theirs }) => ours !== theirs).length;
const counts = `${MOLECULES.length} drawn molecules, ${chiral} chiral and ${MOLECULES.length - chiral} not`;

test(`${counts}: OpenChemLib says the same of all but ${beyond}, which turn on a spiro atom, and there the definition says as this program does (source: OpenChemLib 9.25.0)`, () => {
  expect(MOLECULES.length).toBeGreaterThanOrEqual(300);
  expect(chiral).toBeGreaterThan(150);
  expect(MOLECULES.length - chiral).toBeGreaterThan(60);
  const differing = MOLECULES.filter(({ ours, theirs }) => ours !== theirs);
  expect(differing.filter(({ ours, exact }) => ours !== exact).map(({ smiles }) => smiles)).toEqual([]);
  expect(differing.filter(({ molecule }) => spiroAtoms(molecule).length === 0)).toEqual([]);
});

test("the definition says the same of all of them (source: IUPAC 1996, chirality)", () => {
  expect(MOLECULES.filter(({ ours, exact }) => ours !== exact).map(({ smiles }) => smiles)).toEqual([]);
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
