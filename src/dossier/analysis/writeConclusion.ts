import { formatEnergy } from "../../quantity/formatEnergy.ts";
import { formatPopulation } from "../../quantity/formatPopulation.ts";
import { formatTemperature } from "../../quantity/formatTemperature.ts";
import { nameMarkup } from "../../quantity/nameMarkup.ts";
import type { Alert, Conditions, Conformer, Equilibrium, MemberSummary, Ring } from "../Dossier.ts";

/** What the paragraph is written from. */
export interface ConclusionFacts {
  readonly name: string;
  readonly conditions: Conditions;
  readonly rings: readonly Ring[];
  readonly conformers: readonly Conformer[];
  readonly equilibria: readonly Equilibrium[];
  readonly relation: "identical" | "enantiomeric" | "diastereomeric" | null;
  readonly members: readonly MemberSummary[];
  readonly alerts: readonly Alert[];
}

/** The conclusion: one paragraph in plain sentences, label markup allowed, that changes with the data. */
export function writeConclusion(facts: ConclusionFacts): string {
  const stop = facts.alerts.find((alert) => alert.severity === "stop");
  if (facts.conformers.length === 0) {
    const members =
      facts.members.length > 0
        ? ` The ${facts.members.length} stereoisomers that the structure as written may stand for are listed with their own major conformers.`
        : "";
    return `No conformational conclusion is drawn for ${nameMarkup(facts.name)}. ${stop?.message ?? "Its configuration is open."}${members} Draft for qualified review.`;
  }
  return [...equilibriumSentences(facts), ...limitSentences(facts)].join(" ");
}

function equilibriumSentences(facts: ConclusionFacts): readonly string[] {
  const { conformers, equilibria, relation, conditions } = facts;
  const A = conformers[0]!;
  const where = conditionsPhrase(conditions);
  const share = (conformer: Conformer) => formatPopulation(conformer.population, conformer.population95);
  if (conformers.length === 2 && relation === "identical") {
    return [
      `${nameMarkup(facts.name)} exists as two superimposable chairs, with half of the molecules in each at any temperature; ring inversion exchanges equal forms.`,
    ];
  }
  if (conformers.length === 2 && relation === "enantiomeric") {
    return [
      `${nameMarkup(facts.name)} exists as two mirror-image chairs (${describe(A, facts.rings)} in either), equal in energy, with half of the molecules in each at any temperature.`,
      "Each chair is chiral; their exchange makes the substance achiral on the time average as long as ring inversion is fast.",
    ];
  }
  const next = equilibria.find((equilibrium) => !equilibrium.bySymmetry);
  const equals = equilibria.filter((equilibrium) => equilibrium.bySymmetry).map(({ to }) => to);
  const major =
    equals.length > 0
      ? `conformers A and ${equals.join(", ")}, equal by symmetry, hold ${share(A)} each (${describe(A, facts.rings)})`
      : `conformer A, ${A.label} (${describe(A, facts.rings)}), holds ${share(A)} of the molecules`;
  const unresolved = next?.unresolved === true;
  const sentences = [
    unresolved
      ? `${where} the major conformer of ${nameMarkup(facts.name)} is unresolved: ${major}, and the interval of the free-energy difference contains zero.`
      : `${where} ${nameMarkup(facts.name)} prefers one form: ${major}.`,
  ];
  if (next !== undefined) {
    const other = conformers.find((conformer) => conformer.id === next.to)!;
    sentences.push(
      `${conformers.length > 2 ? "The next conformer" : "The other chair"}, ${other.id} (${describe(other, facts.rings)}), lies ${formatEnergy(next.deltaG_kJ_mol, next.u_kJ_mol)} higher and holds ${share(other)}.`,
    );
  }
  if (conformers.length > 2) {
    const chairs = conformers.filter(({ rings }) => rings.every(({ form }) => form === "chair")).length;
    const kind = chairs === conformers.length ? "chair conformers" : "conformers";
    sentences.push(`${conformers.length} ${kind} are listed.`);
  }
  return sentences;
}

function limitSentences(facts: ConclusionFacts): readonly string[] {
  const bySymmetry = facts.equilibria.every((equilibrium) => equilibrium.bySymmetry);
  const gaps = facts.alerts.some((alert) => alert.code === "value-not-available");
  const nonChair = facts.alerts.some((alert) => alert.code === "non-chair-possible");
  const sentences: string[] = [];
  if (gaps)
    sentences.push("The register lacks a value that decides the result; a wide stand-in takes its place.");
  if (nonChair) sentences.push("A twist-boat may compete with the chairs listed.");
  if (facts.alerts.some((alert) => alert.code === "non-chair-forms"))
    sentences.push("Twist-boats are among them; their energies rest on mechanics and are rough.");
  sentences.push(
    bySymmetry
      ? "The equality follows from symmetry and rests on no measured value."
      : "These are estimates by additive free-energy increments with their 95 % intervals, not measurements.",
  );
  sentences.push("Draft for qualified review.");
  return sentences;
}

function conditionsPhrase(conditions: Conditions): string {
  const temperature = formatTemperature(conditions.temperature_K);
  return conditions.stated
    ? `In ${conditions.solventLabel} at ${temperature},`
    : `At ${temperature} in a medium like ${conditions.solventLabel} (none is stated),`;
}

/** Which groups are where, in words: `OH equatorial at C1, Me equatorial at C3`; forms other than chairs by name. */
function describe(conformer: Conformer, rings: readonly Ring[]): string {
  const odd = conformer.rings.filter(({ form }) => form === "twist-boat" || form === "boat");
  const forms = odd.map(({ ring, form }) => (rings.length > 1 ? `ring ${ring + 1} a ${form}` : `a ${form}`));
  const groups = groupsInWords(conformer, rings);
  const parts = [...forms, ...groups];
  return parts.length > 0
    ? parts.join(", ")
    : conformer.label === "unsubstituted"
      ? "no groups"
      : "ring bonds as labelled";
}

function groupsInWords(conformer: Conformer, rings: readonly Ring[]): readonly string[] {
  // An angular group has a place in each ring that holds it.
  const byGroup = new Map<number, Conformer["positions"][number][]>();
  for (const position of conformer.positions.filter(({ kind }) => kind === "group"))
    byGroup.set(position.substituent, [...(byGroup.get(position.substituent) ?? []), position]);
  const groups = [...byGroup.values()].map((places) => ({
    ...places[0]!,
    words: [
      ...new Set(places.map(({ pseudo, orientation }) => `${pseudo ? "pseudo" : ""}${orientation}`)),
    ].join("/"),
  }));
  const words = new Set(groups.map((group) => group.words));
  if (words.size === 1 && groups.length > 1) {
    const places = groups.map(
      ({ group, locant }) => `${group} at ${rings.length > 1 ? "position " : ""}${locant}`,
    );
    return [`${places.join(" and ")}, ${places.length > 2 ? "all" : "both"} ${[...words][0]}`];
  }
  return groups.map(({ group, words: where, locant }) => `${group} ${where} at ${locant}`);
}
