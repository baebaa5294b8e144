import { orientationOf } from "../../conformers/Chair.ts";
import { cyclohexaneParameter } from "../cyclohexaneParameter.ts";
import { pairParameter } from "../pairParameter.ts";
import { classOf, nameOf } from "../siteGroup.ts";
import { standIn } from "../standIn.ts";
import { place } from "./describe.ts";
import type { EnergyRule } from "./EnergyRule.ts";

/** Two different groups on one ring atom: the departure of their published difference from additivity. */
export const geminal: EnergyRule = {
  id: "geminal",
  title: "Two groups on one ring atom",
  appliesTo:
    "two different groups on one ring atom: what their measured preference differs from that of the two single values",
  terms: (chair, context) =>
    chair.ring.atoms.flatMap((ringAtom) => {
      const here = chair.ring.substituents.filter((group) => group.ringAtom === ringAtom);
      const [a, b] = [...here].sort((x, y) => (nameOf(x) < nameOf(y) ? -1 : nameOf(x) > nameOf(y) ? 1 : 0));
      if (a === undefined || b === undefined || (a.form === b.form && a.form === b.mirrorForm)) return [];
      const found = pairParameter(context, "geminal", chair.ring, [a, b]);
      const atoms = [ringAtom, a.atom, b.atom];
      if (found === undefined) {
        if (orientationOf(chair, a) !== "axial") return [];
        const flat = [a, b].some((group) => isFlat(group.groupClass));
        const polar = classOf(context.register, a).polar || classOf(context.register, b).polar;
        const u = flat ? 1.0 : polar ? 0.5 : 0.2;
        const names = [nameOf(a), nameOf(b)].join("/");
        return [
          {
            kind: "geminal" as const,
            label: `${a.label} axial beside ${b.label} at ${place(chair, ringAtom)}`,
            atoms,
            parts: [
              {
                parameter: standIn(
                  `allowance/geminal/${names}`,
                  0,
                  u,
                  `No value for ${names} on one ring atom; the two single values are taken to add, with ${u} kcal/mol of doubt.`,
                ),
                coefficient: 1,
              },
            ],
          },
        ];
      }
      // The row is G(first axial) − G(second axial); charged where its first group is the axial one.
      const [first, second] = found.reversed ? [b, a] : [a, b];
      if (orientationOf(chair, first) !== "axial") return [];
      return [
        {
          kind: "geminal" as const,
          label: `${first.label} axial, ${second.label} equatorial at ${place(chair, ringAtom)} (published difference less the two single values)`,
          atoms,
          parts: [
            { parameter: found.parameter, coefficient: 1 },
            { parameter: cyclohexaneParameter(context, first), coefficient: -1 },
            { parameter: cyclohexaneParameter(context, second), coefficient: 1 },
          ],
        },
      ];
    }),
};

/** Groups with a flat face turn so as to make room, which single values do not show. */
function isFlat(groupClass: string): boolean {
  return ["aryl", "heteroaryl", "alkenyl", "acyl", "ester", "carboxamide", "carboxylate", "nitro"].includes(
    groupClass,
  );
}
