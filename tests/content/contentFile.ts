import type { ContentFile } from "../../src/dossier/content/CompoundInput.ts";

/** A content file made of text, as if read from disk. */
export function contentFile(text: string, path = "series/tern/tn-01.md"): ContentFile {
  return { path, shownPath: `content/${path}`, text, sha256: "" };
}
