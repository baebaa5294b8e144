import { chooseRow } from "./chooseRow.ts";
import type { MediumClass, Register } from "./Register.ts";
import type { RowMatch } from "./RowMatch.ts";

/** The row for a group on an inverting nitrogen: of the ring with its variant, else of any state of the parent. */
export function nitrogenRow(
  register: Register,
  query: {
    readonly ring: string;
    readonly group: string;
    readonly solvent: string | null;
    readonly medium: MediumClass;
  },
): RowMatch | undefined {
  const parent = query.ring.split("/")[0]!;
  const rows = register.rows.filter(
    (row) =>
      row.kind === "nitrogen substituent" &&
      row.groups[0] === query.group &&
      row.ring.split("/")[0] === parent,
  );
  const exact = rows.filter((row) => row.ring === query.ring);
  return chooseRow(exact.length > 0 ? exact : rows, query.solvent, query.medium);
}
