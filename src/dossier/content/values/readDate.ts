import { describeFound } from "./describeFound.ts";
import { quote } from "./quote.ts";
import { problem, type Reading } from "./Reading.ts";

const DAYS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

/** A calendar day as `2026-11-20` (ISO 8601); days that do not exist are refused. */
export function readDate(found: unknown): Reading<string> {
  const form = "A date is written year-month-day with four, two and two digits, such as 2026-11-20.";
  if (typeof found !== "string") return problem("bad-date", `Here stands ${describeFound(found)}. ${form}`);
  const match = /^(\d{4})-(\d{2})-(\d{2})$/.exec(found.trim());
  if (match === null) return problem("bad-date", `${quote(found)} is not a date. ${form}`);
  const [year, month, day] = match.slice(1).map(Number) as [number, number, number];
  const leap = year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);
  const days = month === 2 && leap ? 29 : (DAYS[month - 1] ?? 0);
  if (day < 1 || day > days)
    return problem("bad-date", `${quote(found)} is not a day of the calendar. ${form}`);
  return { value: match[0] };
}
