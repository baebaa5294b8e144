import { orientationOf } from "../../conformers/Chair.ts";
import { nitrogenRow } from "../../register/nitrogenRow.ts";
import { rowParameter } from "../rowParameter.ts";
import { nameOf, similarGroups } from "../siteGroup.ts";
import { borrowed, standIn } from "../standIn.ts";
import { groupAt, outsideBonds } from "./describe.ts";
import type { EnergyRule } from "./EnergyRule.ts";

/** Loan from another group of the same class, kcal/mol. */
const LOAN = 0.5;

/** The group on an inverting nitrogen costs its own G(axial) − G(equatorial) when axial. */
export const nitrogenSubstituent: EnergyRule = {
  id: "nitrogen-substituent",
  title: "Groups on inverting nitrogen",
  appliesTo: "the axial group on a ring nitrogen that inverts; both places are separate conformers",
  terms: (chair, context) =>
    outsideBonds(chair)
      .filter(
        (group) => chair.ring.inverting.includes(group.ringAtom) && orientationOf(chair, group) === "axial",
      )
      .map((group) => {
        const { ring } = chair;
        const lookup = (key: string) =>
          nitrogenRow(context.register, { ...context, ring: ring.ringKey, group: key });
        const name = nameOf(group);
        const own = group.group === null ? undefined : lookup(group.group.key);
        const loan = similarGroups(context.register, group)
          .map((key) => ({ key, match: lookup(key) }))
          .find(({ match }) => match !== undefined);
        const parameter =
          own !== undefined
            ? rowParameter(own)
            : loan?.match !== undefined
              ? borrowed(
                  rowParameter(loan.match),
                  `stand-in/nitrogen/${ring.ringKey}/${name}`,
                  LOAN,
                  `No value for ${name} on nitrogen; that of ${loan.key} stands in.`,
                )
              : standIn(
                  `stand-in/nitrogen/${ring.ringKey}/${name}`,
                  1.5,
                  1.2,
                  `No value for ${name} on the nitrogen of ${ring.parent}; 1.5 ± 1.2 kcal/mol stands in.`,
                );
        return {
          kind: "nitrogen substituent" as const,
          label: groupAt(chair, group),
          atoms: [group.ringAtom, group.atom],
          parts: [{ parameter, coefficient: 1 }],
        };
      }),
};
