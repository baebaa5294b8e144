import type { SourceNote } from "../dossier/Dossier.ts";

const WORDS: Readonly<Record<SourceNote["standing"], string>> = {
  confirmed: "seen",
  "partly confirmed": "seen in part",
  memory: "from memory",
  none: "not a publication",
};

/** Whether the citation itself was seen, in words. */
export function citationStanding(standing: SourceNote["standing"]): string {
  return WORDS[standing];
}
