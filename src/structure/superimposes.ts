import type { Body } from "./Body.ts";
import { isPermutationEven } from "./isPermutationEven.ts";
import { bondBetween, type Molecule } from "./Molecule.ts";

/** Stands for an implicit hydrogen or a lone pair. */
const IMPLICIT = -1;
/** Steps of the search after which two molecules are taken to differ; reached by no molecule of ordinary size. */
const MAXIMUM_STEPS = 200_000;

/**
 * Whether the body of one molecule can be laid on that of another of the same graph so that elements, bonds and the sense
 * of every tetrahedral atom agree, and branches lie on branches of the same form; as mirror images all senses must
 * be reversed instead. Canonical names are not asked, so that centres which they overlook count here: the spiro
 * atom of 1,7-dioxaspiro[5.5]undecane, the middle atom of a threefold ring system.
 * @param keepsBond - a further demand on each bond a–b of the first laid on x–y of the second.
 */
export function superimposes(
  body: Body,
  a: Molecule,
  b: Molecule,
  mirror: boolean,
  keepsBond: (a: number, b: number, x: number, y: number) => boolean = () => true,
): boolean {
  const inside = new Set(body.atoms);
  const branchAt = new Map(body.branches.map((branch) => [branch.first, branch]));
  const order = searchOrder(a, body);
  const image = new Map<number, number>();
  const used = new Set<number>();
  let steps = 0;

  const looksLike = (from: number, to: number): boolean => {
    const [x, y] = [branchAt.get(from), branchAt.get(to)];
    if (x !== undefined || y !== undefined) {
      return x !== undefined && y !== undefined && x.form === (mirror ? y.mirrorForm : y.form);
    }
    return inside.has(to) && colourOf(a, from) === colourOf(b, to);
  };
  const bondsFit = (from: number, to: number): boolean =>
    a.atoms[from]!.neighbours.every((neighbour) => {
      const there = image.get(neighbour);
      if (there === undefined) return true;
      const [p, q] = [bondBetween(a, from, neighbour)!, bondBetween(b, to, there)];
      const alike = q !== undefined && p.aromatic === q.aromatic && (p.aromatic || p.order === q.order);
      return alike && keepsBond(from, neighbour, to, there);
    });
  const senseFits = (from: number): boolean => {
    const atom = a.atoms[from]!;
    if (branchAt.has(from) || atom.stereo === null) return true;
    const other = b.atoms[image.get(from)!]!;
    if (other.stereo === null) return true;
    const mapped = atom.neighbours.map((neighbour) => image.get(neighbour));
    if (mapped.includes(undefined)) return true;
    const pad = (list: readonly number[]) => (list.length === 3 ? [...list, IMPLICIT] : list);
    const even = isPermutationEven(pad(mapped as number[]), pad(other.neighbours));
    const sense = even === (other.stereo === "cw") ? "cw" : "ccw";
    return mirror ? sense !== atom.stereo : sense === atom.stereo;
  };

  const place = (index: number): boolean => {
    const from = order[index];
    if (from === undefined) return true;
    const parent = a.atoms[from]!.neighbours.find((neighbour) => image.has(neighbour));
    const choices = parent === undefined ? body.atoms : b.atoms[image.get(parent)!]!.neighbours;
    for (const to of choices) {
      if (++steps > MAXIMUM_STEPS) return false;
      if (used.has(to) || !looksLike(from, to) || !bondsFit(from, to)) continue;
      image.set(from, to);
      used.add(to);
      const touched = [from, ...a.atoms[from]!.neighbours.filter((n) => image.has(n))];
      if (touched.every(senseFits) && place(index + 1)) return true;
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
