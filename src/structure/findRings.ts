import { type Atom, bondBetween, type Molecule } from "./Molecule.ts";

/** Ring elements for which a chair with ordinary axial and equatorial positions is sound. */
const RING_ELEMENTS = new Set(["C", "N", "O", "S", "Se", "Te", "Si", "Ge", "Sn", "Pb", "P", "As"]);

export type RingRefusalCode =
  | "unsupported-no-six-ring"
  | "unsupported-unsaturated-ring"
  | "unsupported-planar-nitrogen"
  | "unsupported-fused-ring"
  | "unsupported-spiro-ring"
  | "unsupported-bridged-ring"
  | "unsupported-ring-element";

export interface RingRefusal {
  readonly code: RingRefusalCode;
  readonly message: string;
}

/** The saturated six-membered rings that stand alone, or why the molecule is not analysed. */
export type RingSearch =
  | {
      readonly ok: true;
      readonly rings: readonly (readonly number[])[];
      readonly unanalysed: readonly RingRefusal[];
    }
  | { readonly ok: false; readonly refusal: RingRefusal };

/**
 * Finds every saturated six-membered ring and makes sure that each can be treated as a free chair.
 *
 * A six-membered ring with an sp2 atom, a planar nitrogen, or atoms shared with another ring is not
 * analysed yet. One saturated ring of that kind refuses the whole molecule, since its conformers would
 * be missing from the count; an unsaturated six-membered ring elsewhere is only reported.
 */
export function findRings(molecule: Molecule): RingSearch {
  const sixRings = molecule.rings.filter((ring) => ring.length === 6);
  const accepted: number[][] = [];
  const unanalysed: RingRefusal[] = [];
  for (const ring of sixRings) {
    const atoms = ring.map((index) => molecule.atoms[index]!);
    if (atoms.every((atom) => atom.aromatic)) continue;
    const unsaturated = unsaturation(molecule, ring, atoms);
    if (unsaturated !== null) {
      unanalysed.push(unsaturated);
      continue;
    }
    const shared = sharing(molecule, ring);
    if (shared !== null) return { ok: false, refusal: shared };
    const odd = atoms.find((atom) => !RING_ELEMENTS.has(atom.element) || atom.radicals > 0);
    if (odd !== undefined) {
      return {
        ok: false,
        refusal: {
          code: "unsupported-ring-element",
          message: `A six-membered ring with ${odd.radicals > 0 ? "a radical centre" : odd.element} at atom ${odd.index} is not analysed.`,
        },
      };
    }
    accepted.push([...ring]);
  }
  if (accepted.length > 0) {
    const planar = unanalysed.find((refusal) => refusal.code === "unsupported-planar-nitrogen");
    if (planar !== undefined) return { ok: false, refusal: planar };
    accepted.sort((a, b) => Math.min(...a) - Math.min(...b));
    return { ok: true, rings: accepted, unanalysed };
  }
  if (hiddenSixRing(molecule)) {
    return {
      ok: false,
      refusal: {
        code: "unsupported-bridged-ring",
        message: "The molecule holds a six-membered ring inside a bridged system; not analysed yet.",
      },
    };
  }
  const refusal = unanalysed[0] ?? {
    code: "unsupported-no-six-ring" as const,
    message: "The molecule has no saturated six-membered ring.",
  };
  return { ok: false, refusal };
}

/** A six-membered path around a bridge that the smallest rings do not list, as in norbornane. */
function hiddenSixRing(molecule: Molecule): boolean {
  return molecule.rings.some((a, i) =>
    molecule.rings.slice(i + 1).some((b) => {
      const common = a.filter((atom) => b.includes(atom)).length;
      return common > 2 && a.length + b.length - 2 * (common - 1) === 6;
    }),
  );
}

function unsaturation(
  molecule: Molecule,
  ring: readonly number[],
  atoms: readonly Atom[],
): RingRefusal | null {
  const where = `The six-membered ring of atoms ${ring.join(", ")}`;
  for (const atom of atoms) {
    if (atom.aromatic) {
      return {
        code: "unsupported-unsaturated-ring",
        message: `${where} shares an edge with an aromatic ring; not analysed yet.`,
      };
    }
    for (const neighbour of atom.neighbours) {
      const bond = bondBetween(molecule, atom.index, neighbour)!;
      if (bond.order === 1) continue;
      const inRing = ring.includes(neighbour);
      if (!inRing && (atom.element === "S" || atom.element === "P" || atom.element === "Se")) continue;
      return {
        code: "unsupported-unsaturated-ring",
        message: `${where} has a double bond ${inRing ? "at" : "on"} its atom ${atom.index}; such rings are not analysed yet.`,
      };
    }
  }
  const nitrogen = atoms.find((atom) => isPlanarNitrogen(molecule, atom, ring));
  if (nitrogen === undefined) return null;
  return {
    code: "unsupported-planar-nitrogen",
    message: `${where} has a planar nitrogen (atom ${nitrogen.index}: amide, carbamate, urea, sulfonamide, nitroso or the like); not analysed yet.`,
  };
}

/** True when the ring nitrogen's lone pair is drawn into an acyl, sulfonyl, imine, nitrile or nitroso group. */
function isPlanarNitrogen(molecule: Molecule, atom: Atom, ring: readonly number[]): boolean {
  if (atom.element !== "N" || atom.charge !== 0) return false;
  return atom.neighbours.some((neighbour) => {
    if (ring.includes(neighbour)) return false;
    const next = molecule.atoms[neighbour]!;
    if (next.aromatic) return false;
    if (!["C", "N", "S", "P"].includes(next.element)) return false;
    return next.neighbours.some((far) => {
      const order = bondBetween(molecule, neighbour, far)!.order;
      const element = molecule.atoms[far]!.element;
      return order > 1 && (element === "O" || element === "S" || element === "N" || element === "Se");
    });
  });
}

function sharing(molecule: Molecule, ring: readonly number[]): RingRefusal | null {
  let worst: RingRefusal | null = null;
  let most = 0;
  for (const other of molecule.rings) {
    if (other.length === ring.length && other.every((atom) => ring.includes(atom))) continue;
    const common = other.filter((atom) => ring.includes(atom)).length;
    if (common <= most) continue;
    most = common;
    const atoms = ring.join(", ");
    worst =
      common === 1
        ? {
            code: "unsupported-spiro-ring",
            message: `The six-membered ring of atoms ${atoms} shares one atom with another ring (spiro); not analysed yet.`,
          }
        : common === 2
          ? {
              code: "unsupported-fused-ring",
              message: `The six-membered ring of atoms ${atoms} is fused to another ring; not analysed yet.`,
            }
          : {
              code: "unsupported-bridged-ring",
              message: `The six-membered ring of atoms ${atoms} is part of a bridged system; not analysed yet.`,
            };
  }
  return worst;
}
