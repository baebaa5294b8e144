import type { AnalysedRing } from "../../structure/StructureAnalysis.ts";
import type { Ring } from "../Dossier.ts";

/**
 * A ring as the Dossier records it.
 * @param open - atoms whose configuration is not decided: their groups have no face and no cis/trans relation.
 */
export function describeRing(ring: AnalysedRing, open: ReadonlySet<number> = new Set()): Ring {
  const locant = (atom: number) => ring.names[ring.atoms.indexOf(atom)]!;
  return {
    index: ring.index,
    kind: ring.kind,
    system: ring.system,
    atoms: ring.atoms,
    locants: ring.names,
    parent: ring.parent,
    ringKey: ring.ringKey,
    substituents: [...ring.substituents, ...ring.flatGroups].map((group) => {
      const site = ring.sites.find((entry) => entry.ringAtom === group.ringAtom)!;
      return {
        ringAtom: group.ringAtom,
        atom: group.atom,
        locant: locant(group.ringAtom),
        face:
          site.faces === "free" || site.faces === "flat" || open.has(group.ringAtom)
            ? null
            : site.up === group.atom
              ? "up"
              : "down",
        group: group.group?.key ?? null,
        label: group.label,
        labelReversed: group.labelReversed,
      };
    }),
    branches: ring.branches.map((branch) => ({
      ringAtom: branch.ringAtom,
      atom: branch.atom,
      locant: locant(branch.ringAtom),
      towards: branch.label.replace(/^ring [A-Z][a-z]?/, ""),
    })),
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
      [...ring.substituents, ...ring.branches].filter((other) => other.ringAtom === group.ringAtom).length ===
        1,
  );
  const face = (group: (typeof single)[number]) =>
    ring.sites.find((site) => site.ringAtom === group.ringAtom)!.up === group.atom;
  const locant = (group: (typeof single)[number]) => ring.names[ring.atoms.indexOf(group.ringAtom)]!;
  return single.flatMap((a, i) =>
    single.slice(i + 1).map((b) => ({
      locants: [locant(a), locant(b)] as const,
      relation: face(a) === face(b) ? ("cis" as const) : ("trans" as const),
    })),
  );
}
