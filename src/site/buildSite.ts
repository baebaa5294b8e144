import { existsSync, mkdirSync, mkdtempSync, readdirSync, renameSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import type { Collection } from "../dossier/Collection.ts";
import { startEleventy } from "./startEleventy.ts";

/** Marks a folder as written by this program, so that it may be replaced. */
export const SITE_MARK = ".ringfolio-site";

export type BuildResult =
  | {
      readonly ok: true;
      readonly diagnostics: readonly Diagnostic[];
      readonly dossiers: number;
      readonly pages: number;
    }
  | { readonly ok: false; readonly diagnostics: readonly Diagnostic[] };

/** A folder that must not be replaced, said in words for the person who named it. */
export class OutputRefused extends Error {}

/**
 * Writes the site into a new folder beside `output` and puts it in its place only when everything is well. With any
 * error, whatever stood at `output` before is left byte for byte as it was.
 * @throws OutputRefused when `output` is not a folder that this program may replace.
 */
export async function buildSite(options: {
  readonly content: string;
  readonly output: string;
  readonly onProgress?: (done: number, total: number) => void;
}): Promise<BuildResult> {
  const output = path.resolve(options.output);
  const content = path.resolve(options.content);
  checkOutput(output, content);
  mkdirSync(path.dirname(output), { recursive: true });
  const fresh = mkdtempSync(path.join(path.dirname(output), ".build-"));
  const leftovers = [fresh];
  const clean = () => {
    for (const folder of leftovers) rmSync(folder, { recursive: true, force: true });
  };
  const interrupted = () => {
    clean();
    process.exit(130);
  };
  process.once("SIGINT", interrupted);
  process.once("SIGTERM", interrupted);
  try {
    let diagnostics: readonly Diagnostic[] = [];
    let collection: Collection | undefined;
    let pages = 0;
    const { eleventy, input } = startEleventy(fresh, "build", {
      content: options.content,
      onDiagnostics: (found, analysed) => {
        diagnostics = found;
        collection = analysed;
        // Nothing is rendered when the site will not be published.
        return found.every(({ severity }) => severity !== "error");
      },
      finish: (text) => {
        pages += 1;
        return text;
      },
      ...(options.onProgress === undefined ? {} : { onProgress: options.onProgress }),
    });
    leftovers.push(input);
    await eleventy.write();
    if (diagnostics.some(({ severity }) => severity === "error")) return { ok: false, diagnostics };
    writeFileSync(path.join(fresh, SITE_MARK), "Written by ringfolio; replaced by its next build.\n");
    swap(fresh, output);
    const dossiers = collection?.series.reduce((sum, series) => sum + series.dossiers.length, 0) ?? 0;
    return { ok: true, diagnostics, dossiers, pages };
  } finally {
    process.removeListener("SIGINT", interrupted);
    process.removeListener("SIGTERM", interrupted);
    clean();
  }
}

function checkOutput(output: string, content: string): void {
  const inside = (inner: string, outer: string) => inner === outer || inner.startsWith(outer + path.sep);
  if (inside(content, output))
    throw new OutputRefused(`The output folder ${output} holds the content folder; choose another.`);
  if (inside(output, content))
    throw new OutputRefused(`The output folder ${output} lies inside the content folder; choose another.`);
  if (!existsSync(output)) return;
  const names = readdirSync(output);
  if (names.length > 0 && !names.includes(SITE_MARK)) {
    throw new OutputRefused(
      `The folder ${output} is not empty and was not written by ringfolio; choose another or empty it yourself.`,
    );
  }
}

/** Two renames: a reader may miss the folder for an instant and never sees half of it. */
function swap(fresh: string, output: string): void {
  const old = `${fresh}.old`;
  if (existsSync(output)) renameSync(output, old);
  renameSync(fresh, output);
  rmSync(old, { recursive: true, force: true });
}
