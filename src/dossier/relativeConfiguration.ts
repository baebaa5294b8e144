import { compareLocants } from "./compareLocants.ts";
import type { Ring, RingSystem } from "./Dossier.ts";

/**
 * The relative configuration of rings in words: `cis-1,3` for two groups on a ring, `r-1,c-2,t-4` for more (r the
 * group of reference, c and t the others against it; IUPAC 1974, rule E-2.3.3, from memory), `trans-4a,8a` for a fusion. Empty without any.
 */
export function relativeConfiguration(
  rings: readonly Pick<Ring, "configuration">[],
  systems: readonly Pick<RingSystem, "fusions">[],
): string {
  const groups = rings.flatMap(({ configuration }) => {
    const locants = [...new Set(configuration.flatMap((pair) => pair.locants))].sort(compareLocants);
    const [first, second, ...more] = locants;
    if (first === undefined || second === undefined) return [];
    const relation = (a: string, b: string) =>
      configuration.find((pair) => pair.locants.includes(a) && pair.locants.includes(b))?.relation;
    if (more.length === 0) return [`${relation(first, second)}-${first},${second}`];
    const others = locants
      .slice(1)
      .map((locant) => `${relation(first, locant) === "cis" ? "c" : "t"}-${locant}`);
    return [[`r-${first}`, ...others].join(",")];
  });
  const fusions = systems
    .flatMap((system) => system.fusions)
    .map(({ locants, relation }) => ({ relation, pair: [...locants].sort(compareLocants) }))
    .sort((a, b) => compareLocants(a.pair[0]!, b.pair[0]!))
    .map(({ relation, pair }) => `${relation}-${pair.join(",")}`);
  return [...groups, ...fusions].join("; ");
}
