import { toKilocalorie } from "../quantity/units.ts";
import { axialRow } from "../register/axialRow.ts";
import type { AnalysedRing, Substituent } from "../structure/StructureAnalysis.ts";
import type { EnergyContext } from "./EnergyContext.ts";
import type { TermKind } from "./EnergyTerm.ts";
import type { Parameter } from "./Parameter.ts";
import { rowParameter } from "./rowParameter.ts";
import { classOf, nameOf, similarGroups } from "./siteGroup.ts";
import { borrowed, standIn } from "./standIn.ts";

/** Extra standard uncertainties in kcal/mol, by what is missing. */
const LOAN = { sameClass: 0.3, otherRing: 0.4, nextToHeteroatom: 1.0 };
/** Temperature at which stand-ins built from several rows are evaluated, K. */
const REFERENCE_TEMPERATURE = 298.15;

export interface AxialParameter {
  readonly kind: TermKind;
  readonly parameter: Parameter;
}

/**
 * G(axial) − G(equatorial) of one group at its place in its ring, positive when equatorial is preferred.
 *
 * In order: the row of this ring, position and group; in cyclohexane, the class's stand-in; in a heteroring, a row
 * of the same position for another group of the same class, the cyclohexane value of the group times the ratio
 * found there for methyl (carbon groups), or the cyclohexane value itself (others), each widened.
 */
export function axialParameter(
  context: EnergyContext,
  ring: AnalysedRing,
  substituent: Substituent,
): AxialParameter {
  const locant = ring.locants[ring.atoms.indexOf(substituent.ringAtom)]!;
  const where = `${ring.ringKey}, position ${locant}`;
  const lookup = (ringKey: string, group: string) =>
    axialRow(context.register, { ...context, ring: ringKey, locant, group });

  const key = substituent.group?.key;
  const own = key === undefined ? undefined : lookup(ring.ringKey, key);
  if (own !== undefined)
    return { kind: own.row.kind === "anomeric" ? "anomeric" : "axial group", parameter: rowParameter(own) };

  if (ring.parent === "cyclohexane")
    return { kind: "axial group", parameter: classStandIn(context, substituent) };

  const name = nameOf(substituent);
  for (const similar of similarGroups(context.register, substituent)) {
    const match = lookup(ring.ringKey, similar);
    if (match === undefined) continue;
    const why = `No value for ${name} (${where}); that of ${similar}, a group of the same class, stands in.`;
    return {
      kind: match.row.kind === "anomeric" ? "anomeric" : "axial group",
      parameter: borrowed(
        rowParameter(match),
        `stand-in/axial/${ring.ringKey}/${locant}/${name}`,
        LOAN.sameClass,
        why,
      ),
    };
  }
  return { kind: "axial group", parameter: heteroringStandIn(context, ring, substituent, locant, where) };
}

/** G(axial) − G(equatorial) of the group in cyclohexane: what each of its two syn-axial hydrogens is charged from. */
export function cyclohexaneParameter(context: EnergyContext, substituent: Substituent): Parameter {
  const lookup = (group: string) =>
    axialRow(context.register, { ...context, ring: "cyclohexane", locant: 1, group });
  const own = substituent.group === null ? undefined : lookup(substituent.group.key);
  if (own !== undefined) return rowParameter(own);
  return classStandIn(context, substituent);
}

function classStandIn(context: EnergyContext, substituent: Substituent): Parameter {
  const { axial, title } = classOf(context.register, substituent);
  const name = nameOf(substituent);
  return standIn(
    `stand-in/axial/cyclohexane/${name}`,
    axial.value,
    axial.u,
    `The register has no value for ${name}; the range usual for its class (${title}) stands in.`,
  );
}

function heteroringStandIn(
  context: EnergyContext,
  ring: AnalysedRing,
  substituent: Substituent,
  locant: number,
  where: string,
): Parameter {
  const base = cyclohexaneParameter(context, substituent);
  const { carbon, polar } = classOf(context.register, substituent);
  const name = nameOf(substituent);
  const id = `stand-in/axial/${ring.ringKey}/${locant}/${name}`;
  const methyl = axialRow(context.register, { ...context, ring: ring.ringKey, locant, group: "Me" });
  const carbocycle = axialRow(context.register, { ...context, ring: "cyclohexane", locant: 1, group: "Me" });
  const at = base.at(REFERENCE_TEMPERATURE);
  if (carbon && !polar && methyl !== undefined && carbocycle !== undefined) {
    const ratio = methyl.row.value / carbocycle.row.value;
    const value = toKilocalorie(at.value) * ratio;
    const u = Math.hypot(toKilocalorie(at.u) * ratio, LOAN.otherRing, 0.15 * Math.abs(value));
    const why = `No value for ${name} (${where}); its cyclohexane value scaled by the ratio for methyl at this position (${ratio.toFixed(2)}) stands in.`;
    return { ...standIn(id, value, u, why), sources: [...new Set([...base.sources, ...methyl.row.sources])] };
  }
  const besideHeteroatom = polar && isBesideHeteroatom(ring, substituent);
  const extra = besideHeteroatom ? LOAN.nextToHeteroatom : LOAN.otherRing;
  const anomeric = besideHeteroatom ? " An anomeric effect is likely and may reverse the sign." : "";
  return borrowed(
    base,
    id,
    extra,
    `No value for ${name} (${where}); its cyclohexane value stands in.${anomeric}`,
  );
}

function isBesideHeteroatom(ring: AnalysedRing, substituent: Substituent): boolean {
  const position = ring.atoms.indexOf(substituent.ringAtom);
  return [1, 5].some((step) => !ring.carbons.includes(ring.atoms[(position + step) % 6]!));
}
