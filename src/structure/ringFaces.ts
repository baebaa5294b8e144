import { isPermutationEven } from "./isPermutationEven.ts";
import type { Atom, Molecule } from "./Molecule.ts";

/** Stands for an implicit hydrogen or a lone pair, which the sense of a centre takes last. */
const IMPLICIT = -1;

export type Face = "up" | "down";

/** One exocyclic place of a ring atom: an atom of a group, or a hydrogen / lone pair (`null`). */
export interface RingSite {
  readonly ringAtom: number;
  /** Exocyclic atom on the face from which the ring list runs clockwise; null for hydrogen or lone pair. */
  readonly up: number | null;
  readonly down: number | null;
  /**
   * `fixed`: the faces are a property of the substance. `free`: the atom inverts (nitrogen with one group),
   * so the group may be on either face; it is reported on `up` here. `arbitrary`: both choices are the same substance.
   */
  readonly faces: "fixed" | "free" | "arbitrary";
}

/**
 * The up and down exocyclic atoms of every ring atom.
 *
 * The ring list runs clockwise seen from the up face. At a ring atom with previous atom p, next atom n and
 * exocyclic x, y, looking with y at the back, p, n, x run counter-clockwise exactly when x is up; equivalently
 * seen from y they run clockwise, which is the sense `cw` of the order (y, p, n, x).
 *
 * Atoms without a sense get one fixed choice (first exocyclic atom up): their two choices must be the same
 * substance, which `findOpenCentres` makes sure of before this is called.
 */
export function ringFaces(molecule: Molecule, ring: readonly number[]): readonly RingSite[] {
  return ring.map((index, position) => {
    const atom = molecule.atoms[index]!;
    const previous = ring[(position + 5) % 6]!;
    const next = ring[(position + 1) % 6]!;
    const exocyclic = atom.neighbours.filter((neighbour) => neighbour !== previous && neighbour !== next);
    if (exocyclic.length === 0) return { ringAtom: index, up: null, down: null, faces: "arbitrary" };
    const [x, y] = [exocyclic[0]!, exocyclic[1] ?? null];
    if (isInverting(atom, exocyclic.length)) return { ringAtom: index, up: x, down: null, faces: "free" };
    if (atom.stereo === null) return { ringAtom: index, up: x, down: y, faces: "arbitrary" };
    const listed = atom.neighbours.length === 3 ? [...atom.neighbours, IMPLICIT] : [...atom.neighbours];
    const even = isPermutationEven(listed, [y ?? IMPLICIT, previous, next, x]);
    const xIsUp = even === (atom.stereo === "cw");
    return xIsUp
      ? { ringAtom: index, up: x, down: y, faces: "fixed" }
      : { ringAtom: index, up: y, down: x, faces: "fixed" };
  });
}

/** A three-coordinate nitrogen (or a protonated one, which exchanges its proton) does not keep its configuration. */
export function isInverting(atom: Atom, exocyclicGroups: number): boolean {
  return atom.element === "N" && exocyclicGroups === 1 && (atom.charge === 0 || atom.hydrogens > 0);
}
