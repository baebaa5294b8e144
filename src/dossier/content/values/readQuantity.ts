import { describeFound } from "./describeFound.ts";
import { quote } from "./quote.ts";
import { problem, type Reading } from "./Reading.ts";
import { suggest } from "./suggest.ts";

/** A number with its unit: the value for computing, the text as the author gave it for print. */
export interface WrittenQuantity {
  readonly value: number;
  /** The unit in its standard spelling. */
  readonly unit: string;
  /** The number as written, with a true minus sign. */
  readonly text: string;
}

/** What a quantity may look like. */
export interface QuantityKind {
  /** Diagnostic code of every mistake in it. */
  readonly code: string;
  /** With its article, as in `a coupling`. */
  readonly name: string;
  /** Spellings and the standard unit of each, the usual one first. */
  readonly units: Readonly<Record<string, string>>;
  readonly example: string;
  /** Smallest and largest sensible value, in the standard unit given. */
  readonly range?: { readonly from: number; readonly to: number };
}

const FORM = /^([+\-−–]?)\s*(\d+(?:\.\d+)?|\.\d+)\s*(\S.*)?$/;

/** Reads `10.9 Hz`, `97 %`, `−3 °C`. A number without its unit is refused: nothing is guessed. */
export function readQuantity(found: unknown, kind: QuantityKind): Reading<WrittenQuantity> {
  const spellings = Object.keys(kind.units);
  const allowed = `${sentence(kind.name)} is a number with its unit (${[...new Set(Object.values(kind.units))].join(" or ")}), such as ${kind.example}`;
  if (typeof found === "number") {
    return problem(kind.code, `The number ${found} has no unit. ${allowed}.`, {
      suggestion: `${found} ${spellings[0]}`,
    });
  }
  if (typeof found !== "string")
    return problem(kind.code, `Here stands ${describeFound(found)}. ${allowed}.`);
  const written = found.trim();
  const match = FORM.exec(written);
  if (match === null) {
    const comma = /^[+\-−–]?\s*\d+,\d+/.test(written);
    return comma
      ? problem(kind.code, `${quote(written)} has a decimal comma; write a point. ${allowed}.`, {
          suggestion: written.replace(",", "."),
        })
      : problem(kind.code, `${quote(written)} is not a quantity. ${allowed}.`);
  }
  const [, sign = "", digits = "", unitFound] = match;
  if (unitFound === undefined) {
    return problem(kind.code, `${quote(written)} has no unit. ${allowed}.`, {
      suggestion: `${written} ${spellings[0]}`,
    });
  }
  const spelling = spellings.find((candidate) => candidate === unitFound);
  if (spelling === undefined) {
    const nearest = suggest(unitFound, spellings).suggestion;
    return problem(
      kind.code,
      `${quote(unitFound)} is not a unit of ${kind.name}. ${allowed}.`,
      nearest === undefined ? {} : { suggestion: `${sign}${digits} ${nearest}` },
    );
  }
  const negative = sign !== "" && sign !== "+";
  const value = negative ? -Number(digits) : Number(digits);
  if (kind.range !== undefined && (value < kind.range.from || value > kind.range.to)) {
    return problem(
      kind.code,
      `${quote(written)} lies outside the sensible range of ${kind.name}, ${kind.range.from} to ${kind.range.to} ${kind.units[spelling]}.`,
    );
  }
  return { value: { value, unit: kind.units[spelling]!, text: `${negative ? "\u2212" : ""}${digits}` } };
}

const sentence = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);
