import type { Conformer, Dossier, Position, RingSystem } from "../dossier/Dossier.ts";
import type { Branch, ChairView, RingBond, Vertex } from "./ChairView.ts";
import { cornerLetters } from "./cornerLetters.ts";
import { type Camera, projectPoint } from "./projectPoint.ts";
import type { RingCamera } from "./RingCamera.ts";
import { shortestCycles } from "./shortestCycles.ts";

interface Vector {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/**
 * Looks at a whole ring system of a conformer through a camera set by one of its rings: that ring's axis stands
 * upright, its up face upwards, and all other rings stand where their bonds put them.
 *
 * Hydrogens of tetrahedral carbons shared by rings are always drawn, since they show how the rings are fused.
 * @param hydrogens - also draw the hydrogen of ring carbons that carry a group.
 */
export function viewSystem(
  dossier: Dossier,
  conformer: Conformer,
  system: RingSystem,
  ringCamera: RingCamera,
  hydrogens: boolean,
): ChairView {
  const placed = conformer.geometry.atoms.filter((atom) => atom.system === system.index);
  const ringAtom = (atom: number) => {
    const found = placed.find((each) => each.atom === atom && each.parent === null);
    if (found === undefined)
      throw new RangeError(`conformer ${conformer.id} has no coordinates for ring atom ${atom}`);
    return found;
  };
  const lead = dossier.rings.find((ring) => ring.index === ringCamera.lead)!;
  const frame = frameOf(lead.atoms.map(ringAtom), ringCamera.turnedOver);
  const end = inFrame(frame, ringAtom(lead.atoms[ringCamera.rightEnd]!));
  const direction = (Math.atan2(end.y, end.x) * 180) / Math.PI;
  const camera: Camera = {
    turn: (end.z > 0 ? ringCamera.azimuth : -ringCamera.azimuth) - direction,
    elevation: ringCamera.elevation,
  };
  const see = (point: Vector) => projectPoint(camera, inFrame(frame, point));

  const index = new Map(system.atoms.map((atom, i) => [atom, i]));
  const bonds: RingBond[] = system.bonds.map(({ from, to, order }) => ({
    from: index.get(from)!,
    to: index.get(to)!,
    double: order === 2,
  }));
  const at = system.atoms.map((atom) => see(ringAtom(atom)));
  const rings = shortestCycles(
    system.atoms.length,
    bonds.map(({ from, to }) => [from, to] as const),
  );
  const middle = (list: readonly number[]) => ({
    x: list.reduce((sum, i) => sum + at[i]!.x, 0) / list.length,
    y: list.reduce((sum, i) => sum + at[i]!.y, 0) / list.length,
  });
  const locantOf = (atom: number) => {
    const ring = dossier.rings.find((each) => each.atoms.includes(atom));
    return ring === undefined ? "" : (ring.locants[ring.atoms.indexOf(atom)] ?? "");
  };
  const vertices = system.atoms.map((atom, i): Vertex => {
    const centres = rings.filter((ring) => ring.includes(i)).map(middle);
    return {
      atom,
      locant: locantOf(atom),
      at: at[i]!,
      centre: {
        x: centres.reduce((sum, centre) => sum + centre.x, 0) / centres.length,
        y: centres.reduce((sum, centre) => sum + centre.y, 0) / centres.length,
      },
      letters: cornerLetters(dossier, atom),
    };
  });

  const shared = (i: number) => rings.filter((ring) => ring.includes(i)).length > 1;
  const groups = placed.flatMap((point): Branch[] => {
    const vertex = index.get(point.parent ?? -1);
    if (vertex === undefined || point.atom === null) return [];
    const described = dossier.rings
      .flatMap((ring) => ring.substituents)
      .find((group) => group.atom === point.atom && group.ringAtom === point.parent);
    const element = dossier.structure.atoms[point.atom]!;
    const bare =
      element.element +
      (element.hydrogens === 0 ? "" : `H${element.hydrogens > 1 ? `_${element.hydrogens}` : ""}`);
    const positions = conformer.positions.filter(
      (position) => position.substituent === point.atom && position.ringAtom === point.parent,
    );
    const bond = dossier.structure.bonds.find(
      ({ from, to }) =>
        (from === point.atom && to === point.parent) || (to === point.atom && from === point.parent),
    );
    return [
      {
        vertex,
        atom: point.atom,
        ...orientationCue(positions),
        double: bond?.order === 2,
        end: see(point),
        label: described?.label ?? bare,
        labelReversed: described?.labelReversed ?? bare,
      },
    ];
  });
  const carriers = new Set(groups.map((group) => group.vertex));
  const drawn = placed.flatMap((point): Branch[] => {
    const vertex = index.get(point.parent ?? -1);
    if (vertex === undefined || point.element !== "H" || point.atom !== null) return [];
    if (vertices[vertex]!.letters !== null) return [];
    if (!shared(vertex) && !(hydrogens && carriers.has(vertex))) return [];
    return [
      {
        vertex,
        atom: null,
        orientation: null,
        cue: "",
        double: false,
        end: see(point),
        label: "H",
        labelReversed: "H",
      },
    ];
  });
  return { group: `${conformer.id}/${lead.index}`, vertices, bonds, rings, branches: [...groups, ...drawn] };
}

/** One letter where all rings agree, a letter for each where they do not, none without positions. */
function orientationCue(positions: readonly Position[]): Pick<Branch, "orientation" | "cue"> {
  const [first] = positions;
  if (first === undefined) return { orientation: null, cue: "" };
  const letters = positions.map(
    ({ orientation, pseudo }) => `${pseudo ? "ψ" : ""}${orientation === "axial" ? "a" : "e"}`,
  );
  const same = positions.every(({ orientation }) => orientation === first.orientation);
  return { orientation: same ? first.orientation : null, cue: same ? letters[0]! : letters.join("/") };
}

interface Frame {
  readonly origin: Vector;
  readonly x: Vector;
  readonly y: Vector;
  readonly z: Vector;
}

/** Axes of a ring: origin at its centre, z towards the face from which the list runs clockwise, or the other one. */
function frameOf(ring: readonly Vector[], turnedOver: boolean): Frame {
  const origin = {
    x: ring.reduce((sum, { x }) => sum + x, 0) / ring.length,
    y: ring.reduce((sum, { y }) => sum + y, 0) / ring.length,
    z: ring.reduce((sum, { z }) => sum + z, 0) / ring.length,
  };
  const from = ring.map((point) => minus(point, origin));
  let axis: Vector = { x: 0, y: 0, z: 0 };
  from.forEach((point, i) => {
    const turn = cross(point, from[(i + 1) % from.length]!);
    const sign = turnedOver ? 1 : -1;
    axis = { x: axis.x + sign * turn.x, y: axis.y + sign * turn.y, z: axis.z + sign * turn.z };
  });
  const z = unit(axis);
  const first = from[0]!;
  const along = dot(first, z);
  const x = unit({ x: first.x - along * z.x, y: first.y - along * z.y, z: first.z - along * z.z });
  return { origin, x, y: cross(z, x), z };
}

function inFrame(frame: Frame, point: Vector): Vector {
  const from = minus(point, frame.origin);
  return { x: dot(from, frame.x), y: dot(from, frame.y), z: dot(from, frame.z) };
}

const minus = (a: Vector, b: Vector): Vector => ({ x: a.x - b.x, y: a.y - b.y, z: a.z - b.z });
const dot = (a: Vector, b: Vector) => a.x * b.x + a.y * b.y + a.z * b.z;
const cross = (a: Vector, b: Vector): Vector => ({
  x: a.y * b.z - a.z * b.y,
  y: a.z * b.x - a.x * b.z,
  z: a.x * b.y - a.y * b.x,
});
function unit(a: Vector): Vector {
  const length = Math.hypot(a.x, a.y, a.z) || 1;
  return { x: a.x / length, y: a.y / length, z: a.z / length };
}
