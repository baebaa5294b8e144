import { chooseRow } from "./chooseRow.ts";
import { equivalentLocants } from "./equivalentLocants.ts";
import type { MediumClass, Register } from "./Register.ts";
import type { RowMatch } from "./RowMatch.ts";

/**
 * The row for one group at one position of a ring: of the ring with its variant, else of the bare parent. Another
 * ring is never tried here; the caller decides what stands in.
 */
export function axialRow(
  register: Register,
  query: {
    readonly ring: string;
    readonly locant: number;
    readonly group: string;
    readonly solvent: string | null;
    readonly medium: MediumClass;
  },
): RowMatch | undefined {
  const parent = query.ring.split("/")[0]!;
  const locants = equivalentLocants(register, parent, query.locant);
  for (const ring of new Set([query.ring, parent])) {
    const rows = register.rows.filter(
      (row) =>
        (row.kind === "axial group" || row.kind === "anomeric") &&
        row.ring === ring &&
        row.groups[0] === query.group &&
        locants.includes(row.locants[0]!),
    );
    const match = chooseRow(rows, query.solvent, query.medium);
    if (match !== undefined) return match;
  }
  return undefined;
}
