import { flatParts, isTrigonal } from "./flatAtoms.ts";
import { bondBetween, type Molecule } from "./Molecule.ts";
import { type RingPartner, ringPartners } from "./ringPartners.ts";
import { sixCycles } from "./sixCycles.ts";

/** Ring elements for which axial and equatorial positions are sound. */
const RING_ELEMENTS = new Set(["C", "N", "O", "S", "Se", "Te", "Si", "Ge", "Sn", "Pb", "P", "As"]);
/** Longest bridge, in atoms, that decides the shape of the ring it spans. */
const LONGEST_DECIDING_BRIDGE = 6;

export type RingRefusalCode =
  | "unsupported-no-six-ring"
  | "unsupported-unsaturated-ring"
  | "unsupported-lactone-ring"
  | "unsupported-lactam-ring"
  | "unsupported-flat-corners"
  | "unsupported-bridged-ring"
  | "unsupported-ring-element";

export interface RingRefusal {
  readonly code: RingRefusalCode;
  readonly message: string;
}

/**
 * What states a ring has: two chairs; two half-chairs, one bond being held flat; or one boat, which a bridge between
 * opposite atoms forces on it.
 */
export type RingKind = "chair" | "half-chair" | "boat";

export interface FoundRing {
  readonly atoms: readonly number[];
  readonly kind: RingKind;
  /** Ring bonds k (atom k to atom k + 1 of `atoms`) held flat. */
  readonly flatBonds: readonly number[];
  /** Positions of trigonal atoms in `atoms`. */
  readonly flatAtoms: readonly number[];
  readonly partners: readonly RingPartner[];
}

/** The six-membered rings whose states are known, or why there are none. */
export type RingSearch =
  | {
      readonly ok: true;
      readonly rings: readonly FoundRing[];
      readonly unanalysed: readonly RingRefusal[];
    }
  | { readonly ok: false; readonly refusal: RingRefusal };

/**
 * Finds every six-membered ring that has chairs, half-chairs or a forced boat. A six-membered ring of another kind
 * is reported by name; beside a ring that is analysed it counts as a flexible partner.
 */
export function findRings(molecule: Molecule): RingSearch {
  const rings: FoundRing[] = [];
  const unanalysed: RingRefusal[] = [];
  for (const ring of sixCycles(molecule)) {
    if (ring.every((atom) => molecule.atoms[atom]!.aromatic)) continue;
    const found = classify(molecule, ring);
    if ("code" in found) unanalysed.push(found);
    else rings.push(found);
  }
  if (rings.length > 0) {
    const byAtoms = (a: FoundRing, b: FoundRing) => compareAtoms(a.atoms, b.atoms);
    return { ok: true, rings: rings.sort(byAtoms), unanalysed };
  }
  const refusal = unanalysed[0] ?? {
    code: "unsupported-no-six-ring" as const,
    message: "The molecule has no six-membered ring with chairs or half-chairs.",
  };
  return { ok: false, refusal };
}

function compareAtoms(a: readonly number[], b: readonly number[]): number {
  const [x, y] = [[...a].sort((m, n) => m - n), [...b].sort((m, n) => m - n)];
  const at = x.findIndex((atom, i) => atom !== y[i]);
  return at < 0 ? 0 : x[at]! - y[at]!;
}

function classify(molecule: Molecule, ring: readonly number[]): FoundRing | RingRefusal {
  const where = `The six-membered ring of atoms ${ring.join(", ")}`;
  const refuse = (code: RingRefusalCode, what: string): RingRefusal => ({
    code,
    message: `${where} ${what}; it is not analysed.`,
  });
  const odd = ring
    .map((index) => molecule.atoms[index]!)
    .find((atom) => !RING_ELEMENTS.has(atom.element) || atom.radicals > 0);
  if (odd !== undefined) {
    return refuse(
      "unsupported-ring-element",
      `holds ${odd.radicals > 0 ? "a radical centre" : odd.element} at atom ${odd.index}`,
    );
  }
  const partners = ringPartners(molecule, ring);
  if (partners === null) return refuse("unsupported-bridged-ring", "is part of a cage of small rings");
  const flat = flatParts(molecule, ring);
  const flatAtoms = ring.flatMap((index, position) =>
    isTrigonal(molecule, molecule.atoms[index]!) ? [position] : [],
  );
  const found = (kind: RingKind): FoundRing => ({
    atoms: [...ring],
    kind,
    flatBonds: flat.bonds,
    flatAtoms,
    partners,
  });

  const bridged = partners.filter((partner) => partner.shared.length > 2);
  if (bridged.some(({ shared, bridge }) => shared.length === 4 && bridge <= 4)) return found("boat");
  for (const { shared, bridge } of bridged) {
    if (shared.length > 4 || (shared.length === 3 && bridge < 2))
      return refuse("unsupported-bridged-ring", "is bridged by a single atom across one corner");
    if (shared.length === 4 && bridge <= LONGEST_DECIDING_BRIDGE)
      return refuse(
        "unsupported-bridged-ring",
        `is spanned by a bridge of ${bridge} atoms between opposite corners`,
      );
  }
  const flatName = flatRefusal(molecule, ring, flat);
  if (flatName !== null) return refuse(...flatName);
  if (flat.bonds.length === 0) return found("chair");
  if (bridged.length > 0)
    return refuse("unsupported-bridged-ring", "is both bridged and held flat at one bond");
  return found("half-chair");
}

/** Why the flat parts of a ring leave it neither a chair nor a half-chair, or null. */
function flatRefusal(
  molecule: Molecule,
  ring: readonly number[],
  flat: { readonly bonds: readonly number[]; readonly corners: readonly number[] },
): readonly [RingRefusalCode, string] | null {
  const { bonds, corners } = flat;
  const at = (position: number) => molecule.atoms[ring[(position + 6) % 6]!]!;
  const isAcyl = (position: number) =>
    at(position).element === "C" &&
    at(position).neighbours.some(
      (n) =>
        bondBetween(molecule, at(position).index, n)!.order === 2 &&
        ["O", "S", "N", "Se"].includes(molecule.atoms[n]!.element),
    );
  if (bonds.length > 1) {
    return ["unsupported-unsaturated-ring", "holds more than one flat bond (a diene or the like)"];
  }
  for (const corner of corners.filter(isAcyl)) {
    const beside = [corner - 1, corner + 1].map(at);
    if (beside.some((atom) => atom.element === "N"))
      return ["unsupported-lactam-ring", "is a lactam or imide ring"];
    if (beside.some((atom) => ["O", "S", "Se"].includes(atom.element)))
      return ["unsupported-lactone-ring", "is a lactone or carbonate ring"];
  }
  if (bonds.length === 1) {
    return corners.length === 0
      ? null
      : ["unsupported-unsaturated-ring", "has a flat bond and a further flat atom (an enone or the like)"];
  }
  if (corners.length < 2) return null;
  if (corners.length > 2) return ["unsupported-flat-corners", "has more than two flat corners"];
  const apart = Math.min(corners[1]! - corners[0]!, 6 - (corners[1]! - corners[0]!));
  if (apart === 1) return ["unsupported-flat-corners", "has two flat corners side by side"];
  const bothNitrogen = corners.every((corner) => at(corner).element === "N");
  if (apart === 3 && !bothNitrogen)
    return ["unsupported-flat-corners", "has flat corners opposite each other, which favours twist-boats"];
  return null;
}
