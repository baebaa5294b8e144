import { orientationOf } from "../../conformers/Chair.ts";
import { pairParameter } from "../pairParameter.ts";
import { classOf, nameOf } from "../siteGroup.ts";
import { standIn } from "../standIn.ts";
import { chargedElsewhere, pairsAtDistance, place } from "./describe.ts";
import type { EnergyRule } from "./EnergyRule.ts";

/** Two groups on neighbouring ring atoms are gauche unless both are axial, when they are anti. */
export const vicinalGauche: EnergyRule = {
  id: "vicinal-gauche",
  title: "Gauche neighbours",
  appliesTo:
    "two groups on neighbouring ring atoms, equatorial–equatorial or axial–equatorial; nothing for the anti, diaxial pair",
  terms: (chair, context) =>
    pairsAtDistance(chair, 1)
      .filter(([a, b]) => !chargedElsewhere(chair, a, b))
      .filter(([a, b]) => !(orientationOf(chair, a) === "axial" && orientationOf(chair, b) === "axial"))
      .map(([a, b]) => {
        const found = pairParameter(context, "vicinal gauche", chair.ring, [a, b]);
        const first = classOf(context.register, a);
        const second = classOf(context.register, b);
        const names = [nameOf(a), nameOf(b)].sort();
        const polar = Number(first.polar) + Number(second.polar);
        const [value, u] = polar === 0 ? [0.9, 0.4] : polar === 1 ? [0.45, 0.4] : [0.5, 0.8];
        const parameter =
          found?.parameter ??
          standIn(
            `stand-in/vicinal gauche/${names.join("+")}`,
            value,
            u,
            `No gauche value for ${names.join("/")}; ${value} ± ${u} kcal/mol stands in.`,
          );
        return {
          kind: "vicinal gauche" as const,
          label: `${a.label}/${b.label} gauche at ${place(chair, a.ringAtom)}, ${place(chair, b.ringAtom)}`,
          atoms: [a.ringAtom, a.atom, b.ringAtom, b.atom],
          parts: [{ parameter, coefficient: 1 }],
        };
      }),
};
