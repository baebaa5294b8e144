import { axialRow } from "../register/axialRow.ts";
import type { Substituent } from "../structure/StructureAnalysis.ts";
import type { EnergyContext } from "./EnergyContext.ts";
import type { Parameter } from "./Parameter.ts";
import { rowParameter } from "./rowParameter.ts";
import { classOf, nameOf } from "./siteGroup.ts";
import { standIn } from "./standIn.ts";

/**
 * G(axial) − G(equatorial) of the group in cyclohexane: what each of its two syn-axial hydrogens is charged from.
 * The range usual for the group's class stands in where the register has no row.
 */
export function cyclohexaneParameter(context: EnergyContext, substituent: Substituent): Parameter {
  const key = substituent.group?.key;
  const own =
    key === undefined
      ? undefined
      : axialRow(context.register, { ...context, ring: "cyclohexane", locant: 1, group: key });
  if (own !== undefined) return rowParameter(own);
  const { axial, title } = classOf(context.register, substituent);
  const name = nameOf(substituent);
  return standIn(
    `stand-in/axial/cyclohexane/${name}`,
    axial.value,
    axial.u,
    `The register has no value for ${name}; the range usual for its class (${title}) stands in.`,
  );
}
