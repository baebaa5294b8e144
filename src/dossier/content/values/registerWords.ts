import type { Group, Register, RingParent, Solvent } from "../../../register/Register.ts";
import { quote } from "./quote.ts";
import { problem, type Reading } from "./Reading.ts";
import { readText } from "./readText.ts";
import { suggest } from "./suggest.ts";

/** Readers of the words that the register defines. */
export interface RegisterWords {
  readonly group: (found: unknown) => Reading<Group | "H">;
  readonly ring: (found: unknown) => Reading<RingParent>;
  readonly solvent: (found: unknown) => Reading<Solvent>;
  /** Every spelling, for editors. */
  readonly spellings: {
    readonly group: readonly string[];
    readonly ring: readonly string[];
    readonly solvent: readonly string[];
  };
}

/**
 * Group abbreviations are matched exactly, because case distinguishes groups; ring and solvent
 * names are matched without regard to case.
 */
export function registerWords(register: Register): RegisterWords {
  const groups = new Map<string, Group | "H">([["H", "H"]]);
  for (const group of register.groups) groups.set(group.key, group);
  for (const group of register.groups) {
    for (const spelling of [...group.aliases, group.prefix])
      if (!groups.has(spelling)) groups.set(spelling, group);
  }
  const folded = <T extends { aliases: readonly string[] }>(
    entries: readonly T[],
    name: (entry: T) => string,
  ) => {
    const words = new Map<string, T>();
    for (const entry of entries) words.set(name(entry).toLowerCase(), entry);
    for (const entry of entries) {
      for (const alias of entry.aliases)
        if (!words.has(alias.toLowerCase())) words.set(alias.toLowerCase(), entry);
    }
    return words;
  };
  const rings = folded(register.parents, (parent) => parent.name);
  const solvents = folded(register.solvents, (solvent) => solvent.key);
  const spell = <T extends { aliases: readonly string[] }>(
    entries: readonly T[],
    name: (entry: T) => string,
  ) => [...new Set(entries.flatMap((entry) => [name(entry), ...entry.aliases]))];
  const spellings = {
    group: [...groups.keys()],
    ring: spell(register.parents, (parent) => parent.name),
    solvent: spell(register.solvents, (solvent) => solvent.key),
  };

  return {
    spellings,
    group: (found) =>
      look(
        found,
        "unknown-group",
        (word) => groups.get(word),
        spellings.group,
        (word) =>
          `${quote(word)} is not a group of the register, which names ${register.groups.length} by their usual abbreviation; ` +
          "the site's register page lists them. A group it lacks can be written as SMILES of the whole compound.",
      ),
    ring: (found) =>
      look(
        found,
        "unknown-ring",
        (word) => rings.get(word.toLowerCase()),
        spellings.ring,
        (word) =>
          `${quote(word)} is not a parent ring. The register has ${list(register.parents.map(({ name }) => name))}.`,
      ),
    solvent: (found) =>
      look(
        found,
        "unknown-solvent",
        (word) => solvents.get(word.toLowerCase()),
        spellings.solvent,
        (word) =>
          `${quote(word)} is not a solvent of the register, which has ${list(register.solvents.map(({ key }) => key))}.`,
      ),
  };
}

function look<T>(
  found: unknown,
  code: string,
  get: (word: string) => T | undefined,
  spellings: readonly string[],
  message: (word: string) => string,
): Reading<T> {
  const text = readText(found);
  if ("problem" in text) return text;
  const value = get(text.value);
  return value === undefined ? problem(code, message(text.value), suggest(text.value, spellings)) : { value };
}

/** Names the words of a list; a long one is cut, because a message is not a catalogue. */
function list(words: readonly string[]): string {
  const MOST = 24;
  return words.length <= MOST
    ? words.join(", ")
    : `${words.slice(0, MOST).join(", ")} and ${words.length - MOST} more`;
}
