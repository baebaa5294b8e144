import type { Molecule } from "../structure/Molecule.ts";
import { axialFace, type Chair } from "./Chair.ts";
import { bondLength } from "./geometry/covalentRadii.ts";

/**
 * Cyclohexane as measured by electron diffraction (C–C 1.536 Å, C–C–C 111.4°, from memory) has its atoms on a
 * circle of this radius, alternately above and below the mean plane by this height; both in Å.
 */
const RADIUS = 1.4652;
const HEIGHT = 0.2305;

/**
 * Direction of an equatorial bond: that of the ring bonds one removed, which run outwards by the circle's radius
 * while they climb or fall by twice the height.
 */
const RING_BOND = Math.hypot(RADIUS, 2 * HEIGHT);
const EQUATORIAL_OUT = RADIUS / RING_BOND;
const EQUATORIAL_DOWN = (2 * HEIGHT) / RING_BOND;

export interface PlacedAtom {
  readonly element: string;
  readonly atom: number | null;
  readonly parent: number | null;
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/**
 * Coordinates (Å) of a chair: ring atoms, their hydrogens, and the first atom of each group.
 *
 * Every ring has the shape of the cyclohexane chair, z along its threefold axis and the up face towards +z, so
 * that axial bonds are exactly vertical and each equatorial bond is parallel to the ring bonds one removed. Bond
 * lengths to groups are sums of covalent radii. It is an idealised geometry for drawing, not a relaxed one.
 */
export function idealChairGeometry(molecule: Molecule, chair: Chair): readonly PlacedAtom[] {
  return chair.ring.atoms.flatMap((index, position) => {
    const atom = molecule.atoms[index]!;
    // The list runs clockwise seen from +z.
    const angle = (-Math.PI / 3) * position;
    const out = [Math.cos(angle), Math.sin(angle)] as const;
    const up = axialFace(chair, index) === "up" ? 1 : -1;
    const centre = { x: RADIUS * out[0], y: RADIUS * out[1], z: up * HEIGHT };
    const ringAtom: PlacedAtom = { element: atom.element, atom: index, parent: null, ...rounded(centre) };
    const place = (element: string, exocyclic: number | null, axial: boolean): PlacedAtom => {
      const length = bondLength(atom.element, element, 1, false);
      const outward = axial ? 0 : EQUATORIAL_OUT;
      const upward = axial ? up : -up * EQUATORIAL_DOWN;
      const point = {
        x: centre.x + length * outward * out[0],
        y: centre.y + length * outward * out[1],
        z: centre.z + length * upward,
      };
      return { element, atom: exocyclic, parent: index, ...rounded(point) };
    };
    const here = chair.ring.substituents.filter((substituent) => substituent.ringAtom === index);
    const groups = here.map((substituent) => {
      const axial = (chair.faces.get(substituent.atom) === "up" ? 1 : -1) === up;
      return { placed: place(molecule.atoms[substituent.atom]!.element, substituent.atom, axial), axial };
    });
    // Hydrogens take the places that are left, equatorial first: a lone pair is then the axial one.
    const free = [false, true].filter((axial) => !groups.some((group) => group.axial === axial));
    const hydrogens = free.slice(0, atom.hydrogens).map((axial) => place("H", null, axial));
    return [ringAtom, ...groups.map((group) => group.placed), ...hydrogens];
  });
}

function rounded(point: { x: number; y: number; z: number }): { x: number; y: number; z: number } {
  const round = (value: number) => Math.round(value * 1e4) / 1e4 + 0;
  return { x: round(point.x), y: round(point.y), z: round(point.z) };
}
