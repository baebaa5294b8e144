import type { Conformer, Dossier, RingSystem } from "../dossier/Dossier.ts";
import type { ChairView } from "./ChairView.ts";
import type { RingCamera } from "./RingCamera.ts";
import { viewChair } from "./viewChair.ts";
import { viewSystem } from "./viewSystem.ts";

/** Looks at a ring system: a single saturated chair by its ideal shape, everything else by its own coordinates. */
export function viewRings(
  dossier: Dossier,
  conformer: Conformer,
  system: RingSystem,
  camera: RingCamera,
  hydrogens: boolean,
): ChairView {
  const ring = dossier.rings.find((each) => each.index === camera.lead)!;
  const plain =
    system.atoms.length === 6 &&
    conformer.rings.find((each) => each.ring === ring.index)?.form === "chair" &&
    ring.substituents.every((group) =>
      conformer.positions.some((position) => position.substituent === group.atom),
    );
  return plain
    ? viewChair(dossier, conformer, ring, camera, hydrogens)
    : viewSystem(dossier, conformer, system, camera, hydrogens);
}
