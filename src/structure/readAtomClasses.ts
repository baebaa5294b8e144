/** Bracket atoms, bare atoms, and everything else, in the order of a SMILES. */
const TOKEN = /\[([^\]]*)\]|Br|Cl|[BCNOPSFIbcnops*]/g;

/**
 * Atom classes of a SMILES, `[CH2:3]`, by the place of the atom among all atoms as written. Class 0 means none
 * (OpenSMILES 3.1.7).
 */
export function readAtomClasses(smiles: string): ReadonlyMap<number, number> {
  const classes = new Map<number, number>();
  let place = 0;
  for (const [, bracket] of smiles.matchAll(TOKEN)) {
    const found = /:(\d+)$/.exec(bracket ?? "");
    if (found !== null && Number(found[1]) > 0) classes.set(place, Number(found[1]));
    place += 1;
  }
  return classes;
}
