import type { Conformer, Dossier } from "../../dossier/Dossier.ts";
import { stereoisomerSentences } from "../../dossier/stereoisomerSentences.ts";
import { formatEnergy } from "../../quantity/formatEnergy.ts";
import { formatK } from "../../quantity/formatK.ts";
import { formatPopulation } from "../../quantity/formatPopulation.ts";
import { formatTemperature } from "../../quantity/formatTemperature.ts";
import { joinInterval } from "../../quantity/joinInterval.ts";
import { nameMarkup } from "../../quantity/nameMarkup.ts";
import { roundPopulation } from "../../quantity/roundPopulation.ts";

/** The words a `:value[…]` directive stands for, label markup allowed; says so when there is none. */
export function dossierValue(dossier: Dossier, name: string): string {
  const [major, minor] = dossier.conformers;
  const equilibrium = dossier.equilibria[0];
  const missing = "not available";
  switch (name) {
    case "name":
      return nameMarkup(dossier.name);
    case "code":
      return dossier.code;
    case "temperature":
      return formatTemperature(dossier.conditions.temperature_K);
    case "solvent":
      return dossier.conditions.stated ? dossier.conditions.solventLabel : "not stated";
    case "formula":
      return dossier.identity.formula.replace(/(\d+)/g, (digits) => digits.replace(/\d/g, "_$&"));
    case "population.major":
      return major === undefined ? missing : formatPopulation(major.population, major.population95);
    case "population.minor":
      return minor === undefined ? missing : formatPopulation(minor.population, minor.population95);
    case "interval.major":
      return major === undefined ? missing : intervalOf(major);
    case "interval.minor":
      return minor === undefined ? missing : intervalOf(minor);
    case "deltaG":
      return equilibrium === undefined
        ? missing
        : formatEnergy(equilibrium.deltaG_kJ_mol, equilibrium.u_kJ_mol);
    case "K":
      return equilibrium === undefined ? missing : formatK(equilibrium.K, equilibrium.K95);
    case "label.major":
      return major?.label ?? missing;
    case "label.minor":
      return minor?.label ?? missing;
    case "relation":
      return dossier.relation ?? "none";
    case "stereoisomers":
      return stereoisomerSentences(dossier)[0]!;
    default:
      throw new RangeError(`no value is called ${name}`);
  }
}

/** Rounded as in the tables, so that no value in a sentence says more than they do. */
function intervalOf({ population, population95 }: Conformer): string {
  const { low, high, value, exact } = roundPopulation(population, population95);
  if (exact) return `${value}\u00a0% (exact by symmetry)`;
  return `${low === high && /^[<>]/.test(low) ? low : joinInterval(low, high)}\u00a0%`;
}
