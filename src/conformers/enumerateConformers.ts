import { type Molecule, type TetrahedralSense, withSenses } from "../structure/Molecule.ts";
import { type Face, facesBySense } from "../structure/ringFaces.ts";
import type { AnalysedRing } from "../structure/StructureAnalysis.ts";
import { axialFace, type Chair } from "./Chair.ts";
import { exocyclicTorsion, type Outward } from "./exocyclicTorsion.ts";
import { type RingState, ringStates, twistStates } from "./ringStates.ts";

/** Most conformers listed for one compound. */
export const MAXIMUM_CONFORMERS = 128;
/** Longest bridge, in atoms, that needs both ends on one face, and axial where they are 1,3 to each other. */
const SHORT_BRIDGE = 6;
/** How far, in degrees, two fused rings may differ in the torsion about their common bond as the forms have it. */
const TOLERANCE = 45;
const BOAT_TOLERANCE = 60;
/** Largest torsion, in degrees, that a ring of a given size can hold about the bond it shares. */
const REACH: Readonly<Record<number, number>> = { 3: 30, 4: 70, 5: 90, 6: 100, 7: 120, 8: 120 };

/** One state for every analysed ring, in ring order. */
export type ChairSet = readonly Chair[];

/** A conformer of the whole molecule: the state of every ring, and the sense of every nitrogen that inverts. */
export interface Arrangement {
  readonly chairs: ChairSet;
  /** The molecule with the senses of its inverting atoms filled in as they are in this conformer. */
  readonly molecule: Molecule;
}

/**
 * Every conformer in which each ring is a chair (or the half-chair or boat that its flat bonds or bridges ask for), by
 * propagation: the state of a ring fixes the torsion about every bond it shares, and with the faces of the two outside
 * bonds there, the torsion that the ring fused to it must have. The two places of the group on each inverting
 * nitrogen are conformers of their own.
 *
 * A single ring whose only groups sit on inverting atoms is listed by the places of those groups alone: ring
 * inversion followed by nitrogen inversion then only exchanges ring hydrogens, as in N-methylpiperidine,
 * whose two conformers are known as the equatorial and the axial one.
 *
 * @param twists - how many rings are twist-boats instead of chairs: 0, or 1 for the forms one step above.
 * @returns null when there would be more than `MAXIMUM_CONFORMERS`; empty when no arrangement closes every ring.
 */
export function enumerateConformers(
  molecule: Molecule,
  rings: readonly AnalysedRing[],
  twists: 0 | 1 = 0,
): readonly Arrangement[] | null {
  let found: { chairs: readonly Chair[]; senses: ReadonlyMap<number, TetrahedralSense>; twists: number }[] = [
    { chairs: [], senses: new Map(), twists: 0 },
  ];
  for (const system of [...new Set(rings.map((ring) => ring.system))]) {
    const members = rings.filter((ring) => ring.system === system);
    const solutions = solveSystem(molecule, members, twists);
    if (solutions === null) return null;
    const next = found.flatMap((set) =>
      solutions
        .filter((solution) => set.twists + solution.twists <= twists)
        .map((solution) => ({
          chairs: [...set.chairs, ...solution.chairs],
          senses: new Map([...set.senses, ...solution.senses]),
          twists: set.twists + solution.twists,
        })),
    );
    if (next.length > MAXIMUM_CONFORMERS) return null;
    found = next;
  }
  return found
    .filter((set) => set.twists === twists)
    .map(({ chairs, senses }) => ({
      chairs: [...chairs].sort((a, b) => a.ring.index - b.ring.index),
      molecule: withSenses(molecule, senses),
    }));
}

interface Solution {
  readonly chairs: readonly Chair[];
  readonly senses: ReadonlyMap<number, TetrahedralSense>;
  readonly twists: number;
}

function solveSystem(
  molecule: Molecule,
  rings: readonly AnalysedRing[],
  twists: 0 | 1,
): readonly Solution[] | null {
  const inverting = [...new Set(rings.flatMap((ring) => ring.inverting))].sort((a, b) => a - b);
  if (2 ** inverting.length > MAXIMUM_CONFORMERS) return null;
  const solutions: Solution[] = [];
  // Where nothing but nitrogens shared by rings has faces, turning all of them over gives the same forms once more.
  const mirrored = rings.every((ring) =>
    ring.sites.every(
      (site) =>
        (site.up === null && site.down === null) ||
        site.faces === "flat" ||
        (site.faces === "free" && isShared(molecule, site.ringAtom)),
    ),
  );
  const codes = 2 ** (mirrored && inverting.length > 0 ? inverting.length - 1 : inverting.length);
  for (let code = 0; code < codes; code++) {
    const senses = new Map<number, TetrahedralSense>(
      inverting.map((atom, bit) => [atom, (code >> bit) & 1 ? "cw" : "ccw"]),
    );
    const faces = rings.map((ring) => facesOf(molecule, ring, senses));
    const place = (chairs: readonly Chair[], used: number): void => {
      if (solutions.length > MAXIMUM_CONFORMERS) return;
      const ring = rings[chairs.length];
      if (ring === undefined) {
        solutions.push({ chairs, senses, twists: used });
        return;
      }
      for (const state of statesOf(rings, ring, used < twists)) {
        const chair: Chair = { ring, ...state, faces: faces[chairs.length]! };
        if (fitsPartners(chair, rings) && chairs.every((other) => fitTogether(other, chair)))
          place([...chairs, chair], used + (state.form === "twist-boat" ? 1 : 0));
      }
    };
    place([], 0);
  }
  return solutions.length > MAXIMUM_CONFORMERS ? null : solutions;
}

