import { describeFound } from "./describeFound.ts";
import { problem, type Reading } from "./Reading.ts";

/** A text value; a number or a truth word is refused with the quotation marks that make it text. */
export function readText(found: unknown): Reading<string> {
  if (typeof found === "string") {
    return found.trim() === ""
      ? problem("wrong-type", "The text is empty; a text is needed here.")
      : { value: found.trim() };
  }
  if (typeof found === "number" || typeof found === "boolean") {
    return problem(
      "wrong-type",
      `Here stands ${describeFound(found)}; a text is needed, in quotation marks.`,
      {
        suggestion: `'${found}'`,
      },
    );
  }
  return problem("wrong-type", `Here stands ${describeFound(found)}; a text is needed.`);
}
