import { compareLists } from "./nameRing.ts";

/** What the numbering rules look at, for each ring atom that carries a group. */
export interface NumberedGroup {
  readonly ringAtom: number;
  /** Prefix of the group's name, for alphabetical order. */
  readonly prefix: string;
  /** Rank of a characteristic group that a name would end in: 1 is the most senior; 0 when there is none. */
  readonly seniority: number;
}

/** Classes of groups that a ring's name can end in, most senior first (IUPAC P-41, those that occur here). */
const SENIORITY: readonly string[] = [
  "carboxylate",
  "ester",
  "carboxamide",
  "cyano",
  "acyl",
  "hydroxyl",
  "thiol",
  "amino",
];

/** Rank of a group class as the suffix of a ring's name, 1 the most senior, 0 for none. */
export function seniorityOf(groupClass: string): number {
  return SENIORITY.indexOf(groupClass) + 1;
}

/**
 * Picks one numbering among those the parent's name allows: lowest locants to the most senior suffix group,
 * then to all groups together, then in alphabetical order of prefixes, then to R before S centres
 * (IUPAC P-31.1.4), then the walk that leaves the earliest atom of the input towards the earlier neighbour.
 * @param numberings - atoms at locants 1 to 6, one list per numbering; at least one.
 * @param descriptors - CIP descriptor by atom.
 */
export function chooseNumbering(
  numberings: readonly (readonly number[])[],
  groups: readonly NumberedGroup[],
  descriptors: ReadonlyMap<number, string>,
): readonly number[] {
  const ranks = groups.map((group) => group.seniority).filter((rank) => rank > 0);
  const senior = ranks.length > 0 ? Math.min(...ranks) : 0;
  const alphabetical = [...groups].sort((a, b) => {
    const [x, y] = [lettersOf(a.prefix), lettersOf(b.prefix)];
    return x < y ? -1 : x > y ? 1 : 0;
  });
  const score = (numbering: readonly number[]): readonly number[] => {
    const locant = (atom: number) => numbering.indexOf(atom) + 1;
    const sorted = (list: readonly number[]) => [...list].sort((a, b) => a - b);
    const suffix = sorted(
      groups.filter((g) => senior > 0 && g.seniority === senior).map((g) => locant(g.ringAtom)),
    );
    const all = sorted(groups.map((group) => locant(group.ringAtom)));
    // Equal prefixes share their locants in rising order, so that their own order in the input is irrelevant.
    const prefixes = [...new Set(alphabetical.map((group) => group.prefix))].flatMap((prefix) =>
      sorted(alphabetical.filter((group) => group.prefix === prefix).map((group) => locant(group.ringAtom))),
    );
    const senses = numbering.map((atom) => {
      const descriptor = descriptors.get(atom);
      return descriptor === "R" || descriptor === "r" ? 0 : descriptor === undefined ? 1 : 2;
    });
    return [...suffix, ...all, ...prefixes, ...senses, ...fromLowestAtom(numbering)];
  };
  return [...numberings].sort((a, b) => compareLists(score(a), score(b)))[0]!;
}

/** What counts for alphabetical order (IUPAC P-14.5): letters only, without structural prefixes such as tert. */
function lettersOf(prefix: string): string {
  return prefix
    .replace(/\b(?:tert|sec)-/g, "")
    .replace(/[^A-Za-z]/g, "")
    .toLowerCase();
}

/** The same walk around the ring, begun at its lowest atom. */
function fromLowestAtom(numbering: readonly number[]): readonly number[] {
  const start = numbering.indexOf(Math.min(...numbering));
  return numbering.map((_, step) => numbering[(start + step) % numbering.length]!);
}
