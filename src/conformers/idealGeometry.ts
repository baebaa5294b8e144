import type { Arrangement } from "./enumerateConformers.ts";
import { idealChairGeometry, type PlacedAtom } from "./idealChairGeometry.ts";

/** A placed atom with the ring system whose frame it is placed in. */
export interface SystemAtom extends PlacedAtom {
  readonly system: number;
}

/** Ideal coordinates in Å of every ring system of a conformer, for drawing. */
export function idealGeometry({ molecule, chairs }: Arrangement): readonly SystemAtom[] {
  return chairs.flatMap((chair) =>
    idealChairGeometry(molecule, chair).map((atom) => ({ ...atom, system: chair.ring.system })),
  );
}
