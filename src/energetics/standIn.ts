import { fromKilocalorie } from "../quantity/units.ts";
import type { Parameter } from "./Parameter.ts";

/** Temperature about which a stand-in's uncertainty grows, K. */
const REFERENCE_TEMPERATURE = 298.15;
/** Standard uncertainty of an unknown entropy difference, kcal/(mol K). */
const UNKNOWN_ENTROPY = 1e-3;

/**
 * A value the register does not have: shown as `not available`, with a wide uncertainty.
 * @param id - name under which all uses of it move together.
 * @param value - best guess, kcal/mol.
 * @param u - standard uncertainty, kcal/mol, above zero.
 * @param why - one sentence for the reader: what is missing and what stands in.
 */
export function standIn(id: string, value: number, u: number, why: string): Parameter {
  if (!(u > 0)) throw new RangeError(`a stand-in needs an uncertainty above zero, got ${u}`);
  return {
    id,
    at: (temperature) => ({
      value: fromKilocalorie(value),
      u: fromKilocalorie(Math.hypot(u, UNKNOWN_ENTROPY * (temperature - REFERENCE_TEMPERATURE))),
    }),
    basis: "not available",
    standing: null,
    sources: [],
    medium: "not stated",
    temperature_K: null,
    note: why,
  };
}

/**
 * A published value borrowed from a similar group: kept in value, widened, and shown as `not available`.
 * @param of - the parameter that is borrowed.
 * @param id - name under which all uses of the loan move together.
 * @param extra - standard uncertainty of the loan, kcal/mol.
 * @param why - one sentence for the reader.
 */
export function borrowed(of: Parameter, id: string, extra: number, why: string): Parameter {
  return {
    ...of,
    id,
    at: (temperature) => {
      const { value, u } = of.at(temperature);
      return { value, u: Math.hypot(u, fromKilocalorie(extra)) };
    },
    basis: "not available",
    standing: null,
    note: [why, of.note].filter((note) => note !== null).join(" "),
  };
}

/**
 * An energy difference worked out by molecular mechanics.
 * @param id - name under which all uses of it move together.
 * @param value - kcal/mol.
 * @param u - standard uncertainty, kcal/mol, above zero.
 * @param method - the force field, printed as the medium: an isolated molecule.
 * @param why - one sentence for the reader.
 */
export function computedParameter(
  id: string,
  value: number,
  u: number,
  method: string,
  why: string,
): Parameter {
  return { ...standIn(id, value, u, why), basis: "computed", medium: `isolated molecule, ${method}` };
}
