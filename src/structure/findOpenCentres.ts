import { bridgesFit } from "./bridgesFit.ts";
import { couldHoldSense } from "./couldHoldSense.ts";
import { type Molecule, mirrorImage, type TetrahedralSense, withSenses } from "./Molecule.ts";
import type { Toolkit } from "./Toolkit.ts";

/** Most open centres whose combinations are tried. */
const MAXIMUM_OPEN = 8;

/** One way of filling in every configuration that the structure leaves open. */
export interface Member {
  readonly molecule: Molecule;
  readonly canonicalSmiles: string;
  readonly mirrorSmiles: string;
}

export interface OpenStereo {
  /** Atoms that need a configuration and have none. */
  readonly centres: readonly number[];
  /** Distinct stereoisomers that the structure as written may stand for, by canonical SMILES; one when nothing is open. */
  readonly members: readonly Member[];
  /** False when there are too many open centres to try every combination; `centres` then lists all candidates. */
  readonly complete: boolean;
}

/**
 * Finds missing tetrahedral configurations, including the 1,3 and 1,4 patterns of rings that are no centres
 * by themselves: every combination of senses is tried and the canonical forms are compared. An atom needs a
 * configuration when, in some combination, reversing it alone gives another substance.
 */
export function findOpenCentres(molecule: Molecule, toolkit: Toolkit): OpenStereo {
  const candidates = molecule.atoms
    .filter((atom) => atom.stereo === null && couldHoldSense(molecule, atom.index))
    .map((atom) => atom.index);
  const member = (filled: Molecule): Member => ({
    molecule: filled,
    canonicalSmiles: toolkit.canonicalSmiles(filled),
    mirrorSmiles: toolkit.canonicalSmiles(mirrorImage(filled)),
  });
  if (candidates.length === 0) return { centres: [], members: [member(molecule)], complete: true };
  if (candidates.length > MAXIMUM_OPEN)
    return { centres: candidates, members: [member(molecule)], complete: false };

  const combinations = 2 ** candidates.length;
  const filled: Molecule[] = [];
  // null where a bridge forbids the combination.
  const forms: (string | null)[] = [];
  for (let code = 0; code < combinations; code++) {
    const senses = new Map<number, TetrahedralSense>(
      candidates.map((atom, bit) => [atom, (code >> bit) & 1 ? "cw" : "ccw"]),
    );
    const next = withSenses(molecule, senses);
    filled.push(next);
    forms.push(bridgesFit(next) ? toolkit.canonicalSmiles(next) : null);
  }
  if (forms.every((form) => form === null))
    return { centres: [], members: [member(molecule)], complete: true };
  const centres = candidates.filter((_, bit) =>
    forms.some((form, code) => differs(form, forms[code ^ (1 << bit)]!)),
  );
  // Two bridgeheads turn over together; where that makes another substance both are open.
  const distinct = new Map<string, Molecule>();
  forms.forEach((form, code) => {
    if (form !== null && !distinct.has(form)) distinct.set(form, filled[code]!);
  });
  const open = centres.length === 0 && distinct.size > 1 ? candidates : centres;
  const members = [...distinct.keys()].sort().map((form) => member(distinct.get(form)!));
  return { centres: open, members, complete: true };
}

function differs(a: string | null, b: string | null): boolean {
  return a !== null && b !== null && a !== b;
}
