import { fromKilocalorie } from "../quantity/units.ts";
import type { RegisterRow } from "../register/Register.ts";
import type { RowMatch } from "../register/RowMatch.ts";
import type { Parameter } from "./Parameter.ts";

/** Temperature taken for a row that prints none, K. */
const ASSUMED_TEMPERATURE = 298.15;
/** Standard uncertainty of an unpublished entropy difference, kcal/(mol K): 1 cal/(mol K). */
const UNKNOWN_ENTROPY = 1e-3;
/** Extra standard uncertainty, kcal/mol, when the only row is for another class of medium. */
const OTHER_MEDIUM = 0.2;

/**
 * A register row as a parameter of the model.
 *
 *   G(T) = G(T₀) − ΔS·(T − T₀),   u² = u(G)² + (u(ΔS)·(T − T₀))² + u(medium)²
 *
 * T₀ is the row's own temperature. Where no entropy is published ΔS is taken as 0 ± 1 cal/(mol K), so that a
 * value carried far from the temperature it was measured at grows less certain.
 */
export function rowParameter(match: RowMatch): Parameter {
  const { row } = match;
  const reference = row.temperature_K ?? ASSUMED_TEMPERATURE;
  const slope = (row.entropy?.value ?? 0) / 1000;
  const slopeU = row.entropy === undefined ? UNKNOWN_ENTROPY : row.entropy.u / 1000;
  const mediumU = match.match === "nearest medium" ? OTHER_MEDIUM : 0;
  return {
    id: row.id,
    at: (temperature) => ({
      value: fromKilocalorie(row.value - slope * (temperature - reference)),
      u: fromKilocalorie(Math.hypot(row.u, slopeU * (temperature - reference), mediumU)),
    }),
    basis: "published",
    standing: row.standing,
    sources: row.sources,
    medium: row.solvent,
    temperature_K: row.temperature_K ?? null,
    note: joinNotes(row, match),
  };
}

function joinNotes(row: RegisterRow, match: RowMatch): string | null {
  const medium =
    match.match === "nearest medium"
      ? `No value for this medium; the nearest is used with ${OTHER_MEDIUM} kcal/mol added to its uncertainty.`
      : null;
  return [medium, row.note].filter((note) => note != null).join(" ") || null;
}
