import { toKilocalorie } from "../quantity/units.ts";
import { axialRow } from "../register/axialRow.ts";
import type { RowMatch } from "../register/RowMatch.ts";
import type { AnalysedRing, Substituent } from "../structure/StructureAnalysis.ts";
import { cyclohexaneParameter } from "./cyclohexaneParameter.ts";
import type { EnergyContext } from "./EnergyContext.ts";
import type { Parameter } from "./Parameter.ts";
import { rowParameter } from "./rowParameter.ts";
import { classOf, nameOf, similarGroups } from "./siteGroup.ts";
import { borrowed, standIn } from "./standIn.ts";

/** Extra standard uncertainties in kcal/mol, by what is missing. */
const LOAN = { sameClass: 0.3, otherState: 0.3, otherRing: 0.4, strongDipole: 1.0, allylic: 1.5 };
/** A half-chair leaves an axial group fewer hydrogens to meet: share of the cyclohexane value, and its doubt (kcal/mol). */
const HALF_CHAIR = { share: 0.6, u: 0.5 };
/** Temperature at which a stand-in built from several rows is evaluated, K. */
const REFERENCE_TEMPERATURE = 298.15;

/**
 * What stands in for a group at a place of a heteroring that has no row of its own. In order: a group of the same
 * class at the same place; the group in another state of the ring's nitrogen or sulfur; the cyclohexane value times
 * the ratio found here for methyl (carbon groups); the cyclohexane value itself (others). Each is widened.
 * @param locant - position in the ring, 1 to 6 (dimensionless).
 */
export function heteroringStandIn(
  context: EnergyContext,
  ring: AnalysedRing,
  substituent: Substituent,
  locant: number,
): { readonly parameter: Parameter; readonly anomeric: boolean } {
  const name = nameOf(substituent);
  const missing = `No value for ${name} (${ring.ringKey}, position ${locant})`;
  const id = `stand-in/axial/${ring.ringKey}/${locant}/${name}`;
  const lookup = (ringKey: string, group: string) =>
    axialRow(context.register, { ...context, ring: ringKey, locant, group });
  const lend = ({ row, match }: RowMatch, extra: number, why: string) => ({
    parameter: borrowed(rowParameter({ row, match }), id, extra, `${missing}; ${why}`),
    anomeric: row.kind === "anomeric",
  });

  for (const similar of similarGroups(context.register, substituent)) {
    const match = lookup(ring.ringKey, similar);
    if (match !== undefined)
      return lend(match, LOAN.sameClass, `that of ${similar}, a group of the same class, stands in.`);
  }
  const { carbon, polar } = classOf(context.register, substituent);
  const flat = besideFlat(ring, substituent);
  if (flat === "nitrogen" && carbon && !polar) {
    for (const key of [substituent.group?.key ?? "", "Me"]) {
      const match = axialRow(context.register, {
        ...context,
        ring: "piperidine/NAcyl",
        locant: 2,
        group: key,
      });
      if (match !== undefined)
        return lend(
          match,
          LOAN.sameClass,
          `that of ${key} beside the N-acyl nitrogen of piperidine stands in.`,
        );
    }
  }
  for (const other of otherStates(context, ring, polar)) {
    const match = substituent.group === null ? undefined : lookup(other, substituent.group.key);
    if (match !== undefined) return lend(match, LOAN.otherState, `that of ${other} stands in.`);
  }

  const base = cyclohexaneParameter(context, substituent);
  if (ring.kind === "half-chair" && flat === null) {
    const at = base.at(REFERENCE_TEMPERATURE);
    const value = toKilocalorie(at.value) * HALF_CHAIR.share;
    const why = `${missing}; ${HALF_CHAIR.share} of its cyclohexane value stands in for a half-chair.`;
    const u = Math.hypot(toKilocalorie(at.u), HALF_CHAIR.u);
    return { parameter: { ...standIn(id, value, u, why), sources: base.sources }, anomeric: false };
  }
  const methyl = lookup(ring.ringKey, "Me");
  const carbocycle = axialRow(context.register, { ...context, ring: "cyclohexane", locant: 1, group: "Me" });
  if (carbon && !polar && methyl !== undefined && carbocycle !== undefined) {
    const at = base.at(REFERENCE_TEMPERATURE);
    const ratio = methyl.row.value / carbocycle.row.value;
    const value = toKilocalorie(at.value) * ratio;
    const u = Math.hypot(toKilocalorie(at.u) * ratio, LOAN.otherRing, 0.15 * Math.abs(value));
    const why = `${missing}; its cyclohexane value scaled by the ratio for methyl at this position (${ratio.toFixed(2)}) stands in.`;
    const sources = [...new Set([...base.sources, ...methyl.row.sources])];
    return { parameter: { ...standIn(id, value, u, why), sources }, anomeric: false };
  }
  const beside = polar && isBesideHeteroatom(ring, substituent);
  const charged = polar && ring.ringKey.endsWith("+");
  const extra = flat !== null ? LOAN.allylic : beside || charged ? LOAN.strongDipole : LOAN.otherRing;
  const reason =
    flat !== null
      ? " Strain with what the flat atom carries (allylic 1,3-strain) may hold the group axial."
      : beside
        ? " An anomeric effect is likely and may reverse the sign."
        : charged
          ? " The ring's charge may hold the group axial."
          : "";
  return {
    parameter: borrowed(base, id, extra, `${missing}; its cyclohexane value stands in.${reason}`),
    anomeric: false,
  };
}

/** Keys of the same parent ring with its heteroatom in another state; a polar group never crosses a charge. */
function otherStates(context: EnergyContext, ring: AnalysedRing, polar: boolean): readonly string[] {
  return [...new Set(context.register.rows.map((row) => row.ring))]
    .filter((key) => key !== ring.ringKey && key.split("/")[0] === ring.parent)
    .filter((key) => !polar || key.endsWith("+") === ring.ringKey.endsWith("+"))
    .sort();
}

function isBesideHeteroatom(ring: AnalysedRing, substituent: Substituent): boolean {
  const position = ring.atoms.indexOf(substituent.ringAtom);
  return [1, 5].some((step) => !ring.carbons.includes(ring.atoms[(position + step) % 6]!));
}

/** What flat atom stands beside the group's ring atom: a planar nitrogen, another one, or none. */
function besideFlat(ring: AnalysedRing, substituent: Substituent): "nitrogen" | "other" | null {
  const position = ring.atoms.indexOf(substituent.ringAtom);
  const flat = [1, 5].map((step) => (position + step) % 6).filter((at) => ring.flatAtoms.includes(at));
  if (flat.length === 0) return null;
  return flat.some((at) => ring.elements[at] === "N") ? "nitrogen" : "other";
}
