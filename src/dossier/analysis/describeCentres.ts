import type { AnalysedRing } from "../../structure/StructureAnalysis.ts";
import { compareLocants } from "../compareLocants.ts";

/** CIP descriptors with ring locants in their order (`1R`, `4aS`), centres outside the rings after them by atom. */
export function describeCentres(
  labels: ReadonlyMap<number, string>,
  rings: readonly AnalysedRing[],
): readonly string[] {
  const names = new Map(
    rings.flatMap((ring) => ring.atoms.map((atom, i): [number, string] => [atom, ring.names[i]!])),
  );
  const centres = [...labels].map(([atom, label]) => ({ atom, label, locant: names.get(atom) ?? null }));
  const inRings = centres.flatMap(({ locant, label }) => (locant === null ? [] : [{ locant, label }]));
  const others = centres.filter(({ locant }) => locant === null).sort((a, b) => a.atom - b.atom);
  return [
    ...inRings
      .sort((a, b) => compareLocants(a.locant, b.locant))
      .map(({ locant, label }) => `${locant}${label}`),
    ...others.map(({ atom, label }) => `atom ${atom} ${label}`),
  ];
}
