import { type Chair, orientationOf } from "../conformers/Chair.ts";
import type { ChairSet } from "../conformers/enumerateConformers.ts";
import type { Substituent } from "../structure/StructureAnalysis.ts";
import { axialParameter } from "./axialParameter.ts";
import type { EnergyContext } from "./EnergyContext.ts";
import type { EnergyTerm } from "./EnergyTerm.ts";
import { place } from "./rules/describe.ts";

/**
 * Takes back what two fused rings charge twice. Where a bond is cis-fused, the atom of ring B that is axial in
 * ring A and the atom of ring A that is axial in ring B are gauche to each other across the shared bond: one contact,
 * a half of either group's value, charged in both rings. A cis-decalin so carries three gauche butane
 * units and not four (common practice).
 */
export function ringFusion(chairs: ChairSet, context: EnergyContext): readonly EnergyTerm[] {
  return chairs.flatMap((first, i) =>
    chairs.slice(i + 1).flatMap((second) => {
      const shared = first.ring.atoms.filter((atom) => second.ring.atoms.includes(atom));
      if (shared.length !== 2) return [];
      return [shared, [shared[1]!, shared[0]!]].flatMap(([a, b]) => {
        const x = axialBranch(first, a!, second);
        const y = axialBranch(second, b!, first);
        if (x === undefined || y === undefined) return [];
        const half = (chair: Chair, branch: Substituent) => ({
          parameter: axialParameter(context, chair.ring, branch).parameter,
          coefficient: -0.25,
        });
        return [
          {
            kind: "ring fusion" as const,
            label: `contact across ${place(first, a!)}–${place(first, b!)} charged in both rings, taken back once`,
            atoms: [a!, x.atom, b!, y.atom],
            parts: [half(first, x), half(second, y)],
          },
        ];
      });
    }),
  );
}

/** The bond from a shared atom into the other ring, where it is axial. */
function axialBranch(chair: Chair, ringAtom: number, other: Chair): Substituent | undefined {
  return chair.ring.branches.find(
    (branch) =>
      branch.ringAtom === ringAtom &&
      other.ring.atoms.includes(branch.atom) &&
      orientationOf(chair, branch) === "axial",
  );
}
