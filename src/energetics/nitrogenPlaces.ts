import { GAS_CONSTANT, NORMAL_95 } from "../quantity/units.ts";
import { nitrogenRow } from "../register/nitrogenRow.ts";
import type { AnalysedRing } from "../structure/StructureAnalysis.ts";
import type { EnergyContext } from "./EnergyContext.ts";
import { rowParameter } from "./rowParameter.ts";
import { standIn } from "./standIn.ts";

export interface HydrogenPlaces {
  /** Fraction of the molecules with the hydrogen equatorial, with its 95 % interval. */
  readonly equatorial: number;
  readonly equatorial95: readonly [number, number];
  /** Citation keys, or why a stand-in was used. */
  readonly source: string;
  readonly sourceKeys: readonly string[];
}

/**
 * Shares of the two places of the hydrogen on an inverting ring nitrogen, from G(axial) − G(equatorial) of hydrogen
 * there: two states that a conformer of the ring holds together, since nitrogen inverts faster than the ring.
 * @param temperature - K.
 */
export function nitrogenPlaces(
  context: EnergyContext,
  ring: AnalysedRing,
  temperature: number,
): HydrogenPlaces {
  const match = nitrogenRow(context.register, { ...context, ring: ring.ringKey, group: "H" });
  const parameter =
    match === undefined
      ? standIn(
          `stand-in/nitrogen/${ring.ringKey}/H`,
          0.4,
          0.4,
          `No value for hydrogen on the nitrogen of ${ring.parent}; 0.4 ± 0.4 kcal/mol, after piperidine, stands in.`,
        )
      : rowParameter(match);
  const { value, u } = parameter.at(temperature);
  const share = (energy: number) => 1 / (1 + Math.exp(-energy / (GAS_CONSTANT * temperature)));
  return {
    equatorial: share(value),
    equatorial95: [share(value - NORMAL_95 * u), share(value + NORMAL_95 * u)],
    source: match === undefined ? (parameter.note ?? "") : parameter.sources.join(", "),
    sourceKeys: parameter.sources,
  };
}
