import type { Body } from "../structure/Body.ts";
import { isPermutationEven } from "../structure/isPermutationEven.ts";
import { bondBetween, type Molecule } from "../structure/Molecule.ts";
import type { Arrangement } from "./enumerateConformers.ts";

export type ChairRelation = "identical" | "enantiomeric" | "diastereomeric";

/** Stands for an implicit hydrogen or a lone pair. */
const IMPLICIT = -1;
/** Steps of the search after which two conformers are taken to differ; reached by no molecule of ordinary size. */
const MAXIMUM_STEPS = 200_000;

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
  const inside = new Set(body.atoms);
  const branchAt = new Map(body.branches.map((branch) => [branch.first, branch]));
  const order = searchOrder(a.molecule, body);
  const target = torsionsByBond(b);
  const asked = [...torsionsByBond(a)];
  const image = new Map<number, number>();
  const used = new Set<number>();
  let steps = 0;

  const looksLike = (from: number, to: number): boolean => {
    const [x, y] = [branchAt.get(from), branchAt.get(to)];
    if (x !== undefined || y !== undefined) {
      return x !== undefined && y !== undefined && x.form === (mirror ? y.mirrorForm : y.form);
    }
    return inside.has(to) && colourOf(a.molecule, from) === colourOf(b.molecule, to);
  };
  const bondsFit = (from: number, to: number): boolean =>
    a.molecule.atoms[from]!.neighbours.every((neighbour) => {
      const there = image.get(neighbour);
      if (there === undefined) return true;
      const [p, q] = [bondBetween(a.molecule, from, neighbour)!, bondBetween(b.molecule, to, there)];
      return q !== undefined && p.aromatic === q.aromatic && (p.aromatic || p.order === q.order);
    });
  const senseFits = (from: number): boolean => {
    const atom = a.molecule.atoms[from]!;
    if (branchAt.has(from) || atom.stereo === null) return true;
    const other = b.molecule.atoms[image.get(from)!]!;
    if (other.stereo === null) return true;
    const mapped = atom.neighbours.map((neighbour) => image.get(neighbour));
    if (mapped.includes(undefined)) return true;
    const pad = (list: readonly number[]) => (list.length === 3 ? [...list, IMPLICIT] : list);
    const even = isPermutationEven(pad(mapped as number[]), pad(other.neighbours));
    const sense = even === (other.stereo === "cw") ? "cw" : "ccw";
    return mirror ? sense !== atom.stereo : sense === atom.stereo;
  };
  const torsionsFit = (from: number): boolean =>
    asked.every(([key, angle]) => {
      const [p, q] = key.split("-").map(Number) as [number, number];
      if (p !== from && q !== from) return true;
      const [x, y] = [image.get(p), image.get(q)];
      if (x === undefined || y === undefined) return true;
      const found = target.get(bondKey(x, y));
      return found !== undefined && sameAngles(found, mirror ? angle.map((t) => -t) : angle);
    });

  const place = (index: number): boolean => {
    const from = order[index];
    if (from === undefined) return true;
    const parent = a.molecule.atoms[from]!.neighbours.find((neighbour) => image.has(neighbour));
    const choices = parent === undefined ? body.atoms : b.molecule.atoms[image.get(parent)!]!.neighbours;
    for (const to of choices) {
      if (++steps > MAXIMUM_STEPS) return false;
      if (used.has(to) || !looksLike(from, to) || !bondsFit(from, to)) continue;
      image.set(from, to);
      used.add(to);
      const touched = [from, ...a.molecule.atoms[from]!.neighbours.filter((n) => image.has(n))];
      if (touched.every(senseFits) && torsionsFit(from) && place(index + 1)) return true;
      image.delete(from);
      used.delete(to);
    }
    return false;
  };
  return place(0);
}

/** Body atoms, each after a neighbour, with the first atoms of its branches right behind it. */
function searchOrder(molecule: Molecule, body: Body): readonly number[] {
  const order: number[] = [];
  const wanted = new Set(body.atoms);
  for (const start of body.atoms) {
    const queue = order.includes(start) ? [] : [start];
    for (let atom = queue.shift(); atom !== undefined; atom = queue.shift()) {
      if (order.includes(atom)) continue;
      order.push(atom);
      for (const branch of body.branches) if (branch.at === atom) order.push(branch.first);
      queue.push(...molecule.atoms[atom]!.neighbours.filter((n) => wanted.has(n) && !order.includes(n)));
    }
  }
  return order;
}

function colourOf(molecule: Molecule, index: number): string {
  const atom = molecule.atoms[index]!;
  return `${atom.isotope}${atom.element}${atom.charge}h${atom.hydrogens}n${atom.neighbours.length}`;
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
