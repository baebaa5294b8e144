import { type Bond, bondBetween, type Molecule } from "./Molecule.ts";

/**
 * The neighbours by which the geometry of a double bond is stated, or null when it has none to state: in a small ring,
 * at a bond without substituents, or between atoms that are not carbon or nitrogen.
 */
export function doubleBondReferences(molecule: Molecule, bond: Bond): readonly [number, number] | null {
  if (bond.order !== 2 || bond.aromatic) return null;
  // In rings of up to seven atoms the geometry is forced.
  const inSmallRing = molecule.rings.some(
    (ring) => ring.length < 8 && ring.includes(bond.from) && ring.includes(bond.to),
  );
  if (inSmallRing) return null;
  const end = (atom: number, other: number): number | null => {
    const here = molecule.atoms[atom]!;
    if (here.element !== "C" && here.element !== "N") return null;
    const rest = here.neighbours.filter((neighbour) => neighbour !== other);
    if (rest.length === 0 || rest.some((n) => bondBetween(molecule, atom, n)!.order !== 1)) return null;
    return rest[0]!;
  };
  const first = end(bond.from, bond.to);
  const second = end(bond.to, bond.from);
  return first === null || second === null ? null : [first, second];
}
