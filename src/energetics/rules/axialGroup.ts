import { orientationOf } from "../../conformers/Chair.ts";
import { axialParameter } from "../axialParameter.ts";
import { groupAt, outsideBonds } from "./describe.ts";
import type { EnergyRule } from "./EnergyRule.ts";

/** Each axial group costs its own G(axial) − G(equatorial) at its place in the ring. */
export const axialGroup: EnergyRule = {
  id: "axial-group",
  title: "Axial groups",
  appliesTo:
    "every axial group on an atom that keeps its configuration: gauche to the ring on both sides, the two 1,3-diaxial contacts with hydrogen",
  terms: (chair, context) =>
    outsideBonds(chair)
      .filter(
        (group) => !chair.ring.inverting.includes(group.ringAtom) && orientationOf(chair, group) === "axial",
      )
      .map((group) => {
        const { kind, parameter } = axialParameter(context, chair.ring, group);
        return {
          kind,
          label: groupAt(chair, group),
          atoms: [group.ringAtom, group.atom],
          parts: [{ parameter, coefficient: 1 }],
        };
      }),
};
