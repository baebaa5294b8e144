import type { Dossier } from "../../dossier/Dossier.ts";
import type { DerivationStep } from "../DerivationStep.ts";
import { shownConformers } from "../shownConformers.ts";
import { shownNotice } from "../shownNotice.ts";
import { texAligned } from "../texAligned.ts";
import { texConformer } from "../texConformer.ts";
import { texFraction } from "../texFraction.ts";
import { texSignificant } from "../texSignificant.ts";
import { texSum } from "../texSum.ts";

/** One digit more than the constants, so that the shares follow from the printed sum. */
const TOTAL_DIGITS = 4;

/** Share of each conformer, from the constants. */
export function populationFractions(dossier: Dossier): DerivationStep {
  const two = dossier.conformers.length === 2;
  const symmetric = dossier.equilibria.every(({ bySymmetry }) => bySymmetry);
  return {
    id: "populations",
    title: "Populations",
    words: two
      ? `The two populations add up to 1${symmetric ? ", so each is one half exactly" : ""}.`
      : `Each population is the conformer’s constant over the sum of all, with K = 1 for the first. ${shownNotice(dossier)}`.trim(),
    tex: texAligned(two ? twoStates(dossier) : manyStates(dossier)),
    where: [],
  };
}

function twoStates(dossier: Dossier): readonly string[] {
  const [first, second] = dossier.conformers;
  const K = dossier.equilibria[0]?.K ?? 1;
  if (first === undefined || second === undefined) return [];
  const k = K === 1 ? "1" : texSignificant(K);
  return [
    `p(${texConformer(first.id)}) &= \\frac{1}{1 + K} = \\frac{1}{1 + ${k}}`,
    `&= ${texFraction(first.population)}`,
    `p(${texConformer(second.id)}) &= \\frac{K}{1 + K} = \\frac{${k}}{1 + ${k}}`,
    `&= ${texFraction(second.population)}`,
  ];
}

function manyStates(dossier: Dossier): readonly string[] {
  const constants = dossier.conformers.map(
    ({ id }) => dossier.equilibria.find(({ to }) => to === id)?.K ?? 1,
  );
  const shown = shownConformers(dossier);
  const total = constants.reduce((sum, K) => sum + K, 0);
  const written = (K: number) => (K === 1 ? "1" : texSignificant(K));
  const summands = constants.slice(0, shown.length).map((K) => ({ tex: written(K), negative: false }));
  if (shown.length < constants.length) summands.push({ tex: "\\cdots", negative: false });
  const [first = "", ...more] = texSum(summands);
  return [
    `Q &= \\sum_j K_j = ${first}`,
    ...more,
    `&= ${texSignificant(total, TOTAL_DIGITS)}`,
    ...shown.map(
      ({ id, population }, index) =>
        `p(${texConformer(id)}) &= \\frac{${written(constants[index] ?? 1)}}{${texSignificant(total, TOTAL_DIGITS)}} = ${texFraction(population)}`,
    ),
  ];
}
