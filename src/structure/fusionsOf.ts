import type { AnalysedRing } from "./StructureAnalysis.ts";

/** A bond between two tetrahedral atoms that a ring shares with another ring, and how the two are joined there. */
export interface Fusion {
  readonly atoms: readonly [number, number];
  readonly relation: "cis" | "trans";
}

/**
 * The fusions of a ring whose atoms keep their configuration: cis when the other ring leaves both atoms on the
 * same face, trans when on opposite faces.
 */
export function fusionsOf(ring: AnalysedRing): readonly Fusion[] {
  return ring.partners.flatMap(({ shared, ends }) => {
    if (shared.length !== 2) return [];
    const sites = shared.map((position) => ring.sites[position]!);
    if (sites.some((site) => site.faces === "flat" || site.faces === "free")) return [];
    const up = sites.map((site, i) => site.up === ends[i]);
    return [
      {
        atoms: [sites[0]!.ringAtom, sites[1]!.ringAtom] as const,
        relation: up[0] === up[1] ? ("cis" as const) : ("trans" as const),
      },
    ];
  });
}