function isShared(molecule: Molecule, atom: number): boolean {
  return molecule.rings.filter((ring) => ring.includes(atom)).length > 1;
}

function statesOf(rings: readonly AnalysedRing[], ring: AnalysedRing, twist: boolean): readonly RingState[] {
  const alone = rings.length === 1 && ring.partners.length === 0;
  const onlyInverting =
    ring.inverting.length > 0 && ring.substituents.every((group) => ring.inverting.includes(group.ringAtom));
  const states = ringStates(ring);
  const chairs = alone && onlyInverting && ring.substituents.length > 0 ? states.slice(0, 1) : states;
  // Twist-boats are not built across a bridge, which holds its ring in one shape.
  const bridged = ring.partners.some((partner) => partner.shared.length > 2);
  return twist && !bridged ? [...chairs, ...twistStates(ring)] : chairs;
}

/** Faces of all outside atoms of a ring's tetrahedral atoms, with the inverting ones at the given senses. */
function facesOf(
  molecule: Molecule,
  ring: AnalysedRing,
  senses: ReadonlyMap<number, TetrahedralSense>,
): ReadonlyMap<number, Face> {
  return new Map(
    ring.sites.flatMap((site, position): [number, Face][] => {
      if (site.faces === "flat") return [];
      const sense = senses.get(site.ringAtom);
      const [up, down] =
        sense === undefined
          ? [site.up, site.down]
          : facesBySense(molecule.atoms[site.ringAtom]!, ring.atoms, position, sense);
      return [
        ...(up === null ? [] : [[up, "up"] as [number, Face]]),
        ...(down === null ? [] : [[down, "down"] as [number, Face]]),
      ];
    }),
  );
}

/** Whether a ring's state suits its bridges and those partner rings that have no states of their own. */
function fitsPartners(chair: Chair, rings: readonly AnalysedRing[]): boolean {
  return chair.ring.partners.every((partner) => {
    const { shared, ends, size, bridge } = partner;
    if (shared.length === 4 && bridge <= SHORT_BRIDGE) {
      const [first, last] = [chair.faces.get(ends[0]), chair.faces.get(ends[1])];
      return first === undefined || last === undefined || first === last;
    }
    if (shared.length === 3 && bridge <= SHORT_BRIDGE) {
      return [shared[0]!, shared[2]!].every((position, i) => {
        if (chair.ring.flatAtoms.includes(position)) return true;
        const face = chair.faces.get(ends[i]!);
        return face === axialFace(chair, chair.ring.atoms[position]!);
      });
    }
    if (shared.length !== 2 || rings.some((ring) => sameRing(ring.atoms, partner.atoms))) return true;
    const torsion = outsideTorsion(chair, shared[0]!, shared[1]!, ends);
    return Math.abs(torsion) <= (REACH[size] ?? 180);
  });
}

/** Whether two rings with a common bond ask for the same torsion about it. */
function fitTogether(a: Chair, b: Chair): boolean {
  const partner = a.ring.partners.find((entry) => sameRing(entry.atoms, b.ring.atoms));
  if (partner === undefined || partner.shared.length !== 2) return true;
  const [first, second] = partner.shared.map((position) => a.ring.atoms[position]!);
  const asked = outsideTorsion(a, partner.shared[0]!, partner.shared[1]!, partner.ends);
  const [i, j] = [b.ring.atoms.indexOf(first!), b.ring.atoms.indexOf(second!)];
  const given = b.torsions[(i + 1) % 6 === j ? i : j]!;
  const difference = Math.abs(((((asked - given + 180) % 360) + 360) % 360) - 180);
  const boat = a.form === "boat" || b.form === "boat";
  if (difference > (boat ? BOAT_TOLERANCE : TOLERANCE)) return false;
  // Next to a flat bond the torsions are small, and their sign decides.
  return boat || Math.abs(asked) < 2 || Math.abs(given) < 2 || Math.sign(asked) === Math.sign(given);
}

function outsideTorsion(chair: Chair, a: number, b: number, ends: readonly [number, number]): number {
  const outward = (position: number, atom: number): Outward =>
    chair.ring.flatAtoms.includes(position) ? "flat" : chair.faces.get(atom)!;
  return exocyclicTorsion(chair.torsions[a]!, outward(a, ends[0]), outward(b, ends[1]));
}

function sameRing(a: readonly number[], b: readonly number[]): boolean {
  return a.length === b.length && a.every((atom) => b.includes(atom));
}
