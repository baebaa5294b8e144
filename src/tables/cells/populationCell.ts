import { formatPopulation } from "../../quantity/formatPopulation.ts";
import type { Cell } from "../TableModel.ts";

/**
 * A population, which never stands without its interval.
 *
 * @param population - fraction, 0 to 1.
 * @param interval - end points of the 95 % interval, fractions.
 */
export function populationCell(population: number, interval: readonly [number, number]): Cell {
  return {
    text: formatPopulation(population, interval),
    sortValue: population,
    numbers: [population, ...interval].map((fraction) => 100 * fraction),
    ...(interval[0] === interval[1] ? { standing: "symmetry" as const } : {}),
  };
}
