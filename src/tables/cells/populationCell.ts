import { formatPopulation } from "../../quantity/formatPopulation.ts";
import { roundPopulation } from "../../quantity/roundPopulation.ts";
import type { Cell } from "../TableModel.ts";

/**
 * A population, which never stands without its interval, marked as calculated unless symmetry makes it exact.
 *
 * @param population - fraction, 0 to 1.
 * @param interval - end points of the 95 % interval, fractions.
 */
export function populationCell(population: number, interval: readonly [number, number]): Cell {
  const { exact } = roundPopulation(population, interval);
  return {
    text: formatPopulation(population, interval),
    sortValue: population,
    numbers: [population, ...interval].map((fraction) => 100 * fraction),
    standing: exact ? "symmetry" : "computed",
  };
}
