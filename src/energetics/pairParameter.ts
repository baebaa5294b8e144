import { pairRow } from "../register/pairRow.ts";
import type { AnalysedRing, Substituent } from "../structure/StructureAnalysis.ts";
import type { EnergyContext } from "./EnergyContext.ts";
import type { Parameter } from "./Parameter.ts";
import { rowParameter } from "./rowParameter.ts";
import { nameOf, similarGroups } from "./siteGroup.ts";
import { borrowed } from "./standIn.ts";

/** Standard uncertainty of a value borrowed from a similar pair, kcal/mol, for each group that differs. */
const LOAN = 0.25;

export interface PairParameter {
  readonly parameter: Parameter;
  /** For geminal pairs: the row lists the second group first. */
  readonly reversed: boolean;
}

/**
 * The register's value for a pair of groups, or (not for geminal pairs) that of a pair of the same classes, widened.
 * @returns undefined when neither exists; the caller then states its own stand-in.
 */
export function pairParameter(
  context: EnergyContext,
  kind: "vicinal gauche" | "syn-axial" | "geminal",
  ring: AnalysedRing,
  pair: readonly [Substituent, Substituent],
): PairParameter | undefined {
  const locants = pair.map((group) => ring.locants[ring.atoms.indexOf(group.ringAtom)]!);
  const lookup = (first: string, second: string) =>
    pairRow(context.register, kind, { ...context, ring: ring.ringKey, locants, groups: [first, second] });
  const [first, second] = [pair[0].group?.key, pair[1].group?.key];
  if (first !== undefined && second !== undefined) {
    const own = lookup(first, second);
    if (own !== undefined) return { parameter: rowParameter(own), reversed: own.reversed };
  }
  // How two groups on one atom make room for each other is too particular to be borrowed.
  if (kind === "geminal") return undefined;
  const firsts = [...(first === undefined ? [] : [first]), ...similarGroups(context.register, pair[0])];
  const seconds = [...(second === undefined ? [] : [second]), ...similarGroups(context.register, pair[1])];
  // Loans that change one group only come before loans that change both.
  const candidates = firsts
    .flatMap((a, i) =>
      seconds.map((b, j) => ({ a, b, changed: Number(a !== first) + Number(b !== second), order: i + j })),
    )
    .sort((x, y) => x.changed - y.changed || x.order - y.order);
  for (const { a, b, changed } of candidates) {
    const match = lookup(a, b);
    if (match === undefined) continue;
    const names = [nameOf(pair[0]), nameOf(pair[1])].sort().join("+");
    const why = `No ${kind} value for ${names.replace("+", "/")}; that of ${a}/${b}, groups of the same classes, stands in.`;
    const id = `stand-in/${kind}/${names}`;
    return { parameter: borrowed(rowParameter(match), id, LOAN * changed, why), reversed: match.reversed };
  }
  return undefined;
}
