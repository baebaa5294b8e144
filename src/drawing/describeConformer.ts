import type { Conformer, Dossier } from "../dossier/Dossier.ts";
import { formatPopulation } from "../quantity/formatPopulation.ts";
import { labelText } from "../quantity/labelText.ts";

/** A conformer in plain words, from the record: shape of each ring, place of each group, population. */
export function describeConformer(dossier: Dossier, conformer: Conformer): string {
  const rings = dossier.rings.map((ring, index) => {
    const places = conformer.positions
      .filter((position) => position.ring === ring.index)
      .sort((a, b) => Number.parseInt(a.locant, 10) - Number.parseInt(b.locant, 10))
      .map(
        (position) =>
          `${labelText(position.group)} ${position.pseudo ? "pseudo" : ""}${position.orientation} at ${position.locant}`,
      );
    const groups = places.length === 0 ? "no groups" : listed(places);
    const form = conformer.rings.find((each) => each.ring === ring.index)?.form ?? "chair";
    const name =
      dossier.rings.length > 1 ? `ring ${index + 1}, ${ring.parent}, ${form}` : `${ring.parent} ${form}`;
    return `${name}: ${groups}`;
  });
  return `Conformer ${conformer.id}: ${rings.join("; ")}. Population ${formatPopulation(conformer.population, conformer.population95)}.`;
}

function listed(parts: readonly string[]): string {
  const last = parts.at(-1) ?? "";
  return parts.length < 2 ? last : `${parts.slice(0, -1).join(", ")} and ${last}`;
}
