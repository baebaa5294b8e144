/**
 * What stands in where the register has no value, in the order in which it is tried, and the standard uncertainty
 * that this adds, in kcal/mol. Plain words for the methods page; a test holds them to the energy rules.
 */
export const STAND_IN_DOUBTS: readonly (readonly [missing: string, standsIn: string])[] = [
  [
    "Another medium",
    "The row of the nearest class of medium; 0.2 added. It still counts as published, and its note says what was done.",
  ],
  [
    "Axial group in cyclohexane",
    "The range usual for its class of group, listed at the end of the register.",
  ],
  [
    "Axial group in a heteroring",
    "A group of the same class at the same place, 0.3 added; else the group in another state of the ring’s heteroatom, 0.3 added, though a polar group is never carried between charged and uncharged rings; else, for carbon groups without polar bonds, the cyclohexane value times the ratio known for methyl at this place, 0.4 and 15\u00a0% of the value added; else the cyclohexane value, 0.4 added, or 1.0 for a polar group beside a heteroatom or on a charged ring, or 1.5 beside a trigonal ring atom. A carbon group beside an N-acyl nitrogen takes the value known for N-acylpiperidine. In a half-chair 0.6 of the cyclohexane value stands in, 0.5 added.",
  ],
  [
    "Group on an inverting nitrogen",
    "A group of the same class on the nitrogen of the same ring, 0.5 added; else 1.5\u00a0±\u00a01.2.",
  ],
  [
    "Gauche neighbours",
    "A pair of the same classes, 0.25 added for each group that differs; else 0.9\u00a0±\u00a00.4, 0.45\u00a0±\u00a00.4 with one polar group, 0.5\u00a0±\u00a00.8 with two.",
  ],
  [
    "Syn-axial pair",
    "A pair of the same classes, as for gauche neighbours; else an excess of 2.0\u00a0±\u00a00.7, 1.3\u00a0±\u00a00.7 with one polar group, 2.0\u00a0±\u00a01.5 with two, 0.7\u00a0±\u00a01.5 where one of the two can donate a hydrogen bond.",
  ],
  [
    "Two groups on one ring atom",
    "Never borrowed: the two single values are taken to add, with a doubt of 0.2, 0.5 with a polar group, 1.0 with a group that has a flat face (aryl, alkenyl, acyl and the like).",
  ],
  [
    "Polar groups that no value joins",
    "No shift, with a doubt of 0.5 for each pair that is 1,4 and diaxial and 0.2 for each that is 1,3 and diequatorial.",
  ],
  [
    "Conformers charged alike",
    "No shift, with a doubt of 0.2 where symmetry does not make them equal, so that an equality of the model is not printed as one of nature.",
  ],
];
