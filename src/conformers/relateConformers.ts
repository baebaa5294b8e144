import type { Body } from "../structure/Body.ts";
import { superimposes } from "../structure/superimposes.ts";
import type { Arrangement } from "./enumerateConformers.ts";

export type ChairRelation = "identical" | "enantiomeric" | "diastereomeric";

/**
 * Whether two conformers of one molecule are superimposable, mirror images, or neither.
 *
 * Every way of laying the body of the molecule on itself is tried. It is a superposition when it keeps the torsion about
 * every bond of every analysed ring and the sense of every tetrahedral atom, and lays branches on branches of the
 * same form; a reflection when it reverses all of them. Chains between rings turn freely and count by their
 * senses only.
 */
export function relateConformers(body: Body, a: Arrangement, b: Arrangement): ChairRelation {
  if (canLay(body, a, b, false)) return "identical";
  return canLay(body, a, b, true) ? "enantiomeric" : "diastereomeric";
}

function canLay(body: Body, a: Arrangement, b: Arrangement, mirror: boolean): boolean {
  const asked = torsionsByBond(a);
  const given = torsionsByBond(b);
  return superimposes(body, a.molecule, b.molecule, mirror, (p, q, x, y) => {
    const [angles, found] = [asked.get(bondKey(p, q)) ?? [], given.get(bondKey(x, y)) ?? []];
    return sameAngles(found, mirror ? angles.map((angle) => -angle) : angles);
  });
}

/** Torsions of all analysed rings about each bond, sorted; a bond shared by two rings has two. */
function torsionsByBond(arrangement: Arrangement): ReadonlyMap<string, readonly number[]> {
  const found = new Map<string, number[]>();
  for (const { ring, torsions } of arrangement.chairs) {
    ring.atoms.forEach((atom, k) => {
      const key = bondKey(atom, ring.atoms[(k + 1) % 6]!);
      found.set(key, [...(found.get(key) ?? []), torsions[k]!]);
    });
  }
  return found;
}

function bondKey(a: number, b: number): string {
  return a < b ? `${a}-${b}` : `${b}-${a}`;
}

function sameAngles(a: readonly number[], b: readonly number[]): boolean {
  const sorted = (list: readonly number[]) => [...list].sort((x, y) => x - y);
  const [x, y] = [sorted(a), sorted(b)];
  return x.length === y.length && x.every((angle, i) => angle === y[i]);
}
