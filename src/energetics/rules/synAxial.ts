import { orientationOf } from "../../conformers/Chair.ts";
import { cyclohexaneParameter } from "../cyclohexaneParameter.ts";
import { pairParameter } from "../pairParameter.ts";
import { classOf, nameOf } from "../siteGroup.ts";
import { standIn } from "../standIn.ts";
import { inOneRing, pairsAtDistance, place } from "./describe.ts";
import type { EnergyRule } from "./EnergyRule.ts";

/** Two groups axial on the same side, two ring atoms apart. */
export const synAxial: EnergyRule = {
  id: "syn-axial",
  title: "Syn-axial pairs",
  appliesTo:
    "two axial groups 1,3 to each other: the excess over the two contacts with hydrogen that their own values already hold",
  terms: (chair, context) =>
    pairsAtDistance(chair, 2)
      .filter(([a, b]) => a.atom !== b.atom && !inOneRing(chair, a, b))
      .filter(([a, b]) => orientationOf(chair, a) === "axial" && orientationOf(chair, b) === "axial")
      .map(([a, b]) => {
        const found = pairParameter(context, "syn-axial", chair.ring, [a, b]);
        const label = `${a.label}/${b.label} syn-axial at ${place(chair, a.ringAtom)}, ${place(chair, b.ringAtom)}`;
        const atoms = [a.ringAtom, a.atom, b.ringAtom, b.atom];
        if (found !== undefined) {
          // Half of each group's own value is its contact with the hydrogen that the other group has replaced.
          return {
            kind: "syn-axial" as const,
            label: `${label} (total less half of each group's value)`,
            atoms,
            parts: [
              { parameter: found.parameter, coefficient: 1 },
              { parameter: cyclohexaneParameter(context, a), coefficient: -0.5 },
              { parameter: cyclohexaneParameter(context, b), coefficient: -0.5 },
            ],
          };
        }
        const first = classOf(context.register, a);
        const second = classOf(context.register, b);
        const names = [nameOf(a), nameOf(b)].sort();
        const polar = Number(first.polar) + Number(second.polar);
        const donor = first.donor || second.donor;
        const [value, u] =
          polar === 0 ? [2.0, 0.7] : polar === 1 ? [1.3, 0.7] : donor ? [0.7, 1.5] : [2.0, 1.5];
        return {
          kind: "syn-axial" as const,
          label: `${label} (excess)`,
          atoms,
          parts: [
            {
              parameter: standIn(
                `stand-in/syn-axial/${names.join("+")}`,
                value,
                u,
                `No syn-axial value for ${names.join("/")}; an excess of ${value} ± ${u} kcal/mol stands in.`,
              ),
              coefficient: 1,
            },
          ],
        };
      }),
};
