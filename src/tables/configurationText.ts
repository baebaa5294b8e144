import type { Dossier } from "../dossier/Dossier.ts";
import { descriptorsText } from "./descriptorsText.ts";

/**
 * The relative configuration in words: `cis-1,3` for every ring pair, else the stereodescriptors,
 * else a dash for a compound without stereocentres.
 */
export function configurationText(dossier: Dossier): string {
  const pairs = dossier.rings.flatMap(({ configuration }) =>
    configuration.map(({ locants, relation }) => `${relation}-${locants.join(",")}`),
  );
  return pairs.length > 0 ? pairs.join("; ") : descriptorsText(dossier.identity);
}
