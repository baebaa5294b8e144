import { chooseRow } from "./chooseRow.ts";
import { equivalentLocants } from "./equivalentLocants.ts";
import type { MediumClass, Register, RegisterRow } from "./Register.ts";
import type { RowMatch } from "./RowMatch.ts";

/** A pair's row; `reversed` when the row lists the two groups in the other order, which matters for geminal pairs. */
export type PairMatch = RowMatch & { readonly reversed: boolean };

/**
 * The row for a pair of groups: one for this ring and these positions, else the general one.
 * A ring-specific row is for its own two positions and those equivalent to them.
 */
export function pairRow(
  register: Register,
  kind: "vicinal gauche" | "syn-axial" | "geminal",
  query: {
    readonly ring: string;
    readonly locants: readonly number[];
    readonly groups: readonly [string, string];
    readonly solvent: string | null;
    readonly medium: MediumClass;
  },
): PairMatch | undefined {
  const [first, second] = query.groups;
  const parent = query.ring.split("/")[0]!;
  const rows = register.rows.filter(
    (row) =>
      row.kind === kind &&
      ((row.groups[0] === first && row.groups[1] === second) ||
        (row.groups[0] === second && row.groups[1] === first)),
  );
  const own = rows.filter(
    (row) => row.locants.length > 0 && row.ring === parent && standsAt(register, row, parent, query.locants),
  );
  const general = rows.filter((row) => row.locants.length === 0);
  const match = chooseRow(own.length > 0 ? own : general, query.solvent, query.medium);
  return match === undefined ? undefined : { ...match, reversed: match.row.groups[0] !== first };
}

function standsAt(register: Register, row: RegisterRow, parent: string, locants: readonly number[]): boolean {
  const lowest = (list: readonly number[]) =>
    list
      .map((locant) => equivalentLocants(register, parent, locant)[0]!)
      .sort((a, b) => a - b)
      .join();
  return lowest(row.locants) === lowest(locants);
}
