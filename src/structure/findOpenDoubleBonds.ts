import { type Bond, bondBetween, type Molecule } from "./Molecule.ts";
import type { Toolkit } from "./Toolkit.ts";

/** Double bonds that could be E or Z and have no geometry: setting it both ways gives two substances. */
export function findOpenDoubleBonds(
  molecule: Molecule,
  toolkit: Toolkit,
): readonly (readonly [number, number])[] {
  return molecule.bonds.flatMap((bond) => {
    const references = referencesOf(molecule, bond);
    if (references === null) return [];
    const set = (sense: "cis" | "trans"): Molecule => ({
      ...molecule,
      bonds: molecule.bonds.map((other) =>
        other === bond ? { ...bond, stereo: { sense, references } } : other,
      ),
    });
    const differ = toolkit.canonicalSmiles(set("cis")) !== toolkit.canonicalSmiles(set("trans"));
    return differ ? [[bond.from, bond.to] as const] : [];
  });
}

function referencesOf(molecule: Molecule, bond: Bond): readonly [number, number] | null {
  if (bond.order !== 2 || bond.aromatic || bond.stereo !== null) return null;
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
