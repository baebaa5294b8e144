import type { Identity, StereoisomerCount, StereoisomerSummary } from "./Dossier.ts";

const WORDS = "no one two three four five six seven eight nine ten eleven twelve".split(" ");

/**
 * How many stereoisomers the constitution of a compound has, how they are related to it, and what a claim has to state to
 * single it out: whole sentences.
 */
export function stereoisomerSentences(facts: {
  readonly identity: Pick<Identity, "chirality">;
  readonly stereoisomers: readonly StereoisomerSummary[];
  readonly stereoisomerCount: StereoisomerCount;
}): readonly string[] {
  const { distinct, upTo } = facts.stereoisomerCount;
  if (distinct === null)
    return [`The constitution has at most ${upTo} stereoisomers; they are too many to list.`];
  if (distinct === 1)
    return ["The constitution has one stereoisomer only: nothing in it needs a configuration."];
  const list = facts.stereoisomers;
  if (list.length === 0)
    return [`The constitution has ${distinct} stereoisomers; they are too many to list.`];

  const of = (relation: StereoisomerSummary["relation"]) =>
    list.filter((entry) => entry.relation === relation);
  const [same, mirror, others] = [of("same"), of("enantiomer"), of("diastereomer")];
  const head = `${capital(count(list.length))} stereoisomers share this constitution`;
  const alike = new Set(list.map(({ canonicalSmiles }) => canonicalSmiles)).size < list.length;
  const axis = alike
    ? ["Some of them differ only in the sense of an axis, which neither the SMILES nor the InChI records."]
    : [];
  if (same.length === list.length)
    return [`${head}, and the structure as written may stand for any of them.`, ...axis];
  const own = same[0]?.chirality;
  const single = same.length === 1;
  const parts = [
    single
      ? {
          chiral: "this one",
          meso: "this one (meso, its own mirror image)",
          achiral: "this one (its own mirror image)",
        }[own!]
      : `${count(same.length)} that the structure as written may stand for`,
    ...(mirror.length === 0
      ? []
      : [
          single
            ? "its enantiomer"
            : `${count(mirror.length)} mirror image${mirror.length === 1 ? "" : "s"} of those`,
        ]),
    ...(others.length === 0
      ? []
      : [`${count(others.length)} diastereomer${others.length === 1 ? "" : "s"} (${kinds(others)})`]),
  ];
  const claim = single ? [claimSentence(own === "chiral", others.length > 0, list)] : [];
  return [`${head}: ${join(parts)}.`, ...claim, ...axis];
}

/** What singles the compound out: nothing less than an absolute configuration, where it has an enantiomer. */
function claimSentence(
  chiral: boolean,
  diastereomers: boolean,
  list: readonly StereoisomerSummary[],
): string {
  const [centres, bonds] = [/[RSrs]/, /[EZ]/].map((label) =>
    list.some(({ descriptors }) => label.test(descriptors)),
  );
  const relative = !bonds
    ? "A relative configuration"
    : centres
      ? "A relative configuration with E or Z"
      : "E or Z";
  if (!chiral) return `${relative} singles this one out.`;
  return diastereomers
    ? `${relative} singles out this one and its enantiomer; only an absolute configuration tells the two apart.`
    : "Only an absolute configuration tells the two apart.";
}

/** Pairs of enantiomers, meso forms and achiral ones without R or S. */
function kinds(entries: readonly StereoisomerSummary[]): string {
  const of = (chirality: StereoisomerSummary["chirality"]) =>
    entries.filter((entry) => entry.chirality === chirality).length;
  for (const word of ["meso", "achiral"] as const) {
    if (of(word) === entries.length)
      return entries.length === 1 ? word : `${entries.length === 2 ? "both" : "all"} ${word}`;
  }
  const pairs = of("chiral") / 2;
  return join([
    ...(pairs > 0 ? [`${count(pairs)} pair${pairs === 1 ? "" : "s"} of enantiomers`] : []),
    ...(of("meso") > 0 ? [`${count(of("meso"))} meso`] : []),
    ...(of("achiral") > 0 ? [`${count(of("achiral"))} achiral`] : []),
  ]);
}

function count(number: number): string {
  return WORDS[number] ?? `${number}`;
}

function capital(text: string): string {
  return text[0]!.toUpperCase() + text.slice(1);
}

function join(parts: readonly string[]): string {
  return parts.length < 3 ? parts.join(" and ") : `${parts.slice(0, -1).join(", ")}, and ${parts.at(-1)}`;
}
