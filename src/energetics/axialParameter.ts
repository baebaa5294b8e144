import { axialRow } from "../register/axialRow.ts";
import type { AnalysedRing, Substituent } from "../structure/StructureAnalysis.ts";
import { cyclohexaneParameter } from "./cyclohexaneParameter.ts";
import type { EnergyContext } from "./EnergyContext.ts";
import type { TermKind } from "./EnergyTerm.ts";
import { heteroringStandIn } from "./heteroringStandIn.ts";
import type { Parameter } from "./Parameter.ts";
import { rowParameter } from "./rowParameter.ts";

export interface AxialParameter {
  readonly kind: TermKind;
  readonly parameter: Parameter;
}

/**
 * G(axial) − G(equatorial) of one group at its place in its ring, positive when equatorial is preferred: the row of
 * this ring, position and group, or what stands in for it.
 */
export function axialParameter(
  context: EnergyContext,
  ring: AnalysedRing,
  substituent: Substituent,
): AxialParameter {
  const locant = ring.locants[ring.atoms.indexOf(substituent.ringAtom)]!;
  const key = substituent.group?.key;
  const own =
    key === undefined
      ? undefined
      : axialRow(context.register, { ...context, ring: ring.ringKey, locant, group: key });
  if (own !== undefined) {
    return { kind: own.row.kind === "anomeric" ? "anomeric" : "axial group", parameter: rowParameter(own) };
  }
  if (ring.parent === "cyclohexane") {
    return { kind: "axial group", parameter: cyclohexaneParameter(context, substituent) };
  }
  const { parameter, anomeric } = heteroringStandIn(context, ring, substituent, locant);
  return { kind: anomeric ? "anomeric" : "axial group", parameter };
}
