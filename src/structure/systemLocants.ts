import { chooseNumbering, type NumberedGroup, seniorityOf } from "./chooseNumbering.ts";
import type { Molecule } from "./Molecule.ts";
import { compareLists } from "./nameRing.ts";
import type { RingSystem } from "./RingSystem.ts";
import type { Substituent } from "./StructureAnalysis.ts";
import { type Skeleton, skeletonTemplates } from "./skeletonTemplates.ts";

/**
 * Locants of a ring system of several rings by IUPAC numbering: two fused rings, spiro and bridged bicyclic systems,
 * anthracene, phenanthrene, steroid and adamantane skeletons. Heteroatoms get low locants before fusion atoms, then
 * suffix groups, all groups, and the order of names decide, as for a single ring.
 * @returns null for a single ring and for skeletons not numbered here; their rings then keep locants of their own.
 */
export function systemLocants(
  molecule: Molecule,
  system: RingSystem,
  groups: readonly Substituent[],
  descriptors: ReadonlyMap<number, string>,
): ReadonlyMap<number, string> | null {
  if (system.rings.length < 2) return null;
  const rings = baseRings(system);
  const shared = rings.length === 2 ? rings[0]!.filter((atom) => rings[1]!.includes(atom)).length : 0;
  const element = (atom: number) => molecule.atoms[atom]!.element;
  const candidates = skeletonTemplates(
    rings.map((ring) => ring.length),
    shared,
  ).flatMap((skeleton) =>
    skeleton.heteroatoms || system.atoms.every((atom) => element(atom) === "C")
      ? fits(molecule, system, skeleton).map((places) => ({
          places,
          locants: locantsOf(places, skeleton, element),
        }))
      : [],
  );
  if (candidates.length === 0) return null;
  const value = (locant: string) => Number.parseInt(locant, 10) + (/[a-z]/.test(locant) ? 0.5 : 0);
  const score = ({ places, locants }: (typeof candidates)[number]) => {
    const of = (test: (atom: number, locant: string) => boolean) =>
      places
        .flatMap((atom, i) => (test(atom, locants[i]!) ? [value(locants[i]!)] : []))
        .sort((a, b) => a - b);
    const hetero = of((atom) => element(atom) !== "C");
    const each = ["O", "S", "Se", "N", "P"].flatMap((symbol) => of((atom) => element(atom) === symbol));
    return [...hetero, ...each, ...of((_, locant) => /[a-z]/.test(locant))];
  };
  const best = candidates.map(score).sort(compareLists)[0]!;
  const kept = candidates.filter((candidate) => compareLists(score(candidate), best) === 0);
  const numbered: readonly NumberedGroup[] = groups.map((group) => ({
    ringAtom: group.ringAtom,
    prefix: group.prefix,
    seniority: seniorityOf(group.groupClass),
  }));
  // Skeletons numbered out of turn are compared in the order of their locants.
  const inOrder = kept.map(({ places, locants }) =>
    places
      .map((atom, i) => ({ atom, rank: value(locants[i]!) }))
      .sort((a, b) => a.rank - b.rank)
      .map(({ atom }) => atom),
  );
  const { places, locants } =
    kept[inOrder.indexOf(chooseNumbering(inOrder, numbered, descriptors) as number[])]!;
  return new Map(places.map((atom, i) => [atom, locants[i]!]));
}

/** The smallest independent rings: of three rings around one bridge the largest or last is left out. */
function baseRings(system: RingSystem): readonly (readonly number[])[] {
  const bonds = new Set(
    system.rings.flatMap((ring) =>
      ring.map((atom, i) => {
        const next = ring[(i + 1) % ring.length]!;
        return atom < next ? `${atom}-${next}` : `${next}-${atom}`;
      }),
    ),
  ).size;
  const independent = bonds - system.atoms.length + 1;
  return [...system.rings].sort((a, b) => a.length - b.length).slice(0, independent);
}

/** Every way of laying a skeleton on a ring system, as the atom at each place. */
function fits(molecule: Molecule, system: RingSystem, skeleton: Skeleton): readonly (readonly number[])[] {
  const size = 1 + Math.max(...skeleton.bonds.flat());
  if (size !== system.atoms.length) return [];
  const joined = (a: number, b: number) =>
    system.rings.some((ring) => {
      const at = ring.indexOf(a);
      return at >= 0 && (ring[(at + 1) % ring.length] === b || ring.at(at - 1) === b);
    });
  const degree = (atom: number) => molecule.atoms[atom]!.neighbours.filter((n) => joined(atom, n)).length;
  if (system.atoms.reduce((sum, atom) => sum + degree(atom), 0) !== 2 * skeleton.bonds.length) return [];
  const links: number[][] = Array.from({ length: size }, () => []);
  for (const [a, b] of skeleton.bonds) {
    links[a]!.push(b);
    links[b]!.push(a);
  }
  const found: number[][] = [];
  const places: number[] = [];
  const place = (): void => {
    const here = places.length;
    if (here === size) {
      found.push([...places]);
      return;
    }
    for (const atom of system.atoms) {
      if (places.includes(atom) || degree(atom) !== links[here]!.length) continue;
      if (links[here]!.some((other) => other < here && !joined(places[other]!, atom))) continue;
      places.push(atom);
      place();
      places.pop();
    }
  };
  place();
  return found;
}

function locantsOf(
  places: readonly number[],
  skeleton: Skeleton,
  element: (atom: number) => string,
): readonly string[] {
  if (skeleton.locants !== null) return skeleton.locants;
  let number = 0;
  let letter = 0;
  return places.map((atom, place) => {
    if (skeleton.fusion.includes(place) && element(atom) === "C") {
      letter += 1;
      return `${number}${"abc"[letter - 1]}`;
    }
    number += 1;
    letter = 0;
    return `${number}`;
  });
}
