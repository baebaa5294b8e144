import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import { compareDiagnostics } from "../../diagnostics/printDiagnostic.ts";
import type { Register } from "../../register/Register.ts";
import type { AttachedFile, CompoundInput, ContentFile, ContentInput, SeriesInput } from "./CompoundInput.ts";
import { contentSchema } from "./contentSchema.ts";
import { findDuplicates } from "./findDuplicates.ts";
import { type CompoundReading, readCompound } from "./readCompound.ts";
import { readSeries } from "./readSeries.ts";
import { readSite } from "./readSite.ts";
import { NO_DEFAULTS } from "./SeriesDefaults.ts";
import { titleFromSlug } from "./titleFromSlug.ts";
import { quote } from "./values/quote.ts";
import { slugOf } from "./values/slugOf.ts";
import { suggest } from "./values/suggest.ts";

const byPath = (a: { path: string }, b: { path: string }) => (a.path < b.path ? -1 : a.path > b.path ? 1 : 0);

/**
 * Everything a content folder says, and every problem of every file in one run. Pure: the files are given
 * as texts, and nothing in them is executed. The order of `files` makes no difference.
 */
export function readContent(
  files: readonly ContentFile[],
  attached: readonly AttachedFile[],
  register: Register,
): ContentInput {
  const schema = contentSchema(register);
  const diagnostics: Diagnostic[] = [];
  const folders = new Map<string, ContentFile[]>();
  let site: ContentFile | undefined;
  for (const file of [...files].sort(byPath)) {
    const segments = file.path.split("/");
    if (file.path === "index.md") site = file;
    else if (segments.length === 3 && segments[0] === "series") {
      folders.set(segments[1]!, [...(folders.get(segments[1]!) ?? []), file]);
    } else diagnostics.push(misplaced(file));
  }

  const home = readSite(site, schema);
  diagnostics.push(...home.diagnostics);
  const series: SeriesInput[] = [];
  const readings: CompoundReading[] = [];
  for (const [folder, members] of folders) {
    const slug = slugOf(folder);
    const index = members.find((file) => file.path.endsWith("/index.md"));
    if (slug !== folder) diagnostics.push(unsafeFolder(members[0]!, folder, slug));
    const reading = index === undefined ? undefined : readSeries(index, slug, schema);
    if (reading === undefined) diagnostics.push(seriesWithoutFile(members[0]!, folder));
    else diagnostics.push(...reading.diagnostics);
    series.push(reading?.series ?? bareSeries(members[0]!, slug));
    for (const file of members) {
      if (file === index) continue;
      readings.push(readCompound(file, slug, reading?.defaults ?? NO_DEFAULTS, attached, schema));
    }
  }
  diagnostics.push(...readings.flatMap((reading) => reading.diagnostics), ...findDuplicates(readings));
  return {
    title: home.title,
    prose: home.prose,
    series,
    compounds: readings
      .map(({ compound }) => compound)
      .filter((compound): compound is CompoundInput => compound !== null),
    diagnostics: diagnostics.sort(compareDiagnostics),
  };
}

const start = (file: ContentFile) => ({ file: file.shownPath, line: 1, column: 1 });

function misplaced(file: ContentFile): Diagnostic {
  return {
    code: "misplaced-file",
    severity: "caution",
    place: start(file),
    message:
      "This file is not read. Compounds are series/<series>/<name>.md, a series is series/<series>/index.md, the site is index.md.",
  };
}

function unsafeFolder(file: ContentFile, folder: string, slug: string): Diagnostic {
  return {
    code: "unsafe-folder-name",
    severity: "error",
    place: start(file),
    message: `The folder name ${quote(folder)} becomes part of addresses; it holds lower-case letters, digits and single hyphens only.`,
    ...(slug === "" ? suggest(folder, []) : { suggestion: slug }),
  };
}

function seriesWithoutFile(file: ContentFile, folder: string): Diagnostic {
  return {
    code: "missing-series-file",
    severity: "caution",
    place: start(file),
    message: `The series folder ${quote(folder)} has no index.md, so its title is taken from the folder name and nothing is inherited.`,
  };
}

function bareSeries(file: ContentFile, slug: string): SeriesInput {
  const path = `series/${slug}/index.md`;
  const shownPath = file.shownPath.replace(/[^/]*$/, "index.md");
  return {
    file: { path, shownPath, text: "", sha256: "" },
    slug,
    title: titleFromSlug(slug),
    summary: "",
    notice: null,
    prose: { markdown: "", firstLine: 1 },
  };
}
