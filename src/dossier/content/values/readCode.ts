import { quote } from "./quote.ts";
import { problem, type Reading } from "./Reading.ts";
import { readText } from "./readText.ts";

/** A code is printed in file names and addresses, so it keeps to characters that are safe in both. */
const SAFE = /^[A-Za-z0-9](?:[A-Za-z0-9._-]*[A-Za-z0-9])?$/;
const LONGEST = 40;

/** A compound code: letters, digits, hyphens, dots and underscores, a letter or digit at either end. */
export function readCode(found: unknown): Reading<string> {
  const text = readText(found);
  if ("problem" in text) return text;
  if (SAFE.test(text.value) && text.value.length <= LONGEST) return text;
  const mended = text.value
    .normalize("NFKD")
    .replace(/\p{M}/gu, "")
    .replace(/[^A-Za-z0-9._-]+/g, "-")
    .replace(/^[^A-Za-z0-9]+|[^A-Za-z0-9]+$/g, "")
    .slice(0, LONGEST);
  return problem(
    "unsafe-code",
    `${quote(text.value)} is not a safe code. A code has at most ${LONGEST} letters, digits, hyphens, dots and ` +
      "underscores, and begins and ends with a letter or digit.",
    SAFE.test(mended) ? { suggestion: mended } : {},
  );
}
