import type { QuantityKind } from "./readQuantity.ts";

const HERTZ = { Hz: "Hz" };
const PERCENT = { "%": "%", percent: "%" };

/** Quantities that evidence states, with the units each may have. */
export const QUANTITY_KINDS = {
  coupling: {
    code: "bad-quantity",
    name: "a coupling constant",
    units: HERTZ,
    example: "10.9 Hz",
    range: { from: -50, to: 500 },
  },
  couplingUncertainty: {
    code: "bad-quantity",
    name: "an uncertainty of a coupling constant",
    units: HERTZ,
    example: "0.3 Hz",
    range: { from: 0, to: 100 },
  },
  population: {
    code: "bad-quantity",
    name: "a population",
    units: PERCENT,
    example: "97 %",
    range: { from: 0, to: 100 },
  },
  populationUncertainty: {
    code: "bad-quantity",
    name: "an uncertainty of a population",
    units: PERCENT,
    example: "1 %",
    range: { from: 0, to: 100 },
  },
  separation: {
    code: "bad-quantity",
    name: "a separation of two signals",
    units: { ...HERTZ, ppm: "ppm" },
    example: "96 Hz",
    range: { from: 0, to: 1e6 },
  },
  temperatureUncertainty: {
    code: "bad-quantity",
    name: "an uncertainty of a temperature",
    units: { K: "K" },
    example: "2 K",
    range: { from: 0, to: 100 },
  },
} as const satisfies Record<string, QuantityKind>;
