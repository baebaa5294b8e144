import type { AnalysedRing } from "../../structure/StructureAnalysis.ts";
import type { Ring } from "../Dossier.ts";

/**
 * A ring as the Dossier records it.
 * @param open - atoms whose configuration is not decided: their groups have no face and no cis/trans relation.
 */
export function describeRing(ring: AnalysedRing, open: ReadonlySet<number> = new Set()): Ring {
  const locant = (atom: number) => `${ring.locants[ring.atoms.indexOf(atom)]}${"′".repeat(ring.index)}`;
  return {
    index: ring.index,
    atoms: ring.atoms,
    locants: ring.atoms.map(locant),
    parent: ring.parent,
    ringKey: ring.ringKey,
    substituents: ring.substituents.map((group) => {
      const site = ring.sites.find((entry) => entry.ringAtom === group.ringAtom)!;
      return {
        ringAtom: group.ringAtom,
        atom: group.atom,
        locant: locant(group.ringAtom),
        face:
          site.faces === "free" || open.has(group.ringAtom) ? null : site.up === group.atom ? "up" : "down",
        group: group.group?.key ?? null,
        label: group.label,
        labelReversed: group.labelReversed,
      };
    }),
    configuration: configurationOf(ring, open),
  };
}

/** cis/trans of every pair of ring atoms that carry one lasting group each. */
export function configurationOf(
  ring: AnalysedRing,
  open: ReadonlySet<number> = new Set(),
): Ring["configuration"] {
  const single = ring.substituents.filter(
    (group) =>
      !ring.inverting.includes(group.ringAtom) &&
      !open.has(group.ringAtom) &&
      ring.substituents.filter((other) => other.ringAtom === group.ringAtom).length === 1,
  );
  const face = (group: (typeof single)[number]) =>
    ring.sites.find((site) => site.ringAtom === group.ringAtom)!.up === group.atom;
  const locant = (group: (typeof single)[number]) =>
    `${ring.locants[ring.atoms.indexOf(group.ringAtom)]}${"′".repeat(ring.index)}`;
  return single.flatMap((a, i) =>
    single.slice(i + 1).map((b) => ({
      locants: [locant(a), locant(b)] as const,
      relation: face(a) === face(b) ? ("cis" as const) : ("trans" as const),
    })),
  );
}
