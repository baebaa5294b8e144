import type { Chair } from "../../conformers/Chair.ts";
import { orientationOf } from "../../conformers/Chair.ts";
import type { Substituent } from "../../structure/StructureAnalysis.ts";

/** Ring atom by element and printed locant, as a table names it: `C1`, `N4`, `C8a`; primed in further rings. */
export function place(chair: Chair, ringAtom: number): string {
  const { ring } = chair;
  const position = ring.atoms.indexOf(ringAtom);
  return `${ring.elements[position]!}${ring.names[position]!}`;
}

/** Group with place and orientation: `OH axial at C1`. */
export function groupAt(chair: Chair, substituent: Substituent): string {
  return `${substituent.label} ${orientationOf(chair, substituent)} at ${place(chair, substituent.ringAtom)}`;
}

/** Everything outside a ring that makes contacts with it: groups, and bonds into other rings of its system. */
export function outsideBonds(chair: Chair): readonly Substituent[] {
  return [...chair.ring.substituents, ...chair.ring.branches];
}

/** True when both outside atoms belong to one other ring: their torsion is then part of that ring. */
export function inOneRing(chair: Chair, a: Substituent, b: Substituent): boolean {
  return chair.ring.partners.some(({ atoms }) => atoms.includes(a.atom) && atoms.includes(b.atom));
}

/**
 * True when the contact of two outside atoms on neighbouring ring atoms is charged as an axial one in another ring that
 * holds this ring bond and one of the two.
 */
export function chargedElsewhere(chair: Chair, a: Substituent, b: Substituent): boolean {
  return chair.ring.partners.some(
    ({ atoms, shared }) =>
      shared.length > 1 &&
      atoms.includes(a.ringAtom) &&
      atoms.includes(b.ringAtom) &&
      (atoms.includes(a.atom) || atoms.includes(b.atom)),
  );
}

/** Pairs of outside bonds on ring atoms `distance` bonds apart, each pair once, in ring order. */
export function pairsAtDistance(
  chair: Chair,
  distance: 1 | 2 | 3,
): readonly (readonly [Substituent, Substituent])[] {
  const { atoms } = chair.ring;
  const on = (position: number) => outsideBonds(chair).filter((s) => s.ringAtom === atoms[position % 6]);
  const starts = distance === 3 ? [0, 1, 2] : [0, 1, 2, 3, 4, 5];
  return starts.flatMap((start) =>
    on(start).flatMap((a) => on(start + distance).map((b) => [a, b] as const)),
  );
}
