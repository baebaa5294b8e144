import type { Conformer, Dossier, Orientation, RingSystem } from "../dossier/Dossier.ts";
import { bareLabel } from "./bareLabel.ts";

/** A group on a ring atom of a system, as it is drawn. */
export interface SystemGroup {
  readonly ringAtom: number;
  /** First atom of the group. */
  readonly atom: number;
  readonly order: 1 | 2 | 3;
  readonly orientation: Orientation | null;
  readonly cue: string;
  readonly label: string;
  readonly labelReversed: string;
}

/**
 * The groups on a system's atoms: those of its analysed rings, each once although two rings may share it, then those
 * on its other atoms. A group that is axial in one ring and equatorial in another has no accent; the letters tell.
 */
export function systemGroups(
  dossier: Dossier,
  conformer: Conformer,
  system: RingSystem,
): readonly SystemGroup[] {
  const listed = dossier.rings
    .filter((ring) => system.rings.includes(ring.index))
    .flatMap((ring) => ring.substituents);
  const known = new Set(listed.map((group) => group.atom));
  const others = conformer.geometry.atoms.flatMap(({ atom, parent, system: frame }) => {
    if (frame !== system.index || atom === null || parent === null || known.has(atom)) return [];
    return [{ ringAtom: parent, atom, ...bareLabel(dossier.structure, parent, atom) }];
  });
  const drawn = new Map([...others, ...listed].map((group) => [group.atom, group]));
  return [...new Set([...listed, ...others].map((group) => group.atom))].map((atom) => {
    const { ringAtom, label, labelReversed } = drawn.get(atom)!;
    const order = orderOf(dossier, ringAtom, atom);
    return { ringAtom, atom, order, ...placeOf(conformer, ringAtom, atom), label, labelReversed };
  });
}

/** One letter where all rings agree, a letter for each where they do not, none without positions. */
function placeOf(
  conformer: Conformer,
  ringAtom: number,
  atom: number,
): Pick<SystemGroup, "orientation" | "cue"> {
  const positions = conformer.positions.filter(
    (position) =>
      position.substituent === atom && position.ringAtom === ringAtom && position.kind === "group",
  );
  const letters = positions.map(
    ({ orientation, pseudo }) => `${pseudo ? "ψ" : ""}${orientation === "axial" ? "a" : "e"}`,
  );
  const [first] = positions;
  const agreed = positions.every((position) => position.orientation === first?.orientation);
  return { orientation: agreed ? (first?.orientation ?? null) : null, cue: [...new Set(letters)].join("/") };
}

function orderOf(dossier: Dossier, a: number, b: number): 1 | 2 | 3 {
  const bond = dossier.structure.bonds.find(
    ({ from, to }) => (from === a && to === b) || (from === b && to === a),
  );
  return bond?.order ?? 1;
}
