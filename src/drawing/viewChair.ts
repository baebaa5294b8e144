import type { Conformer, Dossier, Orientation, Ring } from "../dossier/Dossier.ts";
import type { Branch, ChairView, Vertex } from "./ChairView.ts";
import { cornerLetters } from "./cornerLetters.ts";
import { drawnEnd } from "./drawnEnd.ts";
import { type Camera, projectPoint } from "./projectPoint.ts";
import type { RingCamera } from "./RingCamera.ts";

/** A bond this steep, as a share of its length along the ring's axis, is an axial one. */
const AXIAL_SLOPE = 0.7;

/**
 * Looks at one ring of a conformer through a camera. Coordinates are taken relative to the ring's centre, so
 * that rings which share a frame, or do not, are seen alike.
 *
 * @param hydrogens - also draw the hydrogen of ring carbons that carry a group.
 */
export function viewChair(
  dossier: Dossier,
  conformer: Conformer,
  ring: Ring,
  ringCamera: RingCamera,
  hydrogens: boolean,
): ChairView {
  const placed = conformer.geometry.atoms;
  const ringAtoms = ring.atoms.map((atom) => {
    const found = placed.find((each) => each.atom === atom && each.parent === null);
    if (found === undefined)
      throw new RangeError(`conformer ${conformer.id} has no coordinates for ring atom ${atom}`);
    return found;
  });
  const centre = (axis: "x" | "y" | "z") =>
    ringAtoms.reduce((sum, atom) => sum + atom[axis], 0) / ringAtoms.length;
  const [x, y, z] = [centre("x"), centre("y"), centre("z")];
  const end = ringAtoms[ringCamera.rightEnd]!;
  const direction = (Math.atan2(end.y - y, end.x - x) * 180) / Math.PI;
  const camera: Camera = {
    turn: (end.z > z ? ringCamera.azimuth : -ringCamera.azimuth) - direction,
    elevation: ringCamera.elevation,
  };
  const see = (atom: (typeof placed)[number]) =>
    projectPoint(camera, { x: atom.x - x, y: atom.y - y, z: atom.z - z });

  const seeEnd = (atom: (typeof placed)[number], vertex: number, orientation: Orientation) =>
    see(orientation === "axial" ? atom : { ...atom, ...drawnEnd(ringAtoms, vertex, atom) });

  const vertices = ring.atoms.map(
    (atom, index): Vertex => ({
      atom,
      locant: ring.locants[index] ?? "",
      at: see(ringAtoms[index]!),
      centre: { x: 0, y: 0 },
      letters: cornerLetters(dossier, atom),
    }),
  );
  const groups = ring.substituents.map((substituent): Branch => {
    const found = placed.find(
      (each) => each.atom === substituent.atom && each.parent === substituent.ringAtom,
    );
    const position = conformer.positions.find(
      (each) => each.substituent === substituent.atom && each.ringAtom === substituent.ringAtom,
    );
    if (found === undefined || position === undefined) {
      throw new RangeError(
        `conformer ${conformer.id} has no place for the group at atom ${substituent.atom}`,
      );
    }
    const vertex = ring.atoms.indexOf(substituent.ringAtom);
    return {
      vertex,
      atom: substituent.atom,
      orientation: position.orientation,
      cue: position.orientation === "axial" ? "a" : "e",
      double: false,
      end: seeEnd(found, vertex, position.orientation),
      label: substituent.label,
      labelReversed: substituent.labelReversed,
    };
  });
  const carriers = new Set(groups.map((group) => group.vertex));
  const drawn = placed.flatMap((atom): Branch[] => {
    const vertex = ring.atoms.indexOf(atom.parent ?? -1);
    if (!hydrogens || atom.element !== "H" || atom.atom !== null || !carriers.has(vertex)) return [];
    if (vertices[vertex]!.letters !== null) return [];
    const from = ringAtoms[vertex]!;
    const rise = Math.abs(atom.z - from.z) / Math.hypot(atom.x - from.x, atom.y - from.y, atom.z - from.z);
    const orientation: Orientation = rise > AXIAL_SLOPE ? "axial" : "equatorial";
    return [
      {
        vertex,
        atom: null,
        orientation,
        cue: "",
        double: false,
        end: seeEnd(atom, vertex, orientation),
        label: "H",
        labelReversed: "H",
      },
    ];
  });
  return {
    group: `${conformer.id}/${ring.index}`,
    vertices,
    bonds: vertices.map((_, from) => ({ from, to: (from + 1) % vertices.length, double: false })),
    rings: [vertices.map((_, index) => index)],
    branches: [...groups, ...drawn],
  };
}
