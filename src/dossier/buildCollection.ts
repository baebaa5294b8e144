import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { compareDiagnostics } from "../diagnostics/printDiagnostic.ts";
import type { Services } from "./analysis/Services.ts";
import { buildDossier } from "./buildDossier.ts";
import type { Collection } from "./Collection.ts";
import type { ContentInput } from "./content/CompoundInput.ts";
import type { Dossier } from "./Dossier.ts";

/**
 * Analyses every compound of a content folder.
 * @param onProgress - told after each compound how many of how many are done (dimensionless counts).
 */
export function buildCollection(
  content: ContentInput,
  services: Services,
  onProgress?: (done: number, total: number) => void,
): Collection {
  const diagnostics: Diagnostic[] = [...content.diagnostics];
  const dossiers: Dossier[] = [];
  content.compounds.forEach((compound, index) => {
    const built = buildDossier(compound, services);
    diagnostics.push(...built.diagnostics);
    if (built.dossier !== null) dossiers.push(built.dossier);
    onProgress?.(index + 1, content.compounds.length);
  });
  return {
    folder: folderOf(content),
    title: content.title,
    prose: content.prose,
    series: content.series.map((series) => ({
      slug: series.slug,
      title: series.title,
      summary: series.summary,
      notice: series.notice,
      prose: series.prose,
      dossiers: dossiers.filter((dossier) => dossier.series === series.slug).sort(byCode),
    })),
    register: services.register,
    program: services.program,
    diagnostics: diagnostics.sort(compareDiagnostics),
  };
}

/** What stands before every file's own path in messages. */
function folderOf(content: ContentInput): string {
  const file = (content.compounds[0] ?? content.series[0])?.file;
  return file === undefined ? "content/" : file.shownPath.slice(0, file.shownPath.length - file.path.length);
}

/** Codes in reading order: runs of digits compare as numbers, the rest by code units. */
function byCode(a: Dossier, b: Dossier): number {
  const parts = (code: string) => code.match(/\d+|\D+/g) ?? [];
  const [x, y] = [parts(a.code), parts(b.code)];
  for (let i = 0; i < Math.min(x.length, y.length); i++) {
    const difference = Number(x[i]) - Number(y[i]);
    if (Number.isFinite(difference) && difference !== 0) return difference;
    if (x[i] !== y[i]) return x[i]! < y[i]! ? -1 : 1;
  }
  return x.length - y.length;
}
