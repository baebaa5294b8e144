import type { Chair } from "../../conformers/Chair.ts";
import { orientationOf } from "../../conformers/Chair.ts";
import type { Substituent } from "../../structure/StructureAnalysis.ts";

/** Ring atom by element and locant, as a table names it: `C1`, `N4`, primed in further rings. */
export function place(chair: Chair, ringAtom: number): string {
  const { ring } = chair;
  const position = ring.atoms.indexOf(ringAtom);
  return `${ring.elements[position]!}${ring.locants[position]!}${"′".repeat(ring.index)}`;
}

/** Group with place and orientation: `OH axial at C1`. */
export function groupAt(chair: Chair, substituent: Substituent): string {
  return `${substituent.label} ${orientationOf(chair, substituent)} at ${place(chair, substituent.ringAtom)}`;
}

/** Pairs of groups on ring atoms `distance` bonds apart, each pair once, in ring order. */
export function pairsAtDistance(
  chair: Chair,
  distance: 1 | 2 | 3,
): readonly (readonly [Substituent, Substituent])[] {
  const { atoms, substituents } = chair.ring;
  const on = (position: number) => substituents.filter((s) => s.ringAtom === atoms[position % 6]);
  const starts = distance === 3 ? [0, 1, 2] : [0, 1, 2, 3, 4, 5];
  return starts.flatMap((start) =>
    on(start).flatMap((a) => on(start + distance).map((b) => [a, b] as const)),
  );
}
