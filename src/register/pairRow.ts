import { best } from "./axialRow.ts";
import type { MediumClass, Register } from "./Register.ts";
import type { RowMatch } from "./RowMatch.ts";
export function pairRow(register: Register, kind: string, q: { ring: string; locants: readonly number[]; groups: readonly [string, string] | readonly string[]; solvent: string | null; medium: MediumClass }): (RowMatch & { reversed: boolean }) | undefined {
  const [a, b] = q.groups;
  const rows = register.rows.filter((r) => r.kind === kind && ((r.groups[0] === a && r.groups[1] === b) || (r.groups[0] === b && r.groups[1] === a)));
  const m = best(rows, q.solvent, q.medium);
  return m && { ...m, reversed: m.row.groups[0] !== a };
}
