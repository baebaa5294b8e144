import type { Column } from "../TableModel.ts";

/** A column of energies in both units. */
export function energyColumn(key: string, title: string, description?: string): Column {
  return {
    key,
    title,
    unit: "kJ/mol (kcal/mol)",
    align: "right",
    numbers: [`${title} / kJ/mol`, `${title} / kcal/mol`],
    ...(description === undefined ? {} : { description }),
  };
}
