import { joinInterval } from "./joinInterval.ts";
import { roundSignificant } from "./roundSignificant.ts";

/** Half-width of ln K below which a third digit means something. */
const THREE_DIGITS_BELOW = 0.05;

/**
 * An equilibrium constant: `0.053`, `2.4 × 10⁻³`, with its interval `19 (16–22)`.
 * Three significant digits where the interval is narrower than about 5 % either way, else two.
 *
 * @param K - dimensionless, positive.
 * @param interval - end points of the 95 % interval; none prints the value alone with two digits.
 */
export function formatK(K: number, interval?: readonly [number, number]): string {
  if (interval === undefined) return powerText(K, 2);
  const [low, high] = interval;
  if (low === high) return `${powerText(K, 2).replace(/\.0+$/, "")} (exact by symmetry)`;
  const digits = Math.log(high / low) / 2 < THREE_DIGITS_BELOW ? 3 : 2;
  return `${powerText(K, digits)} (${joinInterval(powerText(low, digits), powerText(high, digits))})`;
}

function powerText(value: number, digits: number): string {
  const { mantissa, exponent } = roundSignificant(value, digits);
  return exponent === 0 ? mantissa : `${mantissa}\u00a0×\u00a010${superscript(exponent)}`;
}

const SUPERSCRIPTS: Readonly<Record<string, string>> = {
  "-": "\u207b",
  "0": "\u2070",
  "1": "\u00b9",
  "2": "\u00b2",
  "3": "\u00b3",
  "4": "\u2074",
  "5": "\u2075",
  "6": "\u2076",
  "7": "\u2077",
  "8": "\u2078",
  "9": "\u2079",
};

function superscript(exponent: number): string {
  return [...String(exponent)].map((digit) => SUPERSCRIPTS[digit] ?? digit).join("");
}
