import type { Conformer, Dossier, Ring } from "../dossier/Dossier.ts";
import { layChair } from "./layChair.ts";
import type { Camera } from "./projectPoint.ts";
import { viewChair } from "./viewChair.ts";

/** Degrees above the mean plane that give the drawing chemists expect. */
export const ELEVATION = 14;
/** Turns away from the position in which two axial bonds coincide, degrees; the first is the plain choice. */
const AZIMUTHS = [7, 10, 13];
const AZIMUTH_COST = 0.8;
/** More conformers than this do not change the choice. */
const JUDGED = 8;

/**
 * Chooses one camera for each ring, shared by all conformers: of the six places in which the ring can be turned
 * and a few azimuths, the one with the fewest crowded labels and coincident bonds over all of them together.
 */
export function chooseCameras(dossier: Dossier, hydrogens: boolean): readonly Camera[] {
  const judged = dossier.conformers.slice(0, JUDGED);
  return dossier.rings.map((ring) => {
    let best: { readonly camera: Camera; readonly cost: number } | null = null;
    for (const azimuth of AZIMUTHS) {
      for (let place = 0; place < 6; place++) {
        const camera: Camera = {
          turn: azimuth + 60 * place - firstAngle(judged[0]!, ring),
          elevation: ELEVATION,
        };
        const laid = judged.map((conformer) =>
          layChair(viewChair(dossier, conformer, ring, camera, hydrogens)),
        );
        const cost =
          laid.reduce((sum, each) => sum + each.cost, 0) / laid.length +
          AZIMUTH_COST * (azimuth - AZIMUTHS[0]!) +
          customCost(dossier, ring, place);
        if (best === null || cost < best.cost - 1e-6) best = { camera, cost };
      }
    }
    return best!.camera;
  });
}

/** Direction of the first ring atom in the file's coordinates, degrees. */
function firstAngle(conformer: Conformer, ring: Ring): number {
  const atoms = conformer.geometry.atoms.filter(
    (atom) => atom.parent === null && ring.atoms.includes(atom.atom ?? -1),
  );
  const centre = (axis: "x" | "y") => atoms.reduce((sum, atom) => sum + atom[axis], 0) / atoms.length;
  const first = atoms.find((atom) => atom.atom === ring.atoms[0])!;
  return (Math.atan2(first.y - centre("y"), first.x - centre("x")) * 180) / Math.PI;
}

/**
 * Where the trade likes to see position 1: at the right end, then at the left one; a ring oxygen or sulfur at the
 * back to the right, as in drawings of pyranoses.
 */
function customCost(dossier: Dossier, ring: Ring, place: number): number {
  const one = Math.max(
    0,
    ring.locants.findIndex((locant) => locant.replace(/′+$/, "") === "1"),
  );
  const element = dossier.structure.atoms[ring.atoms[one]!]!.element;
  // The list runs clockwise from above: each step along it is a step of −60°.
  const spot = (((place - one) % 6) + 6) % 6;
  if (element === "O" || element === "S") return spot === 1 ? 0 : spot === 0 || spot === 3 ? 3 : 4;
  return spot === 0 ? 0 : spot === 3 ? 2 : 4;
}
