import { orientationOf } from "../../conformers/Chair.ts";
import { classOf, nameOf } from "../siteGroup.ts";
import { standIn } from "../standIn.ts";
import { inOneRing, pairsAtDistance, place } from "./describe.ts";
import type { EnergyRule } from "./EnergyRule.ts";

/** Standard uncertainty, kcal/mol: diaxial polar groups across the ring, and diequatorial ones 1,3 to each other. */
const ACROSS = 0.5;
const BESIDE = 0.2;

/**
 * Polar groups that no pair value joins still feel each other's dipoles: additivity is kept, its doubt is charged.
 * 1,4-dihalides are the known case: they hold more of the diaxial chair than single values say (common practice).
 */
export const additivityAllowance: EnergyRule = {
  id: "additivity-allowance",
  title: "Allowance for dipoles",
  appliesTo:
    "two polar groups 1,4 and both axial, or 1,3 and both equatorial: no shift, but a doubt of its own",
  terms: (chair, context) => {
    const polar = (group: Parameters<typeof classOf>[1]) => classOf(context.register, group).polar;
    const both = (distance: 2 | 3, orientation: "axial" | "equatorial") =>
      pairsAtDistance(chair, distance).filter(
        ([a, b]) =>
          !inOneRing(chair, a, b) &&
          polar(a) &&
          polar(b) &&
          orientationOf(chair, a) === orientation &&
          orientationOf(chair, b) === orientation,
      );
    const term = (
      pair: readonly [Parameters<typeof classOf>[1], Parameters<typeof classOf>[1]],
      relation: string,
      orientation: string,
      u: number,
    ) => {
      const [a, b] = pair;
      const names = [nameOf(a), nameOf(b)].sort();
      return {
        kind: "additivity allowance" as const,
        label: `${a.label}/${b.label} ${relation} di${orientation} at ${place(chair, a.ringAtom)}, ${place(chair, b.ringAtom)}: dipoles not charged`,
        atoms: [a.ringAtom, a.atom, b.ringAtom, b.atom],
        parts: [
          {
            parameter: standIn(
              `allowance/${relation}/${orientation}/${names.join("+")}`,
              0,
              u,
              `No value joins ${names.join(" and ")} across the ring; no shift is charged, with ${u} kcal/mol of doubt.`,
            ),
            coefficient: 1,
          },
        ],
      };
    };
    return [
      ...both(3, "axial").map((pair) => term(pair, "1,4", "axial", ACROSS)),
      ...both(2, "equatorial").map((pair) => term(pair, "1,3", "equatorial", BESIDE)),
    ];
  },
};
