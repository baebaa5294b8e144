import type { Face } from "../structure/ringFaces.ts";
import type { AnalysedRing } from "../structure/StructureAnalysis.ts";
import type { Chair } from "./Chair.ts";

/** Most conformers listed for one compound. */
export const MAXIMUM_CONFORMERS = 128;

/** One chair for every analysed ring, in ring order. */
export type ChairSet = readonly Chair[];

/**
 * Every all-chair conformer: two chairs a ring, times the two places of the group on each inverting nitrogen.
 *
 * A ring whose only groups sit on inverting atoms is listed by the places of those groups alone: ring
 * inversion followed by nitrogen inversion then only exchanges ring hydrogens, as in N-methylpiperidine,
 * whose two conformers are known as the equatorial and the axial one.
 *
 * @returns null when there would be more than `MAXIMUM_CONFORMERS`.
 */
export function enumerateConformers(rings: readonly AnalysedRing[]): readonly ChairSet[] | null {
  let sets: ChairSet[] = [[]];
  for (const ring of rings) {
    const chairs = chairsOf(ring);
    if (sets.length * chairs.length > MAXIMUM_CONFORMERS) return null;
    sets = sets.flatMap((set) => chairs.map((chair) => [...set, chair]));
  }
  return sets;
}

function chairsOf(ring: AnalysedRing): readonly Chair[] {
  const free = ring.sites.filter((site) => site.faces === "free").map((site) => site.up!);
  const lasting = ring.substituents.length - free.length;
  const signs: readonly (1 | -1)[] = free.length > 0 && lasting === 0 ? [1] : [1, -1];
  const fixed: [number, Face][] = ring.sites.flatMap((site) =>
    site.faces === "free"
      ? []
      : [
          ...(site.up === null ? [] : [[site.up, "up"] as [number, Face]]),
          ...(site.down === null ? [] : [[site.down, "down"] as [number, Face]]),
        ],
  );
  return signs.flatMap((sign) =>
    Array.from({ length: 2 ** free.length }, (_, code) => ({
      ring,
      sign,
      faces: new Map<number, Face>([
        ...fixed,
        ...free.map((atom, bit): [number, Face] => [atom, (code >> bit) & 1 ? "down" : "up"]),
      ]),
    })),
  );
}
