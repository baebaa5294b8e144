import type { Body } from "../structure/Body.ts";
import type { Molecule } from "../structure/Molecule.ts";
import type { AnalysedRing } from "../structure/StructureAnalysis.ts";
import { type Arrangement, enumerateConformers } from "./enumerateConformers.ts";
import type { Mechanics } from "./mechanics/Mechanics.ts";
import { puckering } from "./puckering.ts";
import { relateConformers } from "./relateConformers.ts";
import { type RelaxedConformer, relaxConformer } from "./relaxConformer.ts";

/** Starts relaxed at most; each takes a few hundredths of a second or more. */
const MOST_STARTS = 36;
/** Forms kept, and how far above the lowest, kJ/mol. */
const MOST_KEPT = 6;
const REACH = 25;
/** θ within this of 90°, degrees, is a boat or twist-boat. */
const EQUATOR = 35;

export interface TwistConformer {
  readonly arrangement: Arrangement;
  readonly relaxed: RelaxedConformer;
}

/**
 * Forms with one twist-boat, each started from one of the six twist-boats of a saturated ring with all others as chairs,
 * and relaxed by mechanics; only those that stay twist-boats or boats are kept, superimposable ones once, lowest first.
 */
export function twistConformers(
  molecule: Molecule,
  rings: readonly AnalysedRing[],
  body: Body,
  mechanics: Mechanics,
): readonly TwistConformer[] {
  const starts = (enumerateConformers(molecule, rings, 1) ?? []).slice(0, MOST_STARTS);
  const found: TwistConformer[] = [];
  for (const arrangement of starts) {
    const relaxed = relaxConformer(arrangement, mechanics);
    if (relaxed === null || !staysTwisted(arrangement, relaxed)) continue;
    const known = found.some(
      (other) =>
        Math.abs(other.relaxed.energy_kJ_mol - relaxed.energy_kJ_mol) < 0.02 &&
        relateConformers(body, other.arrangement, arrangement) === "identical",
    );
    if (!known) found.push({ arrangement, relaxed });
  }
  found.sort((a, b) => a.relaxed.energy_kJ_mol - b.relaxed.energy_kJ_mol);
  const lowest = found[0]?.relaxed.energy_kJ_mol ?? 0;
  return found.filter(({ relaxed }) => relaxed.energy_kJ_mol - lowest <= REACH).slice(0, MOST_KEPT);
}

function staysTwisted({ chairs }: Arrangement, relaxed: RelaxedConformer): boolean {
  return chairs
    .filter(({ form }) => form === "twist-boat")
    .every(({ ring }) => {
      const { theta } = puckering(
        ring.atoms.map((atom) => ({
          x: relaxed.coordinates[3 * atom]!,
          y: relaxed.coordinates[3 * atom + 1]!,
          z: relaxed.coordinates[3 * atom + 2]!,
        })),
      );
      return Math.abs(theta - 90) <= EQUATOR;
    });
}
