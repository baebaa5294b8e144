import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import { nearestWord } from "../../diagnostics/nearestWord.ts";
import { compareLocants } from "../compareLocants.ts";
import type { CompoundInput } from "../content/CompoundInput.ts";
import type { ClaimFacts } from "./ClaimFacts.ts";
import { checkDescriptors } from "./checkDescriptors.ts";
import { readConfigurationClaim, type StatedRelation } from "./readConfigurationClaim.ts";

/**
 * A claimed configuration that the structure contradicts is an error, item by item. Free text and what the structure
 * leaves open are recorded as written.
 */
export function checkClaim(
  input: Pick<CompoundInput, "claim" | "place">,
  facts: ClaimFacts,
): readonly Diagnostic[] {
  const text = input.claim?.configuration ?? null;
  const claim = text === null ? null : readConfigurationClaim(text);
  if (claim === null) return [];
  const problems =
    claim.kind === "relations"
      ? claim.relations.flatMap((stated) => checkRelation(stated, facts))
      : checkDescriptors(claim.descriptors, claim.relative, facts);
  return problems.map(({ message, suggestion, start }) => ({
    code: "claim-contradicts-structure",
    severity: "error",
    place:
      start === undefined
        ? input.place(["claim", "configuration"])
        : input.place(["claim", "configuration"], start),
    message,
    ...(suggestion === undefined ? {} : { suggestion }),
  }));
}

interface Problem {
  readonly message: string;
  readonly suggestion?: string | undefined;
  readonly start?: number;
}

/** A bare cis or trans is compared where one pair of groups or one fusion is all there is. */
function checkRelation({ locants, relation }: StatedRelation, facts: ClaimFacts): readonly Problem[] {
  const pairs = [
    ...facts.rings.flatMap((ring) => ring.configuration),
    ...facts.systems.flatMap((system) => system.fusions),
  ];
  const open = facts.identity.stereocentres.filter(({ descriptor }) => descriptor === "unspecified");
  if (locants === null) {
    if (pairs.length !== 1 || open.length > 0 || pairs[0]!.relation === relation) return [];
    const where = [...pairs[0]!.locants].sort(compareLocants).join(" and ");
    return [
      {
        message: `The claim says ${relation}, but the groups at ${where} of the structure are ${pairs[0]!.relation}.`,
        suggestion: pairs[0]!.relation,
      },
    ];
  }
  if (locants.some((locant) => open.some((centre) => centre.locant === locant))) return [];
  const written = (pair: readonly string[]) => [...pair].sort(compareLocants).join(",");
  const found = pairs.find((pair) => written(pair.locants) === written(locants));
  if (found === undefined) {
    if (pairs.length === 0 && open.length > 0) return [];
    const known = pairs.map((pair) => `${pair.relation}-${written(pair.locants)}`);
    return [
      {
        message: `The claim says ${relation}-${locants.join(",")}, but the structure has no such pair of groups; ${known.length === 0 ? "it has none that is cis or trans" : `it has ${known.join(", ")}`}.`,
        suggestion: nearestWord(`${relation}-${written(locants)}`, known),
      },
    ];
  }
  if (found.relation === relation) return [];
  return [
    {
      message: `The claim says ${relation} at ${locants.join(" and ")}, but the groups there are ${found.relation} in the structure.`,
      suggestion: `${found.relation}-${locants.join(",")}`,
    },
  ];
}
