import { nearestWord } from "../../diagnostics/nearestWord.ts";
import { compareLocants } from "../compareLocants.ts";
import type { Stereocentre } from "../Dossier.ts";
import type { ClaimFacts } from "./ClaimFacts.ts";
import type { StatedDescriptor } from "./readConfigurationClaim.ts";

/** One disagreement between a claim and the structure. */
export interface DescriptorProblem {
  readonly message: string;
  readonly suggestion?: string | undefined;
  /** Character of the claim. */
  readonly start: number;
}

const MIRRORED: Readonly<Record<string, string>> = { R: "S", S: "R" };

/**
 * Compares stated descriptors with the centres at their locants. Of the numberings that symmetry makes equal, and for
 * a relative claim of the two mirror images, the one that fits best counts.
 * @param relative - true when the fully inverted set is as right as the given one.
 */
export function checkDescriptors(
  stated: readonly StatedDescriptor[],
  relative: boolean,
  facts: ClaimFacts,
): readonly DescriptorProblem[] {
  const centres = stated.filter(({ descriptor }) => descriptor !== "E" && descriptor !== "Z");
  const bonds = stated.filter(({ descriptor }) => descriptor === "E" || descriptor === "Z");
  const numberings =
    facts.equalNumberings.length > 0 ? facts.equalNumberings : [facts.identity.stereocentres];
  const trials = numberings.flatMap((numbering) =>
    (relative ? [false, true] : [false]).map((inverted) => compare(centres, numbering, relative, inverted)),
  );
  const best = trials.reduce((a, b) => (b.length < a.length ? b : a));
  return [...best, ...bonds.flatMap((bond) => compareBond(bond, facts))];
}

function compare(
  stated: readonly StatedDescriptor[],
  centres: readonly Stereocentre[],
  relative: boolean,
  inverted: boolean,
): readonly DescriptorProblem[] {
  const at = (locant: string | null) =>
    locant === null
      ? centres.length === 1
        ? centres[0]
        : undefined
      : centres.find((centre) => centre.locant === locant);
  // Side chains have no locants here: descriptors that may belong to them are recorded as written.
  const unplaced = stated.filter(({ locant }) => locant !== null && at(locant) === undefined);
  const free = centres.filter(({ locant }) => locant === null).length;
  const stray = unplaced.length > free ? unplaced : [];
  const wrong = stated.flatMap((item): DescriptorProblem[] => {
    const found = at(item.locant);
    if (found === undefined || found.descriptor === "unspecified") return [];
    const descriptor = inverted ? (MIRRORED[found.descriptor] ?? found.descriptor) : found.descriptor;
    if (descriptor === item.descriptor) return [];
    const name = item.locant === null ? "the only stereocentre" : `the centre at ${item.locant}`;
    const kind = descriptor === "r" || descriptor === "s" ? " (pseudoasymmetric)" : "";
    const rest = relative
      ? ` where the others are as claimed${inverted ? ", all taken in the mirror image" : ""}`
      : "";
    return [
      {
        message: `The claim says ${item.locant ?? ""}${item.descriptor}, but ${name} of the structure is ${descriptor}${kind}${rest}.`,
        suggestion: `${item.locant ?? ""}${descriptor}`,
        start: item.start,
      },
    ];
  });
  return [...stray.map((item) => noCentre(item, centres)), ...wrong].sort((a, b) => a.start - b.start);
}

function noCentre(item: StatedDescriptor, centres: readonly Stereocentre[]): DescriptorProblem {
  const known = centres
    .flatMap(({ locant, descriptor }) => (locant === null ? [] : [{ locant, descriptor }]))
    .sort((a, b) => compareLocants(a.locant, b.locant))
    .map(({ locant, descriptor }) => `${locant}${descriptor === "unspecified" ? "?" : descriptor}`);
  const list =
    known.length === 0
      ? "it has none with a locant"
      : `its centres are ${known.join(", ")}. Locants are those of the rings in this dossier; atom classes in the SMILES ([CH2:3]) change them`;
  return {
    message: `The claim says ${item.locant}${item.descriptor}, but the structure has no stereocentre at ${item.locant}; ${list}.`,
    suggestion: nearestWord(`${item.locant}${item.descriptor}`, known),
    start: item.start,
  };
}

/** The one double bond of a structure is compared whatever its locant; of several it is not known which is meant. */
function compareBond(item: StatedDescriptor, facts: ClaimFacts): readonly DescriptorProblem[] {
  const { stereobonds } = facts.identity;
  const stated = `${item.locant ?? ""}${item.descriptor}`;
  if (stereobonds.length === 0)
    return [
      { message: `The claim says ${stated}, but the structure has no E/Z double bond.`, start: item.start },
    ];
  const [found] = stereobonds;
  if (stereobonds.length > 1 || found!.descriptor === "unspecified" || found!.descriptor === item.descriptor)
    return [];
  return [
    {
      message: `The claim says ${stated}, but the double bond of the structure is ${found!.descriptor}.`,
      suggestion: `${item.locant ?? ""}${found!.descriptor}`,
      start: item.start,
    },
  ];
}
