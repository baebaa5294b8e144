import type { Register } from "../register/Register.ts";
import { chooseNumbering, seniorityOf } from "./chooseNumbering.ts";
import { describeSubstituent } from "./describeSubstituent.ts";
import type { GroupIndex } from "./groupIndex.ts";
import type { Molecule } from "./Molecule.ts";
import { compareLists, nameRing } from "./nameRing.ts";
import { ringFaces } from "./ringFaces.ts";
import { ringKey } from "./ringKey.ts";
import type { AnalysedRing } from "./StructureAnalysis.ts";
import type { Toolkit } from "./Toolkit.ts";

/**
 * Names, numbers and describes each ring, with the faces of its groups.
 * @param rings - ring atoms, as found by `findRings`.
 * @param authorNumbering - atoms at locants 1…6 where the author fixed them; used for the ring it matches.
 */
export function analyseRings(
  molecule: Molecule,
  rings: readonly (readonly number[])[],
  authorNumbering: readonly number[] | null,
  services: { readonly register: Register; readonly groups: GroupIndex; readonly toolkit: Toolkit },
): readonly AnalysedRing[] {
  const descriptors = services.toolkit.descriptors(molecule).atoms;
  return rings.map((ring, index) => {
    const substituents = ring.flatMap((ringAtom) =>
      molecule.atoms[ringAtom]!.neighbours.filter((neighbour) => !ring.includes(neighbour)).map((first) =>
        describeSubstituent(molecule, ringAtom, first, services.groups, services.toolkit),
      ),
    );
    const { parent, numberings } = nameRing(molecule, ring, services.register);
    const byAuthor = authorNumbering?.every((atom) => ring.includes(atom)) === true;
    const numbering = byAuthor
      ? authorNumbering
      : chooseNumbering(
          numberings,
          substituents.map((s) => ({
            ringAtom: s.ringAtom,
            prefix: s.prefix,
            seniority: seniorityOf(s.groupClass),
          })),
          descriptors,
        );
    const start = numbering.indexOf(Math.min(...numbering));
    const atoms = numbering.map((_, step) => numbering[(start + step) % 6]!);
    const locants = atoms.map((atom) => numbering.indexOf(atom) + 1);
    const place = (s: { ringAtom: number; atom: number }) => [numbering.indexOf(s.ringAtom), s.atom];
    const sites = ringFaces(molecule, atoms);
    return {
      index,
      atoms,
      elements: atoms.map((atom) => molecule.atoms[atom]!.element),
      carbons: atoms.filter((atom) => molecule.atoms[atom]!.element === "C"),
      inverting: sites.filter((site) => site.faces === "free").map((site) => site.ringAtom),
      locants,
      parent,
      ringKey: ringKey(molecule, parent, numbering),
      sites,
      substituents: [...substituents].sort((a, b) => compareLists(place(a), place(b))),
    };
  });
}
