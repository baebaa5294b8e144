import { joinInterval } from "./joinInterval.ts";
import { roundPopulation } from "./roundPopulation.ts";

/**
 * A population with its 95 % interval: `95.0 % (94.1–95.7 %)`, or `50 % (exact by symmetry)`.
 * Rounded as in `roundPopulation`; the interval is always there, for a population never stands alone.
 *
 * @param population - fraction, 0 to 1.
 * @param interval - end points of the 95 % interval, fractions.
 */
export function formatPopulation(population: number, interval: readonly [number, number]): string {
  const { value, low, high, exact } = roundPopulation(population, interval);
  const percent = "\u00a0%";
  if (exact) return `${value}${percent} (exact by symmetry)`;
  const range = low === high && /^[<>]/.test(low) ? low : joinInterval(low, high);
  return `${value}${percent} (${range}${percent})`;
}
