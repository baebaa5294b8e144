/** Covalent radii in Å for single bonds (rounded from Cordero et al., Dalton Trans. 2008, 2832; from memory). */
export const COVALENT_RADII: Readonly<Record<string, number>> = {
  H: 0.31,
  D: 0.31,
  Li: 1.28,
  B: 0.84,
  C: 0.76,
  N: 0.71,
  O: 0.66,
  F: 0.57,
  Na: 1.66,
  Mg: 1.41,
  Al: 1.21,
  Si: 1.11,
  P: 1.07,
  S: 1.05,
  Cl: 1.02,
  Zn: 1.22,
  Ge: 1.2,
  As: 1.19,
  Se: 1.2,
  Br: 1.2,
  Sn: 1.39,
  Te: 1.38,
  I: 1.39,
  Hg: 1.32,
  Pb: 1.46,
};

/** Share of the single-bond length left in a double, a triple and an aromatic bond (common practice, rounded). */
const SHORTENING = { 1: 1, 2: 0.87, 3: 0.78, aromatic: 0.91 };

/** Expected length of a bond in Å from the covalent radii of its atoms. */
export function bondLength(a: string, b: string, order: 1 | 2 | 3, aromatic: boolean): number {
  const sum = (COVALENT_RADII[a] ?? 1.3) + (COVALENT_RADII[b] ?? 1.3);
  return sum * (aromatic ? SHORTENING.aromatic : SHORTENING[order]);
}
