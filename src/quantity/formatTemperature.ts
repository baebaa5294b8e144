import { plainNumber } from "./plainNumber.ts";
import { toDecimals } from "./toDecimals.ts";
import { ZERO_CELSIUS } from "./units.ts";

/**
 * An absolute temperature: `298.15 K`, or `298.15 K (25 °C)` when asked for both.
 * At most two decimals, none that are zero.
 *
 * @param temperature - K.
 */
export function formatTemperature(temperature: number, options: { readonly celsius?: boolean } = {}): string {
  const kelvins = `${trimmed(temperature)}\u00a0K`;
  return options.celsius === true ? `${kelvins} (${trimmed(temperature - ZERO_CELSIUS)}\u00a0°C)` : kelvins;
}

function trimmed(value: number): string {
  return plainNumber(String(Number(toDecimals(value, 2))));
}
