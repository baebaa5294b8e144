import type { Dossier } from "../../dossier/Dossier.ts";
import type { DerivationStep } from "../DerivationStep.ts";
import { numberContributions } from "../numberContributions.ts";
import { texAligned } from "../texAligned.ts";
import { texEnergy } from "../texEnergy.ts";
import { texSum } from "../texSum.ts";

/** Contributions that every conformer has alike: they drop out of every difference, and it is said. */
export function commonTerms(dossier: Dossier): DerivationStep {
  const common = numberContributions(dossier).filter(
    (row) => row.conformers.length === dossier.conformers.length,
  );
  const step = { id: "common", title: "What cancels", where: [] };
  const [only] = common;
  if (only === undefined) {
    return { ...step, words: "No contribution is the same in all conformers, so none cancels.", tex: "" };
  }
  const numbers = common.map(({ number }) => number);
  const subject =
    numbers.length === 1
      ? `Row ${numbers[0]} is the same in all conformers and cancels`
      : `Rows ${numbers.slice(0, -1).join(", ")} and ${numbers.at(-1)} are the same in all conformers and cancel`;
  const struck = texSum(
    common.map(({ number, contribution: { value_kJ_mol } }) => ({
      tex: `\\underset{(${number})}{\\cancel{${texEnergy(Math.abs(value_kJ_mol))}}}`,
      negative: Number(texEnergy(value_kJ_mol)) < 0,
    })),
  );
  return {
    ...step,
    words: `${subject} in every difference, together with the uncertainty.`,
    tex: texAligned(struck.map((line, index) => (index === 0 ? `& ${line}` : line))),
  };
}
