import type { Dossier } from "../dossier/Dossier.ts";
import { formatPopulation } from "../quantity/formatPopulation.ts";
import { formatTemperature } from "../quantity/formatTemperature.ts";
import { labelText } from "../quantity/labelText.ts";
import { MOST_CURVES } from "./measures.ts";

/** What the temperature plot shows, in words: each conformer at the lowest, the own and the highest temperature. */
export function describeTemperatures(dossier: Dossier): string {
  const rows = dossier.temperatures;
  const own = rows.find((row) => row.temperature_K === dossier.conditions.temperature_K);
  const shown = [...new Set([rows[0], own, rows.at(-1)])].filter((row) => row !== undefined);
  const sentences = dossier.conformers.slice(0, MOST_CURVES).map((conformer) => {
    const values = shown.flatMap((row) => {
      const found = row.populations.find((each) => each.conformer === conformer.id);
      if (found === undefined) return [];
      return [
        `${formatPopulation(found.population, found.population95)} at ${formatTemperature(row.temperature_K)}`,
      ];
    });
    const label = conformer.label === "" ? "" : ` (${labelText(conformer.label)})`;
    return `Conformer ${conformer.id}${label}: ${values.join(", ")}.`;
  });
  return ["Populations against temperature, with 95 % intervals.", ...sentences].join(" ");
}
