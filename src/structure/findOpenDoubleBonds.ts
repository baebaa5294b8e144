import { doubleBondReferences } from "./doubleBondReferences.ts";
import type { Molecule } from "./Molecule.ts";
import type { Toolkit } from "./Toolkit.ts";

/** Double bonds that could be E or Z and have no geometry: setting it both ways gives two substances. */
export function findOpenDoubleBonds(
  molecule: Molecule,
  toolkit: Toolkit,
): readonly (readonly [number, number])[] {
  return molecule.bonds.flatMap((bond) => {
    const references = bond.stereo === null ? doubleBondReferences(molecule, bond) : null;
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
