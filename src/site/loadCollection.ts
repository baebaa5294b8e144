import { compareDiagnostics } from "../diagnostics/printDiagnostic.ts";
import { buildCollection } from "../dossier/buildCollection.ts";
import type { Collection } from "../dossier/Collection.ts";
import { readContent } from "../dossier/content/readContent.ts";
import { loadServices } from "./loadServices.ts";
import { readContentFolder } from "./readContentFolder.ts";

/**
 * Reads and analyses a content folder. Every problem is a diagnostic of the collection; none is thrown.
 * @param folder - path of the content folder, absolute or relative to the working folder.
 */
export async function loadCollection(
  folder: string,
  onProgress?: (done: number, total: number) => void,
): Promise<Collection> {
  const services = await loadServices({ mechanics: true });
  const { files, attached, problems } = await readContentFolder(folder);
  const content = readContent(files, attached, services.register);
  const collection = buildCollection(content, services, onProgress);
  const diagnostics = [...problems, ...collection.diagnostics];
  const empty = content.compounds.length === 0 && !diagnostics.some(({ severity }) => severity === "error");
  if (empty) {
    diagnostics.push({
      code: "no-compounds",
      severity: "error",
      place: { file: folder, line: 1, column: 1 },
      message:
        `The folder holds no compound. Put one Markdown file per compound under ${folder}/series/<series>/, ` +
        'beginning with front matter that gives "code", "name" and "structure"; README.md shows one.',
    });
  }
  return { ...collection, diagnostics: diagnostics.sort(compareDiagnostics) };
}
