import type { Molecule } from "./Molecule.ts";
import { ringFaces } from "./ringFaces.ts";
import { ringPartners } from "./ringPartners.ts";
import { sixCycles } from "./sixCycles.ts";

/** Longest bridge, in atoms, whose two ends must leave a ring on the same face. */
const SHORT_BRIDGE = 4;

/**
 * False when the senses of a molecule cannot exist: the ends of a short bridge across a ring, or of a
 * three-membered ring fused to it, on opposite faces. Such bridgeheads have one relative configuration only
 * (common practice), so that it need not be given.
 */
export function bridgesFit(molecule: Molecule): boolean {
  const rings = [
    ...molecule.rings.filter((ring) => ring.length <= 7 && ring.length !== 6),
    ...sixCycles(molecule),
  ];
  return rings.every((ring) => {
    const sites = ringFaces(molecule, ring);
    return (ringPartners(molecule, ring) ?? []).every(({ shared, ends, bridge, size }) => {
      const joined = shared.length > 2 ? bridge <= SHORT_BRIDGE : shared.length === 2 && size === 3;
      if (!joined) return true;
      const [first, last] = [sites[shared[0]!]!, sites[shared.at(-1)!]!];
      if ([first, last].some((site) => site.faces === "flat" || site.faces === "free")) return true;
      const up = (site: typeof first, atom: number) => site.up === atom;
      return up(first, ends[0]) === up(last, ends[1]);
    });
  });
}
