/** One stated descriptor: `2S`, `4aR`, `E`. */
export interface StatedDescriptor {
  /** As printed in dossiers, primes as ′; null where none is stated. */
  readonly locant: string | null;
  readonly descriptor: "R" | "S" | "r" | "s" | "E" | "Z";
  /** Where it stands in the claim, from 0. */
  readonly start: number;
}

/** One stated relation: `cis`, `trans-1,3`. */
export interface StatedRelation {
  readonly locants: readonly [string, string] | null;
  readonly relation: "cis" | "trans";
}

/** A configuration that can be compared with a structure. */
export type ConfigurationClaim =
  | { readonly kind: "relations"; readonly relations: readonly StatedRelation[] }
  | {
      readonly kind: "descriptors";
      readonly descriptors: readonly StatedDescriptor[];
      /** True for rel- and rac- and their starred and doubled forms, where the mirror image fits as well. */
      readonly relative: boolean;
    };

/**
 * Reads a claimed configuration: `cis`, `trans-1,3`, `r-1,c-2,t-4`, `(1R,2S)`, `2R,4aS,8aR`, `rel-(1R,2S)`, `rac-(1R,2S)`,
 * `1R*,2S*`, `1RS,2SR`. Anything else is free text and gives null.
 */
export function readConfigurationClaim(text: string): ConfigurationClaim | null {
  return readRelations(text) ?? readDescriptors(text);
}

function readRelations(text: string): ConfigurationClaim | null {
  const locant = "\\d+[a-h]?['′]*";
  const pair = new RegExp(`^(cis|trans)(?:-(${locant}),\\s*(${locant}))?$`);
  const parts = text.trim().split(/\s*;\s*/);
  const relations = parts.flatMap((part): StatedRelation[] => {
    const found = pair.exec(part);
    if (found !== null) {
      const relation = found[1] as "cis" | "trans";
      const [a, b] = [found[2], found[3]];
      return [{ locants: a === undefined || b === undefined ? null : [prime(a), prime(b)], relation }];
    }
    const [first, ...others] = part.split(/,\s*/).map((word) => /^([rct])-(\d+[a-h]?['′]*)$/.exec(word));
    if (first?.[1] !== "r" || others.length === 0 || others.some((word) => word === null || word[1] === "r"))
      return [];
    return others.map((word) => ({
      locants: [prime(first[2]!), prime(word![2]!)] as const,
      relation: word![1] === "c" ? ("cis" as const) : ("trans" as const),
    }));
  });
  const understood = parts.every((part) => pair.test(part) || /^r-/.test(part));
  return understood && relations.length >= parts.length ? { kind: "relations", relations } : null;
}

function readDescriptors(text: string): ConfigurationClaim | null {
  const outer = /^(\s*(?:(rel|rac)-)?)(\(?)([^()]*)(\)?)\s*$/.exec(text);
  if (outer === null || (outer[3] === "(") !== (outer[5] === ")")) return null;
  const [, lead, prefix, open, list] = outer;
  let start = lead!.length + open!.length;
  let relative = prefix !== undefined;
  const descriptors: StatedDescriptor[] = [];
  for (const word of list!.split(",")) {
    const found = /^(\s*)(\d+[a-h]?)?(['′]*)(RS|SR|[RSrsEZ])(\*?)\s*$/.exec(word);
    if (found === null) return null;
    const [, space, number, primes, label, star] = found;
    if (number === undefined && primes !== "") return null;
    if (star === "*" || label!.length === 2) relative = true;
    descriptors.push({
      locant: number === undefined ? null : prime(`${number}${primes}`),
      descriptor: label![0] as StatedDescriptor["descriptor"],
      start: start + space!.length,
    });
    start += word.length + 1;
  }
  return { kind: "descriptors", descriptors, relative };
}

function prime(locant: string): string {
  return locant.replaceAll("'", "′");
}
