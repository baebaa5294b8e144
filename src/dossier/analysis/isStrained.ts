import { hasOrientations, orientationOf } from "../../conformers/Chair.ts";
import type { ChairSet } from "../../conformers/enumerateConformers.ts";
import type { EnergyTerm } from "../../energetics/EnergyTerm.ts";
import { combine, linearEnergy } from "../../energetics/LinearEnergy.ts";
import type { Substituent } from "../../structure/StructureAnalysis.ts";

/** Above this the most stable chair is strained enough for a twist-boat to compete, kJ/mol (4 kcal/mol). */
const STRAIN_LIMIT = 16.7;

/**
 * Whether a conformer of chairs is strained so much that a twist-boat may compete: a tertiary alkyl group axial, or
 * more than 4 kcal/mol of contributions. What several rings share is held in place by all of them, and counts as no
 * strain that another form would lose.
 * @param temperature - K.
 */
export function isStrained(chairs: ChairSet, terms: readonly EnergyTerm[], temperature: number): boolean {
  if (axialTertiary(chairs).length > 0) return true;
  const shared = new Set(
    chairs.flatMap(({ ring }) =>
      ring.partners.flatMap(({ atoms }) => ring.atoms.filter((atom) => atoms.includes(atom))),
    ),
  );
  const own = terms.filter(({ atoms }) => atoms.length > 0 && atoms.every((atom) => !shared.has(atom)));
  return combine([{ energy: linearEnergy(own), weight: 1 }], temperature).value > STRAIN_LIMIT;
}

/** Tertiary alkyl groups that are axial on an atom of one ring only. */
export function axialTertiary(chairs: ChairSet): readonly Substituent[] {
  return chairs
    .filter(hasOrientations)
    .flatMap((chair) =>
      chair.ring.substituents.filter(
        (group) =>
          group.groupClass === "tertiary-alkyl" &&
          orientationOf(chair, group) === "axial" &&
          chair.ring.partners.every(({ atoms }) => !atoms.includes(group.ringAtom)),
      ),
    );
}

/** How many of them are tert-butyl. */
export function axialTertButyls(chairs: ChairSet): number {
  return axialTertiary(chairs).filter((group) => group.group?.key === "t-Bu").length;
}
