import { hasOrientations, orientationOf } from "../../conformers/Chair.ts";
import type { EnergyContext } from "../../energetics/EnergyContext.ts";
import { classOf } from "../../energetics/siteGroup.ts";
import { labelText } from "../../quantity/labelText.ts";
import type { AnalysedRing, Substituent } from "../../structure/StructureAnalysis.ts";
import type { Alert } from "../Dossier.ts";
import type { ConformerResult } from "./analyseConformers.ts";
import { axialTertiary, isStrained } from "./isStrained.ts";

/** What a reader must know before trusting the populations, from the conformers and what they rest on. */
export function conformerAlerts(
  result: ConformerResult,
  rings: readonly AnalysedRing[],
  context: EnergyContext,
  temperature: number,
): readonly Alert[] {
  const alerts: Alert[] = [];
  const add = (severity: Alert["severity"], code: string, message: string) =>
    alerts.push({ code, severity, message });
  const missing = result.deciding.filter((parameter) => parameter.basis === "not available");
  const estimated = result.deciding.filter((parameter) => parameter.standing === "estimate");
  const recalled = result.deciding.filter((parameter) => parameter.standing === "memory");
  const list = (parameters: readonly { readonly id: string }[]) => parameters.map(({ id }) => id).join("; ");

  if (missing.length > 0) {
    add(
      "caution",
      "value-not-available",
      `No register value for ${missing.length} contribution${missing.length > 1 ? "s" : ""} that tell${missing.length > 1 ? "" : "s"} the conformers apart; wide stand-ins are used: ${list(missing)}.`,
    );
  }
  if (estimated.length > 0) {
    add(
      "caution",
      "value-estimated",
      `The result rests on register values marked as estimates: ${list(estimated)}.`,
    );
  }
  if (recalled.length > 0) {
    add(
      "note",
      "value-from-memory",
      `Register values recalled from the literature and not seen again: ${list(recalled)}.`,
    );
  }
  if (result.equilibria.some((equilibrium) => equilibrium.from === "A" && equilibrium.unresolved)) {
    add(
      "caution",
      "major-unresolved",
      "The interval of the free-energy difference contains zero: which conformer is the major one is unresolved.",
    );
  }
  if (result.relation === "identical") {
    add(
      "note",
      "identical-chairs",
      "The two chairs are superimposable; ring inversion exchanges equal forms.",
    );
  }
  if (result.relation === "enantiomeric") {
    add(
      "note",
      "enantiomeric-chairs",
      "Each chair is chiral and the other is its mirror image; they interconvert, so the substance is not chiral on the time average and is no racemate of separable enantiomers unless inversion is slow.",
    );
  }
  const chairsOnly = result.chairSets.findIndex((chairs) =>
    chairs.every(({ form }) => form !== "twist-boat"),
  );
  const twists = result.conformers.filter(({ rings: forms }) =>
    forms.some(({ form }) => form === "twist-boat"),
  );
  if (chairsOnly < 0) {
    add(
      "caution",
      "non-chair-forms",
      "No arrangement of chairs closes every ring; the forms listed have a twist-boat. They are built and compared by mechanics, without any published value, and the search may have missed some.",
    );
  } else {
    const best = result.chairSets[chairsOnly]!;
    const bulky = axialTertiary(best);
    const reason =
      bulky.length > 0
        ? `${bulky.map((group) => labelText(group.label)).join(", ")} is axial in the best chair`
        : "the best chair carries more than 4 kcal/mol of charged contacts";
    if (twists.length > 0) {
      add(
        "caution",
        "non-chair-forms",
        `Twist-boats are listed beside the chairs: ${reason}. Their energies rest on mechanics and are rough; axial and equatorial have no meaning on a twist-boat.`,
      );
    } else if (isStrained(best, result.terms[chairsOnly]!, temperature)) {
      add(
        "caution",
        "non-chair-possible",
        `A twist-boat may compete: ${reason}. Such forms are built only with mechanics, which did not run or found none.`,
      );
    }
  }
  const pairs = donorPairs(result.chairSets, context);
  if (pairs.length > 0) {
    add(
      "caution",
      "hydrogen-bond",
      `Intramolecular hydrogen bonds are possible (${pairs.join("; ")}); populations then depend on solvent and concentration more than the model shows.`,
    );
  }
  if (rings.some((ring) => isPyranose(ring, context))) {
    add(
      "caution",
      "pyranose",
      "Polyhydroxylated oxane: single-group values are not meant for pyranoses in water; treat the populations as rough.",
    );
  }
  const nitrogens = result.conformers[0]!.nitrogens;
  if (nitrogens.length > 0) {
    const shares = nitrogens.map(
      ({ locant, equatorial, equatorial95: [low, high] }) =>
        `N${locant} ${Math.round(100 * equatorial)} % (${Math.round(100 * low)} to ${Math.round(100 * high)} %)`,
    );
    add(
      "note",
      "nh-places",
      `Each conformer holds both places of the hydrogen on the ring nitrogen; the share with it equatorial is ${shares.join(", ")}.`,
    );
  }
  return alerts;
}

/** Donor within reach of a polar group in some conformer: gauche on neighbouring ring atoms, or syn-axial. */
function donorPairs(chairSets: ConformerResult["chairSets"], context: EnergyContext): readonly string[] {
  const found = new Set<string>();
  for (const chair of chairSets.flat().filter(hasOrientations)) {
    const { ring } = chair;
    const polar = ring.substituents.filter((group) => classOf(context.register, group).polar);
    const at = (group: Substituent) => ring.atoms.indexOf(group.ringAtom);
    polar.forEach((a, i) => {
      for (const b of polar.slice(i + 1)) {
        const steps = Math.abs(at(a) - at(b));
        const distance = Math.min(steps, 6 - steps);
        const bothAxial = orientationOf(chair, a) === "axial" && orientationOf(chair, b) === "axial";
        const inReach = (distance === 1 && !bothAxial) || (distance === 2 && bothAxial);
        if (!inReach) continue;
        if (!classOf(context.register, a).donor && !classOf(context.register, b).donor) continue;
        found.add(`${labelText(a.label)} and ${labelText(b.label)} 1,${distance + 1}`);
      }
    });
  }
  return [...found].sort();
}

/** An oxane with three or more oxygen groups in a protic medium. */
function isPyranose(ring: AnalysedRing, context: EnergyContext): boolean {
  const oxygens = ring.substituents.filter((group) =>
    ["hydroxyl", "alkoxy", "acyloxy"].includes(group.groupClass),
  );
  return ring.parent === "oxane" && oxygens.length >= 3 && context.medium === "protic";
}
