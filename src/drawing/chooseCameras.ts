import type { Dossier, Ring, RingSystem } from "../dossier/Dossier.ts";
import { chooseSystemCamera } from "./chooseSystemCamera.ts";
import { layChair } from "./layChair.ts";
import { placeSystem } from "./placeSystem.ts";
import type { RingCamera } from "./RingCamera.ts";
import { viewSystem } from "./viewSystem.ts";

/** Degrees above the mean plane that give the drawing chemists expect. */
export const ELEVATION = 14;
/** Turns away from the position in which two axial bonds coincide, degrees; the first is the plain choice. */
const AZIMUTHS = [7, 10, 13];
const AZIMUTH_COST = 0.8;
/** More conformers than this do not change the choice. */
const JUDGED = 8;

/** Chooses one camera for each ring system, shared by all conformers. */
export function chooseCameras(dossier: Dossier, hydrogens: boolean): readonly RingCamera[] {
  return dossier.systems.map((system) => {
    const [only] = dossier.rings.filter((ring) => system.rings.includes(ring.index));
    return only !== undefined && system.atoms.length === only.atoms.length
      ? chooseRingCamera(dossier, system, only, hydrogens)
      : chooseSystemCamera(dossier, system, hydrogens);
  });
}

/**
 * The camera of a single ring: of the six ring atoms that can stand at the right end and a few azimuths, the choice
 * with the fewest crowded labels and coincident bonds over all conformers together.
 */
function chooseRingCamera(dossier: Dossier, system: RingSystem, ring: Ring, hydrogens: boolean): RingCamera {
  const judged = dossier.conformers
    .slice(0, JUDGED)
    .map((conformer) => placeSystem(dossier, conformer, system, hydrogens));
  let best: { readonly camera: RingCamera; readonly cost: number } | null = null;
  for (const azimuth of AZIMUTHS) {
    for (let rightEnd = 0; rightEnd < 6; rightEnd++) {
      const camera: RingCamera = { lead: ring.index, above: "up", rightEnd, azimuth, elevation: ELEVATION };
      const laid = judged.map((body) => layChair(viewSystem(body, camera)));
      const cost =
        laid.reduce((sum, each) => sum + each.cost, 0) / laid.length +
        AZIMUTH_COST * (azimuth - AZIMUTHS[0]!) +
        customCost(dossier, ring, rightEnd);
      if (best === null || cost < best.cost - 1e-6) best = { camera, cost };
    }
  }
  return best!.camera;
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
