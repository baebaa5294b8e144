import { isTrigonal } from "./flatAtoms.ts";
import { isPermutationEven } from "./isPermutationEven.ts";
import type { Atom, Molecule, TetrahedralSense } from "./Molecule.ts";

/** Stands for an implicit hydrogen or a lone pair, which the sense of a centre takes last. */
const IMPLICIT = -1;

export type Face = "up" | "down";

/** The exocyclic places of a ring atom: atoms of groups or of other rings, or a hydrogen / lone pair (`null`). */
export interface RingSite {
  readonly ringAtom: number;
  /** Exocyclic atom on the face from which the ring list runs clockwise; null for hydrogen or lone pair. */
  readonly up: number | null;
  readonly down: number | null;
  /**
   * `fixed`: the faces are a property of the substance. `free`: the atom inverts (nitrogen with one group),
   * so the group may be on either face; it is reported on `up` here. `arbitrary`: both choices are the same substance.
   * `flat`: the atom is trigonal and its exocyclic atom lies near the ring's mean plane; it is reported on `up`.
   */
  readonly faces: "fixed" | "free" | "arbitrary" | "flat";
}

/**
 * The up and down exocyclic atoms of every ring atom.
 *
 * The ring list runs clockwise seen from the up face. At a ring atom with previous atom p, next atom n and
 * exocyclic x, y, looking with y at the back, p, n, x run counter-clockwise exactly when x is up; equivalently
 * seen from y they run clockwise, which is the sense `cw` of the order (y, p, n, x).
 *
 * Atoms without a sense get one fixed choice: their two choices must be the same substance, which
 * `findOpenCentres` makes sure of before this is called. The choice is a property of the atom, not of the ring, so
 * that all rings through a shared atom agree.
 */
export function ringFaces(molecule: Molecule, ring: readonly number[]): readonly RingSite[] {
  return ring.map((index, position): RingSite => {
    const atom = molecule.atoms[index]!;
    const exocyclic = exocyclicAtoms(atom, ring, position);
    if (exocyclic.length === 0) return { ringAtom: index, up: null, down: null, faces: "arbitrary" };
    const [x, y] = [exocyclic[0]!, exocyclic[1] ?? null];
    if (isTrigonal(molecule, atom)) return { ringAtom: index, up: x, down: y, faces: "flat" };
    if (isInverting(atom, exocyclic.length)) return { ringAtom: index, up: x, down: null, faces: "free" };
    const shared = molecule.rings.filter((other) => other.includes(index)).length > 1;
    if (atom.stereo === null && !shared) return { ringAtom: index, up: x, down: y, faces: "arbitrary" };
    const [up, down] = facesBySense(atom, ring, position, atom.stereo ?? "ccw");
    return { ringAtom: index, up, down, faces: atom.stereo === null ? "arbitrary" : "fixed" };
  });
}

/**
 * The exocyclic atoms of a ring atom on the up and the down face when its neighbours have the given sense; null for a
 * hydrogen or lone pair.
 * @param position - of the atom in `ring`, from 0.
 */
export function facesBySense(
  atom: Atom,
  ring: readonly number[],
  position: number,
  sense: TetrahedralSense,
): readonly [number | null, number | null] {
  const size = ring.length;
  const previous = ring[(position + size - 1) % size]!;
  const next = ring[(position + 1) % size]!;
  const [x, y] = exocyclicAtoms(atom, ring, position);
  if (x === undefined) return [null, null];
  const listed = atom.neighbours.length === 3 ? [...atom.neighbours, IMPLICIT] : [...atom.neighbours];
  const even = isPermutationEven(listed, [y ?? IMPLICIT, previous, next, x]);
  return even === (sense === "cw") ? [x, y ?? null] : [y ?? null, x];
}

function exocyclicAtoms(atom: Atom, ring: readonly number[], position: number): readonly number[] {
  const size = ring.length;
  const inRing = [ring[(position + size - 1) % size], ring[(position + 1) % size]];
  return atom.neighbours.filter((neighbour) => !inRing.includes(neighbour));
}

/** A three-coordinate nitrogen (or a protonated one, which exchanges its proton) does not keep its configuration. */
export function isInverting(atom: Atom, exocyclicGroups: number): boolean {
  return atom.element === "N" && exocyclicGroups === 1 && (atom.charge === 0 || atom.hydrogens > 0);
}
