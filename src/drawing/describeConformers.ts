import type { Dossier } from "../dossier/Dossier.ts";
import { conformerSentence } from "./conformerSentence.ts";
import { MOST_DRAWN } from "./measures.ts";
import { systemSentences } from "./systemSentences.ts";

/** All conformers in plain words, and how they are related. */
export function describeConformers(dossier: Dossier): string {
  const drawn = dossier.conformers.slice(0, MOST_DRAWN);
  const rest = dossier.conformers.length - drawn.length;
  const sentences = drawn.map((conformer) => conformerSentence(dossier, conformer));
  sentences.push(...systemSentences(dossier));
  if (dossier.relation === "identical") sentences.push("The two chairs are identical.");
  if (dossier.relation === "enantiomeric") sentences.push("The two chairs are mirror images of each other.");
  if (dossier.equilibria.some((each) => each.unresolved))
    sentences.push("The major conformer is unresolved.");
  if (rest > 0) sentences.push(`${rest} more of lower population ${rest === 1 ? "is" : "are"} not drawn.`);
  return sentences.join(" ");
}
