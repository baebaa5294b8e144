import { MEDIUM_CLASSES, type MediumClass, type Register, type RegisterRow } from "./Register.ts";
import type { RowMatch } from "./RowMatch.ts";
export function best(rows: RegisterRow[], solvent: string | null, medium: MediumClass): RowMatch | undefined {
  if (rows.length === 0) return undefined;
  const score = (r: RegisterRow) => {
    if (solvent !== null && r.solvents.includes(solvent)) return 0;
    if (r.media.includes(medium)) return 1;
    if (r.media.length === 0) return 2;
    return 3 + Math.min(...r.media.map((m) => Math.abs(MEDIUM_CLASSES.indexOf(m) - MEDIUM_CLASSES.indexOf(medium))));
  };
  const st = { confirmed: 0, memory: 1, estimate: 2 };
  const row = [...rows].sort((a, b) => score(a) - score(b) || st[a.standing] - st[b.standing] || (a.id < b.id ? -1 : 1))[0]!;
  const s = score(row);
  return { row, match: s === 0 ? "exact solvent" : s === 1 ? "same medium" : s === 2 ? "any medium" : "nearest medium" };
}
const EQ: Record<string, number[][]> = { oxane: [[2,6],[3,5]], thiane: [[2,6],[3,5]], piperidine: [[2,6],[3,5]], "1,3-dioxane": [[4,6]], "1,3-dithiane": [[4,6]], morpholine: [[2,6],[3,5]], "1,4-dioxane": [[2,3,5,6]] };
export function axialRow(register: Register, q: { ring: string; locant: number; group: string; solvent: string | null; medium: MediumClass }): RowMatch | undefined {
  const bare = q.ring.split("/")[0]!;
  const eq = bare === "cyclohexane" ? [1] : EQ[bare]?.find((s) => s.includes(q.locant)) ?? [q.locant];
  for (const ring of [q.ring, bare]) {
    const found = best(register.rows.filter((r) => (r.kind === "axial group" || r.kind === "anomeric") && r.ring === ring && eq.includes(r.locants[0]!) && r.groups[0] === q.group), q.solvent, q.medium);
    if (found) return found;
  }
  return undefined;
}
