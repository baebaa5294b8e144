import type { Conformer, Dossier } from "../dossier/Dossier.ts";
import { conformerSentence } from "./conformerSentence.ts";
import { systemSentences } from "./systemSentences.ts";

/** A conformer in plain words, from the record: rings, groups, population, and how the rings are joined. */
export function describeConformer(dossier: Dossier, conformer: Conformer): string {
  return [conformerSentence(dossier, conformer), ...systemSentences(dossier)].join(" ");
}
