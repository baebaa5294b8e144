import { ZERO_CELSIUS } from "../../../quantity/units.ts";
import { quote } from "./quote.ts";
import { problem, type Reading } from "./Reading.ts";
import { readQuantity, type WrittenQuantity } from "./readQuantity.ts";

/** A temperature as written, and in kelvin. */
export interface WrittenTemperature extends WrittenQuantity {
  readonly kelvin: number;
}

/** Below 1 K and above 1000 K no solution and no saturated ring exists; such a value is a slip. */
const LOWEST_K = 1;
const HIGHEST_K = 1000;

const TEMPERATURE = {
  code: "bad-temperature",
  name: "a temperature",
  units: { K: "K", "°C": "°C", C: "°C", ºC: "°C", "℃": "°C", "deg C": "°C", kelvin: "K" },
  example: "298.15 K or 25 °C",
} as const;

/**
 * Reads `298.15 K`, `25 °C` or `25 C`; T/K = t/°C + 273.15 exactly.
 * A bare number is refused, because 25 may be meant in either scale.
 */
export function readTemperature(found: unknown): Reading<WrittenTemperature> {
  const bare =
    typeof found === "number"
      ? found
      : typeof found === "string" && /^\d+(\.\d+)?$/.test(found.trim())
        ? Number(found)
        : null;
  if (bare !== null) {
    return problem(
      "bad-temperature",
      `The temperature ${bare} has no unit. Add one: 298.15 K or 25 °C.`,
      bare >= LOWEST_K && bare <= HIGHEST_K ? { suggestion: bare >= 150 ? `${bare} K` : `${bare} °C` } : {},
    );
  }
  const reading = readQuantity(found, TEMPERATURE);
  if ("problem" in reading) return reading;
  const { value, unit } = reading.value;
  // Celsius values carry few decimals; the sum is cleaned of binary noise far below any printed digit.
  const kelvin = unit === "K" ? value : Number((value + ZERO_CELSIUS).toFixed(6));
  if (kelvin < 0) {
    return problem("bad-temperature", `${quote(String(found))} lies below absolute zero (0 K, −273.15 °C).`);
  }
  if (kelvin < LOWEST_K || kelvin > HIGHEST_K) {
    return problem(
      "bad-temperature",
      `${quote(String(found))} lies outside the range that is analysed, ${LOWEST_K} K to ${HIGHEST_K} K.`,
    );
  }
  return { value: { ...reading.value, kelvin } };
}
