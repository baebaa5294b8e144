import type { Register } from "../register/Register.ts";
import { chooseNumbering, seniorityOf } from "./chooseNumbering.ts";
import { describeBranch } from "./describeBranch.ts";
import { describeSubstituent } from "./describeSubstituent.ts";
import { findRingSystems } from "./findRingSystems.ts";
import type { FoundRing } from "./findRings.ts";
import type { GroupIndex } from "./groupIndex.ts";
import type { Molecule } from "./Molecule.ts";
import { nameFlatRing } from "./nameFlatRing.ts";
import { compareLists } from "./nameRing.ts";
import { ringFaces } from "./ringFaces.ts";
import { ringKey } from "./ringKey.ts";
import { ringPartners } from "./ringPartners.ts";
import type { AnalysedRing, Substituent } from "./StructureAnalysis.ts";
import { systemLocants } from "./systemLocants.ts";
import type { Toolkit } from "./Toolkit.ts";

/** What the author fixed about locants. */
export interface AuthorNumbering {
  /** Atoms at locants 1…6 of one ring, or null. */
  readonly ring: readonly number[] | null;
  /** Locants by atom, from atom classes in the SMILES; they go before every rule. */
  readonly atoms: ReadonlyMap<number, string>;
}

/**
 * Names, numbers and describes each ring, with the faces of its groups.
 * @param found - the rings, as `findRings` lists them.
 */
export function analyseRings(
  molecule: Molecule,
  found: readonly FoundRing[],
  author: AuthorNumbering,
  services: { readonly register: Register; readonly groups: GroupIndex; readonly toolkit: Toolkit },
): readonly AnalysedRing[] {
  const descriptors = services.toolkit.descriptors(molecule).atoms;
  const systems = findRingSystems(molecule);
  const systemOf = (atom: number) => systems.find((system) => system.atoms.includes(atom))!;
  const rings = found.map((entry, index) => {
    const system = systemOf(entry.atoms[0]!);
    const outside = entry.atoms.flatMap((ringAtom) =>
      molecule.atoms[ringAtom]!.neighbours.filter((neighbour) => !entry.atoms.includes(neighbour)).map(
        (first) => ({ ringAtom, first, branch: isRingBond(system.rings, ringAtom, first) }),
      ),
    );
    const groups = outside
      .filter(({ branch }) => !branch)
      .map(({ ringAtom, first }) =>
        describeSubstituent(molecule, ringAtom, first, services.groups, services.toolkit),
      );
    const { parent, numberings } = nameFlatRing(molecule, entry, services.register);
    const byAuthor = author.ring?.every((atom) => entry.atoms.includes(atom)) === true;
    const numbering = byAuthor
      ? author.ring!
      : chooseNumbering(
          numberings,
          groups.map((s) => ({
            ringAtom: s.ringAtom,
            prefix: s.prefix,
            seniority: seniorityOf(s.groupClass),
          })),
          descriptors,
        );
    const start = numbering.indexOf(Math.min(...numbering));
    const atoms = numbering.map((_, step) => numbering[(start + step) % 6]!);
    const branches = outside.filter(({ branch }) => branch);
    return { entry, index, system: system.index, groups, branches, parent, numbering, atoms };
  });

  const printed = systems.map((system) =>
    systemLocants(
      molecule,
      system,
      rings.filter((ring) => ring.system === system.index).flatMap((ring) => ring.groups),
      descriptors,
    ),
  );
  return rings.map(({ entry, index, system, groups, branches, parent, numbering, atoms }): AnalysedRing => {
    const nameOf = (atom: number) =>
      author.atoms.get(atom) ??
      printed[system]?.get(atom) ??
      (atoms.includes(atom) ? `${numbering.indexOf(atom) + 1}${"′".repeat(index)}` : `${atom}`);
    const sites = ringFaces(molecule, atoms);
    const isFlat = (s: { ringAtom: number }) =>
      sites.some((site) => site.ringAtom === s.ringAtom && site.faces === "flat");
    const inPlace = (list: readonly Substituent[]) =>
      [...list].sort((a, b) =>
        compareLists([numbering.indexOf(a.ringAtom), a.atom], [numbering.indexOf(b.ringAtom), b.atom]),
      );
    const position = (k: number) => atoms.indexOf(entry.atoms[k]!);
    const flatBond = (k: number) => {
      const [a, b] = [position(k), position((k + 1) % 6)];
      return (a + 1) % 6 === b ? a : b;
    };
    return {
      index,
      kind: entry.kind,
      system,
      atoms,
      elements: atoms.map((atom) => molecule.atoms[atom]!.element),
      carbons: atoms.filter((atom) => molecule.atoms[atom]!.element === "C"),
      inverting: sites.filter((site) => site.faces === "free").map((site) => site.ringAtom),
      locants: atoms.map((atom) => numbering.indexOf(atom) + 1),
      names: atoms.map(nameOf),
      flatBonds: entry.flatBonds.map(flatBond).sort((a, b) => a - b),
      flatAtoms: entry.flatAtoms.map(position).sort((a, b) => a - b),
      partners: ringPartners(molecule, atoms) ?? [],
      parent,
      ringKey: ringKey(molecule, parent, numbering),
      sites,
      substituents: inPlace(groups.filter((group) => !isFlat(group))),
      flatGroups: inPlace(groups.filter(isFlat)),
      branches: inPlace(
        branches
          .filter((branch) => !isFlat(branch))
          .map(({ ringAtom, first }) =>
            describeBranch(molecule, ringAtom, first, printedName(first), services.register),
          ),
      ),
    };

    /** Printed locant of an atom of the system outside this ring. */
    function printedName(atom: number): string {
      const own = author.atoms.get(atom) ?? printed[system]?.get(atom);
      if (own !== undefined) return own;
      const other = rings.find((ring) => ring.index !== index && ring.atoms.includes(atom));
      return other === undefined ? "" : `${other.numbering.indexOf(atom) + 1}${"′".repeat(other.index)}`;
    }
  });
}

function isRingBond(rings: readonly (readonly number[])[], a: number, b: number): boolean {
  return rings.some((ring) => {
    const at = ring.indexOf(a);
    if (at < 0) return false;
    return ring[(at + 1) % ring.length] === b || ring[(at + ring.length - 1) % ring.length] === b;
  });
}
