import { best } from "./axialRow.ts";
import type { MediumClass, Register } from "./Register.ts";
import type { RowMatch } from "./RowMatch.ts";
export function nitrogenRow(register: Register, q: { ring: string; locant: number; group: string; solvent: string | null; medium: MediumClass }): RowMatch | undefined {
  const bare = q.ring.split("/")[0]!;
  return best(register.rows.filter((r) => r.kind === "nitrogen substituent" && r.ring.split("/")[0] === bare && r.groups[0] === q.group), q.solvent, q.medium);
}
