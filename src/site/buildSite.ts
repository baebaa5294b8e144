import {
  chmodSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from "node:fs";
import path from "node:path";
import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { checkOutput, SITE_MARK } from "./checkOutput.ts";
import { OutputRefused } from "./OutputRefused.ts";
import type { FoundSite, Progress } from "./plugin.ts";
import { startEleventy } from "./startEleventy.ts";

export type BuildResult =
  | {
      readonly ok: true;
      readonly diagnostics: readonly Diagnostic[];
      /** Numbers of dossiers and of HTML pages. */
      readonly dossiers: number;
      readonly pages: number;
    }
  | { readonly ok: false; readonly diagnostics: readonly Diagnostic[] };

/** Faults of the place that was asked for rather than of the program. */
const FAULTS_OF_THE_PLACE = ["EACCES", "EPERM", "EROFS", "EBUSY", "ENOTDIR", "EXDEV", "ENOSPC"];

/**
 * Writes the site into a new folder beside `output` and puts it in its place only when everything is well. With any
 * error, whatever stood at `output` before is left byte for byte as it was.
 * @throws OutputRefused when `output` is not a folder that this program may replace or can write.
 */
export async function buildSite(options: {
  readonly content: string;
  readonly output: string;
  readonly onProgress?: Progress;
}): Promise<BuildResult> {
  const leftovers: string[] = [];
  const clean = () => {
    for (const left of leftovers) rmSync(left, { recursive: true, force: true });
  };
  const interrupted = () => {
    clean();
    process.exit(130);
  };
  process.once("SIGINT", interrupted);
  process.once("SIGTERM", interrupted);
  try {
    const { folder, foreign } = checkOutput(options.output, options.content);
    const fresh = freshFolder(folder, leftovers);
    const found: FoundSite = await write(fresh, options, foreign, leftovers);
    const { diagnostics, collection, pages } = found;
    if (hasErrors(diagnostics)) return { ok: false, diagnostics };
    // Mistakes in the content are told first, so that one run tells as much as it can.
    if (foreign !== null) throw new OutputRefused(foreign);
    writeFileSync(path.join(fresh, SITE_MARK), "Written by ringfolio; replaced by its next build.\n");
    swap(fresh, folder);
    return {
      ok: true,
      diagnostics,
      dossiers: collection.series.reduce((sum, series) => sum + series.dossiers.length, 0),
      pages: pages.filter((page) => page.path.endsWith(".html")).length,
    };
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code ?? "";
    if (!FAULTS_OF_THE_PLACE.includes(code)) throw error;
    throw new OutputRefused(`The site cannot be written to ${options.output}: ${(error as Error).message}.`);
  } finally {
    process.removeListener("SIGINT", interrupted);
    process.removeListener("SIGTERM", interrupted);
    clean();
  }
}

/** Runs Eleventy into `fresh`. Nothing is rendered when the site will not be published. */
async function write(
  fresh: string,
  options: { readonly content: string; readonly onProgress?: Progress },
  foreign: string | null,
  leftovers: string[],
): Promise<FoundSite> {
  let found: FoundSite | undefined;
  const { eleventy, input } = startEleventy(
    fresh,
    "build",
    { content: options.content },
    {
      choosePages: (site) => {
        found = site;
        return hasErrors(site.diagnostics) || foreign !== null ? [] : site.pages;
      },
      ...(options.onProgress === undefined ? {} : { onProgress: options.onProgress }),
    },
  );
  leftovers.push(input);
  await eleventy.write();
  if (found === undefined) throw new Error("Eleventy finished without asking for pages");
  return found;
}

function hasErrors(diagnostics: readonly Diagnostic[]): boolean {
  return diagnostics.some(({ severity }) => severity === "error");
}

/** A new folder beside the output: on the same disk, so that it can be put in place by renaming. */
function freshFolder(folder: string, leftovers: string[]): string {
  let beside = path.dirname(folder);
  while (!existsSync(beside)) beside = path.dirname(beside);
  const fresh = mkdtempSync(path.join(beside, ".build-"));
  leftovers.push(fresh);
  return fresh;
}

/** Two renames: a reader may miss the folder for an instant and never sees half of it. */
function swap(fresh: string, folder: string): void {
  const old = `${fresh}.old`;
  const replaces = existsSync(folder);
  mkdirSync(path.dirname(folder), { recursive: true });
  // A temporary folder is closed to other users; a site is as open as the one before it, or as any new folder.
  chmodSync(fresh, replaces ? statSync(folder).mode : 0o777 & ~process.umask());
  if (replaces) renameSync(folder, old);
  try {
    renameSync(fresh, folder);
  } catch (error) {
    if (replaces) renameSync(old, folder);
    throw error;
  }
  rmSync(old, { recursive: true, force: true });
}
