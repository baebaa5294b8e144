import type { Structure, StructureBond } from "../dossier/Dossier.ts";

/** Rings larger than this are drawn like chains. */
const LARGEST = 8;

/** The atoms of the smallest ring a bond belongs to, or null; among equals the one of lowest atom numbers. */
export function shortestRing(structure: Structure, bond: StructureBond): readonly number[] | null {
  let paths: readonly (readonly number[])[] = [[bond.from]];
  const seen = new Set([bond.from]);
  for (let size = 1; size < LARGEST; size++) {
    const longer = paths.flatMap((path) => {
      const last = path.at(-1)!;
      return neighboursOf(structure, last)
        .filter((next) => !(path.length === 1 && next === bond.to) && (next === bond.to || !seen.has(next)))
        .map((next) => [...path, next]);
    });
    const closed = longer.find((path) => path.at(-1) === bond.to);
    if (closed !== undefined) return closed;
    for (const path of longer) seen.add(path.at(-1)!);
    paths = longer;
  }
  return null;
}

function neighboursOf(structure: Structure, atom: number): readonly number[] {
  return structure.bonds
    .flatMap(({ from, to }) => (from === atom ? [to] : to === atom ? [from] : []))
    .sort((a, b) => a - b);
}
