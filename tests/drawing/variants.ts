import type { Dossier } from "../../src/dossier/Dossier.ts";
import { type GroupSpec, makeDossier, sampleDossier } from "./makeDossier.ts";

const GROUPS = {
  Me: { element: "C", label: "Me" },
  OH: { element: "O", label: "OH", labelReversed: "HO" },
  OMe: { element: "O", label: "OMe", labelReversed: "MeO" },
  NH2: { element: "N", label: "NH_2", labelReversed: "H_2N" },
  NH3: { element: "N", label: "NH_3^+", labelReversed: "^+H_3N" },
  NHBoc: { element: "N", label: "NHBoc", labelReversed: "BocHN" },
  CO2Me: { element: "C", label: "CO_2Me", labelReversed: "MeO_2C" },
  CH2OH: { element: "C", label: "CH_2OH", labelReversed: "HOCH_2" },
  CF3: { element: "C", label: "CF_3", labelReversed: "F_3C" },
  tBu: { element: "C", label: "*t*-Bu" },
  iPr: { element: "C", label: "*i*-Pr" },
  Ph: { element: "C", label: "Ph" },
  F: { element: "F", label: "F" },
  Cl: { element: "Cl", label: "Cl" },
  Br: { element: "Br", label: "Br" },
  I: { element: "I", label: "I" },
} as const;

const on = (at: number, face: "up" | "down", key: keyof typeof GROUPS): GroupSpec => ({
  at,
  face,
  ...GROUPS[key],
});
const two = (
  groups: readonly GroupSpec[],
  population = 0.9,
  elements: Readonly<Record<number, string>> = {},
) => makeDossier({ rings: [{ groups, elements }], populations: [population, 1 - population] });

/** Dossiers that strain the drawing in different ways. */
export const variants: Readonly<Record<string, Dossier>> = {
  sample: sampleDossier,
  bare: makeDossier({ rings: [{ groups: [] }], populations: [0.5, 0.5], relation: "identical" }),
  "long labels 1,4": two([on(0, "down", "CO2Me"), on(3, "down", "NHBoc")]),
  "1,2-diequatorial long": two([on(0, "down", "CO2Me"), on(1, "up", "NHBoc")], 0.97),
  "1,2-cis": makeDossier({
    rings: [{ groups: [on(0, "up", "OMe"), on(1, "up", "OMe")] }],
    populations: [0.5, 0.5],
    relation: "enantiomeric",
  }),
  geminal: two([on(0, "up", "Me"), on(0, "down", "Ph")], 0.55),
  "geminal and more": two(
    [on(0, "up", "OH"), on(0, "down", "CF3"), on(1, "up", "CH2OH"), on(4, "down", "tBu")],
    0.55,
  ),
  "all axial": two([on(0, "up", "OH"), on(2, "up", "CO2Me"), on(4, "up", "NH2")], 0.02),
  "six groups": two(
    [
      on(0, "up", "OH"),
      on(1, "down", "OMe"),
      on(2, "up", "NH2"),
      on(3, "down", "Me"),
      on(4, "up", "CH2OH"),
      on(5, "down", "Cl"),
    ],
    0.1,
  ),
  "t-butyl lock": two([on(0, "down", "tBu"), on(3, "up", "OMe")], 0.9998),
  oxane: two([on(1, "down", "OMe")], 0.8, { 0: "O" }),
  pyranose: two(
    [on(1, "down", "OMe"), on(2, "down", "OH"), on(3, "up", "OH"), on(4, "down", "OH"), on(5, "up", "CH2OH")],
    0.99,
    { 0: "O" },
  ),
  "piperidine NMe": two([on(0, "down", "Me"), on(3, "up", "OH")], 0.9, { 0: "N" }),
  "piperidine NH": two([on(2, "up", "F")], 0.7, { 0: "N" }),
  piperidinium: makeDossier({
    rings: [{ groups: [on(2, "up", "F")], elements: { 0: "N" }, charges: { 0: 1 } }],
    populations: [0.04, 0.96],
  }),
  "1,3-dioxane": two([on(1, "down", "Ph"), on(4, "up", "OH")], 0.8, { 0: "O", 2: "O" }),
  morpholine: two([on(1, "up", "Me"), on(5, "up", "Me")], 0.96, { 0: "O", 3: "N" }),
  "1,4-dithiane": two([on(1, "up", "iPr"), on(2, "down", "Br")], 0.6, { 0: "S", 3: "S" }),
  menthol: two([on(0, "down", "OH"), on(1, "up", "iPr"), on(4, "up", "Me")], 0.99),
  ammonium: two([on(0, "down", "NH3"), on(3, "up", "I")], 0.7),
  unresolved: makeDossier({
    rings: [{ groups: [on(0, "up", "Cl"), on(1, "down", "OH")] }],
    populations: [0.52, 0.48],
    unresolved: true,
  }),
  "two rings": makeDossier({
    rings: [{ groups: [on(0, "down", "NHBoc")] }, { groups: [on(0, "down", "CO2Me"), on(3, "up", "OH")] }],
    populations: [0.7, 0.2, 0.08, 0.02],
  }),
  "one conformer": makeDossier({
    rings: [{ groups: [on(0, "down", "tBu"), on(3, "down", "Cl")] }],
    populations: [1],
  }),
};
