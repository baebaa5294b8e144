import type { Body, BodyBranch } from "./Body.ts";
import { extractFragment } from "./extractFragment.ts";
import { findRingSystems } from "./findRingSystems.ts";
import { type Molecule, mirrorImage } from "./Molecule.ts";
import type { AnalysedRing } from "./StructureAnalysis.ts";
import type { Toolkit } from "./Toolkit.ts";

/** Finds the body that the analysed rings make, and describes what hangs on it. */
export function describeBody(molecule: Molecule, rings: readonly AnalysedRing[], toolkit: Toolkit): Body {
  const all = findRingSystems(molecule);
  const systems = all.filter((system) => rings.some((ring) => ring.system === system.index));
  const inside = new Set(systems.flatMap((system) => system.atoms));
  for (const atom of pathsBetween(
    molecule,
    systems.map((system) => system.atoms),
  ))
    inside.add(atom);
  // A ring that a path leads through belongs to the body whole, or what is left of it would be cut twice.
  for (const system of all)
    if (system.atoms.some((atom) => inside.has(atom))) for (const atom of system.atoms) inside.add(atom);
  const atoms = [...inside].sort((a, b) => a - b);
  const branches = atoms.flatMap((at) =>
    molecule.atoms[at]!.neighbours.filter((first) => !inside.has(first)).map((first): BodyBranch => {
      const fragment = extractFragment(molecule, at, first);
      return {
        at,
        first,
        form: toolkit.canonicalSmiles(fragment.molecule),
        mirrorForm: toolkit.canonicalSmiles(mirrorImage(fragment.molecule)),
      };
    }),
  );
  return { atoms, branches };
}

/** Atoms that lie on a shortest path between two systems. */
function pathsBetween(molecule: Molecule, systems: readonly (readonly number[])[]): ReadonlySet<number> {
  const found = new Set<number>();
  for (const [index, system] of systems.entries()) {
    const previous = new Map<number, number>(system.map((atom) => [atom, -1]));
    const queue = [...system];
    for (let next = queue.shift(); next !== undefined; next = queue.shift()) {
      for (const neighbour of molecule.atoms[next]!.neighbours) {
        if (previous.has(neighbour)) continue;
        previous.set(neighbour, next);
        queue.push(neighbour);
      }
    }
    for (const other of systems.slice(index + 1)) {
      const reached = other.filter((atom) => previous.has(atom));
      if (reached.length === 0) continue;
      // The tree of the search enters another system by one atom: the only one whose predecessor lies outside it.
      const entry = reached.find((atom) => !other.includes(previous.get(atom)!))!;
      for (let atom = previous.get(entry)!; atom >= 0; atom = previous.get(atom)!) found.add(atom);
    }
  }
  return found;
}
