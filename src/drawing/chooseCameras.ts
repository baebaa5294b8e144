import type { Dossier, Ring } from "../dossier/Dossier.ts";
import type { ChairView } from "./ChairView.ts";
import { layChair } from "./layChair.ts";
import { BOND } from "./measures.ts";
import { pointSegmentGap } from "./pointSegmentGap.ts";
import type { RingCamera } from "./RingCamera.ts";
import type { Point } from "./Scene.ts";
import { viewRings } from "./viewRings.ts";

/** Degrees above the mean plane that give the drawing chemists expect. */
export const ELEVATION = 14;
/** Turns away from the position in which two axial bonds coincide, degrees; the first is the plain choice. */
const AZIMUTHS = [7, 10, 13];
const AZIMUTH_COST = 0.8;
/** More conformers than this do not change the choice. */
const JUDGED = 8;

/** A system is judged by fewer conformers, since there is more to lay out in each. */
const JUDGED_OF_SYSTEM = 2;
/** Price of two ring bonds that cross or lie on each other in the drawing. */
const COINCIDENT = 6;
/** Drawn length, as a share of a bond, below which a ring bond is seen too nearly end on, and the price of that. */
const SHORTEST = 0.45;
const END_ON = 25;

/**
 * Chooses one camera for each ring system, shared by all conformers: of the rings that can lead, the six ring atoms that
 * can stand at the right end and a few azimuths, the choice with the fewest crowded labels and coincident bonds over
 * all of them together.
 */
export function chooseCameras(dossier: Dossier, hydrogens: boolean): readonly RingCamera[] {
  return dossier.systems.map((system) => {
    const several = system.atoms.length > 6;
    const judged = dossier.conformers.slice(0, several ? JUDGED_OF_SYSTEM : JUDGED);
    let best: { readonly camera: RingCamera; readonly cost: number } | null = null;
    for (const lead of system.rings) {
      const ring = dossier.rings.find((each) => each.index === lead)!;
      for (const choice of AZIMUTHS.flatMap((azimuth) =>
        several
          ? [
              { azimuth, turnedOver: false },
              { azimuth, turnedOver: true },
            ]
          : [{ azimuth, turnedOver: false }],
      )) {
        const { azimuth } = choice;
        for (let rightEnd = 0; rightEnd < 6; rightEnd++) {
          const camera: RingCamera = { lead, rightEnd, ...choice, elevation: ELEVATION };
          const laid = judged.map((conformer) =>
            layChair(viewRings(dossier, conformer, system, camera, hydrogens)),
          );
          const cost =
            laid.reduce(
              (sum, each) =>
                sum + each.cost + (several ? overlaps(each.view) + systemCustomCost(each.view) : 0),
              0,
            ) /
              laid.length +
            AZIMUTH_COST * (azimuth - AZIMUTHS[0]!) +
            (several ? 0 : customCost(dossier, ring, rightEnd));
          if (best === null || cost < best.cost - 1e-6) best = { camera, cost };
        }
      }
    }
    return best!.camera;
  });
}

/** The trade draws angular groups upwards, and the lowest locants of a long system to the left. */
const ANGULAR_DOWN = 5;
const FIRST_TO_THE_RIGHT = 10;

function systemCustomCost(view: ChairView): number {
  const shared = (vertex: number) => view.rings.filter((ring) => ring.includes(vertex)).length > 1;
  const down = view.branches.filter(
    ({ vertex, atom, orientation, end }) =>
      atom !== null && orientation === "axial" && shared(vertex) && end.y > view.vertices[vertex]!.at.y,
  ).length;
  const middle = view.vertices.reduce((sum, { at }) => sum + at.x, 0) / view.vertices.length;
  const first = view.vertices.find(({ locant }) => locant === "2");
  const right = first !== undefined && first.at.x > middle ? FIRST_TO_THE_RIGHT : 0;
  return ANGULAR_DOWN * down + right;
}

/** What a drawing of several rings suffers from bonds that cross, lie on each other, or are seen end on. */
function overlaps(view: ChairView): number {
  const ends = view.bonds.map(({ from, to }) => [view.vertices[from]!.at, view.vertices[to]!.at] as const);
  let cost = 0;
  view.bonds.forEach((bond, i) => {
    const [a, b] = ends[i]!;
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    cost += END_ON * Math.max(0, SHORTEST - length / BOND);
    for (let j = i + 1; j < ends.length; j++) {
      const other = view.bonds[j]!;
      if ([bond.from, bond.to].some((vertex) => vertex === other.from || vertex === other.to)) continue;
      const [c, d] = ends[j]!;
      if (segmentsMeet(a, b, c, d)) cost += COINCIDENT;
      const close = [
        pointSegmentGap(a, c, d),
        pointSegmentGap(b, c, d),
        pointSegmentGap(c, a, b),
        pointSegmentGap(d, a, b),
      ];
      if (Math.min(...close) < 0.12 * BOND) cost += COINCIDENT / 2;
    }
  });
  return cost;
}

function segmentsMeet(a: Point, b: Point, c: Point, d: Point): boolean {
  const side = (p: Point, q: Point, r: Point) => (q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x);
  return side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0;
}

/**
 * Where the trade likes to see position 1: at the right end, then at the left one; a ring oxygen or sulfur at the
 * back to the right, as in drawings of pyranoses.
 */
function customCost(dossier: Dossier, ring: Ring, rightEnd: number): number {
  const one = Math.max(
    0,
    ring.locants.findIndex((locant) => locant.replace(/′+$/, "") === "1"),
  );
  const element = dossier.structure.atoms[ring.atoms[one]!]!.element;
  // The list runs clockwise seen from above, so that atom `rightEnd − 1` stands one step counter-clockwise of the right end.
  const spot = (((rightEnd - one) % 6) + 6) % 6;
  if (element === "O" || element === "S") return spot === 1 ? 0 : spot === 0 || spot === 3 ? 3 : 4;
  return spot === 0 ? 0 : spot === 3 ? 2 : 4;
}
