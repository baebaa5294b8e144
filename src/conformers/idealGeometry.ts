import { findRingSystems } from "../structure/findRingSystems.ts";
import type { Arrangement } from "./enumerateConformers.ts";
import { embed } from "./geometry/embed.ts";
import { idealChairGeometry, type PlacedAtom } from "./idealChairGeometry.ts";

/** A placed atom with the ring system whose frame it is placed in. */
export interface SystemAtom extends PlacedAtom {
  readonly system: number;
}

/**
 * Ideal coordinates in Å of every ring system of a conformer, for drawing: its ring atoms, their hydrogens, and the
 * first atoms of groups. A single chair has the shape of the cyclohexane chair, its axis along z; any other
 * system is built from the states of its rings with tetrahedral angles, in a frame of its own. A system that
 * cannot be built so has no atoms here.
 */
export function idealGeometry(arrangement: Arrangement): readonly SystemAtom[] {
  const { molecule, chairs } = arrangement;
  const systems = findRingSystems(molecule);
  return [...new Set(chairs.map(({ ring }) => ring.system))].flatMap((index): readonly SystemAtom[] => {
    const members = chairs.filter(({ ring }) => ring.system === index);
    const [first] = members;
    const { atoms } = systems[index]!;
    const plain = first!.form === "chair" && first!.ring.flatAtoms.length === 0;
    if (members.length === 1 && atoms.length === 6 && plain) {
      return idealChairGeometry(molecule, first!).map((atom) => ({ ...atom, system: index }));
    }
    const built = embed(arrangement, new Set(atoms));
    if (built === null) return [];
    const at = (i: number, axis: 0 | 1 | 2) => Math.round(built.coordinates[3 * i + axis]! * 1e4) / 1e4 + 0;
    return built.points.map(({ element, atom, parent }, i) => ({
      element,
      atom,
      parent,
      system: index,
      x: at(i, 0),
      y: at(i, 1),
      z: at(i, 2),
    }));
  });
}
