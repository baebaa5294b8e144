/** What `randomRings` builds from; the kinds are selectable by name. */
export const SKELETONS = {
  cyclohexane: ["C1CCCCC1"],
  heterocycle: [
    "O1CCCCC1",
    "N1CCCCC1",
    "S1CCCCC1",
    "O1COCCC1",
    "O1CCOCC1",
    "S1CSCCC1",
    "O1CCNCC1",
    "N1CCNCC1",
    "O1CSCCC1",
    "[Si]1CCCCC1",
  ],
  sulfoxide: ["S1(=O)CCCCC1", "S1(=O)CCOCC1", "S1(=O)CSCCC1", "S1(=O)CCC2CCCCC2C1", "C1CCCCC1S(=O)C"],
  ammonium: ["[N+]1(C)(CC)CCCCC1", "[N+]1(C)(CC=C)CCOCC1", "C1CCCC2[N+]1(C)CCCC2"],
  decalin: ["C1CCCC2CCCCC12"],
  heterodecalin: [
    "O1CCCC2CCCCC12",
    "C1OCCC2CCCCC12",
    "N1CCCC2CCCCC12",
    "C1NCCC2CCCCC12",
    "O1COCC2CCCCC12",
    "O1CCCC2CCCOC12",
    "N1CCOC2CCCCC12",
    "C1CCCC2OCCNC12",
  ],
  hydrindane: ["C1CCC2CCCCC12", "O1CCC2CCCCC12", "C1CCC2COCCC12", "C1NCC2CCCCC12"],
  spiro: ["C1CCCCC12CCCCC2", "C1CCCCC12CCCC2", "O1CCCCC12CCCCC2", "O1CCCCC12OCCCC2", "C1CNCCC12OCCO2"],
  perhydroanthracene: ["C1CCCC2C1CC1CCCCC1C2", "C1CCCC2C1OC1CCCCC1C2"],
  perhydrophenanthrene: ["C1CCCC2C1CCC1C2CCCC1", "C1CCCC2C1CCC1C2CCC1", "C1CCCC2C1CCC1C2CNCC1"],
  steroid: ["C12CCC3C(C1CCC2)CCC1C3(C)CCCC1"],
  linked: [
    "C1CCCCC1C1CCCCC1",
    "C1CCCCC1CC1CCCCC1",
    "C1CCCCC1OC1OCCCC1",
    "O1CCCCC1C1CCCC1",
    "N1CCCCC1C(=O)C1CCCCC1",
  ],
} as const;

export type Kind = keyof typeof SKELETONS;
export const KINDS = Object.keys(SKELETONS) as readonly Kind[];

/** Groups, written from the atom that is bound; several hold a centre of their own. */
export const GROUPS: readonly string[] = [
  "C",
  "CC",
  "C(C)C",
  "C(C)(C)C",
  "F",
  "Cl",
  "Br",
  "O",
  "OC",
  "OC(=O)C",
  "N",
  "N(C)C",
  "C#N",
  "C(=O)O",
  "C(=O)OC",
  "c1ccccc1",
  "c1ccncc1",
  "C=C",
  "C(F)(F)F",
  "CO",
  "S",
  "SC",
  "[N+](=O)[O-]",
  "C(C)O",
  "C(C)CC",
  "C(F)Cl",
  "C(O)c1ccccc1",
  "OC(C)C(=O)O",
  "C(N)C(=O)O",
  "C1CCCC(C)C1",
];

/** Groups that differ from others by an isotope only. */
export const ISOTOPES: readonly string[] = ["[2H]", "[13C]"];
