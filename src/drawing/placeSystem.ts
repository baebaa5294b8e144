import type { Conformer, Dossier, RingSystem } from "../dossier/Dossier.ts";
import { cornerLetters } from "./cornerLetters.ts";
import { isFused } from "./isFused.ts";
import type { SystemBody } from "./SystemBody.ts";
import { systemBonds } from "./systemBonds.ts";
import { systemGroups } from "./systemGroups.ts";
import { systemRings } from "./systemRings.ts";

/**
 * Gathers a ring system of a conformer from the record: a single ring is a system of its own.
 *
 * Hydrogens at fusion atoms are always drawn, since they show how the rings are fused.
 * @param hydrogens - also draw the hydrogen of ring carbons that carry a group.
 */
export function placeSystem(
  dossier: Dossier,
  conformer: Conformer,
  system: RingSystem,
  hydrogens: boolean,
): SystemBody {
  const placed = conformer.geometry.atoms.filter((atom) => atom.system === system.index);
  const analysed = dossier.rings.filter((ring) => system.rings.includes(ring.index));
  // A single ring keeps the order of its own list.
  const own = analysed[0]?.atoms ?? [];
  const atoms = own.length === system.atoms.length ? own : system.atoms;
  const vertexOf = new Map(atoms.map((atom, index) => [atom, index]));
  const rings = systemRings(dossier, system).map((ring) => ring.map((atom) => vertexOf.get(atom)!));
  const vertices = atoms.map((atom) => {
    const at = placed.find((each) => each.atom === atom && each.parent === null);
    if (at === undefined)
      throw new RangeError(`conformer ${conformer.id} has no coordinates for ring atom ${atom}`);
    const home = analysed.find((ring) => ring.atoms.includes(atom));
    const locant = home?.locants[home.atoms.indexOf(atom)] ?? "";
    return { atom, locant, letters: cornerLetters(dossier, atom), at };
  });
  const groups = systemGroups(dossier, conformer, system).map(({ ringAtom, ...group }) => {
    const end = placed.find((each) => each.atom === group.atom && each.parent === ringAtom);
    if (end === undefined)
      throw new RangeError(`conformer ${conformer.id} has no place for the group at atom ${group.atom}`);
    return { ...group, vertex: vertexOf.get(ringAtom)!, end };
  });
  const carriers = new Set(groups.map((group) => group.vertex));
  const shown = placed.flatMap((end): SystemBody["branches"] => {
    const vertex = vertexOf.get(end.parent ?? -1);
    if (vertex === undefined || end.element !== "H" || end.atom !== null) return [];
    if (vertices[vertex]!.letters !== null) return [];
    if (!isFused(vertex, rings) && !(hydrogens && carriers.has(vertex))) return [];
    return [
      { vertex, atom: null, order: 1, orientation: null, cue: "", end, label: "H", labelReversed: "H" },
    ];
  });
  return {
    conformer: conformer.id,
    vertices,
    rings,
    analysed: analysed.map(({ index }) => ({
      ring: index,
      isChair: conformer.rings.some((each) => each.ring === index && each.form === "chair"),
    })),
    bonds: systemBonds(system, atoms, rings),
    branches: [...groups, ...shown],
  };
}
