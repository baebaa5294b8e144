import type { EleventyConfig } from "@11ty/eleventy";
import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { printDiagnostic } from "../diagnostics/printDiagnostic.ts";
import type { Collection } from "../dossier/Collection.ts";
import { copyAssets } from "./copyAssets.ts";
import { loadCollection } from "./loadCollection.ts";
import type { SitePage } from "./pages/SitePage.ts";
import { sitePages } from "./pages/sitePages.ts";

/** What a team says when it adds the plugin to its own Eleventy project. */
export interface RingfolioOptions {
  /** Content folder, relative to the working folder; `content` when absent. */
  readonly content?: string;
  /** Folder of the output that receives the dossier site, e.g. `dossiers`; the output folder itself when absent. */
  readonly folder?: string;
  /** Receives every problem of every build; when absent they are printed. Errors fail the build either way. */
  readonly onDiagnostics?: (diagnostics: readonly Diagnostic[]) => void;
}

/** What the program's own commands do differently from a team's project. */
export interface SiteHooks {
  /** Which pages to write, given everything found; replaces the failing of the build on errors. */
  readonly choosePages?: (found: FoundSite) => readonly SitePage[];
  /** Changes a page's finished text; the live server uses it to show problems. */
  readonly finish?: (text: string, page: SitePage) => string;
  /** The text of a page that could not be made; when absent, all failures end the build together. */
  readonly onFailure?: (failure: PageFailure) => string;
  readonly onProgress?: Progress;
}

export interface FoundSite {
  readonly pages: readonly SitePage[];
  readonly diagnostics: readonly Diagnostic[];
  readonly collection: Collection;
}

export interface PageFailure {
  readonly path: string;
  readonly error: unknown;
}

/** Told how many of how many (dimensionless counts) are done; compounds first, then files. */
export type Progress = (stage: "analysed" | "written", done: number, total: number) => void;

/**
 * The Eleventy plugin: analyses a content folder before each build and adds the dossier site as one paginated
 * function template. Eleventy never reads the content folder itself, so nothing in it can be executed; other
 * templates and settings of the project are left alone.
 */
export function ringfolioPlugin(
  config: EleventyConfig,
  options: RingfolioOptions = {},
  hooks: SiteHooks = {},
): void {
  const content = options.content ?? "content";
  const folder = placeInOutput(options.folder ?? "");
  let pages: readonly SitePage[] = [];
  let failures: PageFailure[] = [];
  let done = 0;

  config.on("eleventy.before", async () => {
    failures = [];
    done = 0;
    const collection = await loadCollection(content, (n, total) => hooks.onProgress?.("analysed", n, total));
    const site = sitePages(collection);
    const diagnostics = [...collection.diagnostics, ...site.diagnostics];
    if (hooks.choosePages !== undefined) {
      pages = hooks.choosePages({ pages: site.pages, diagnostics, collection });
      return;
    }
    pages = site.pages;
    (options.onDiagnostics ?? printAll)(diagnostics);
    const errors = diagnostics.filter(({ severity }) => severity === "error").length;
    if (errors > 0) {
      throw new Error(
        `Ringfolio found ${errors} ${errors === 1 ? "error" : "errors"} in ${content}; nothing is published.`,
      );
    }
  });

  // A project that lists its formats would otherwise leave the plugin's own template out.
  config.addTemplateFormats("11ty.js");
  config.addGlobalData("ringfolioPages", () => pages);
  config.addTemplate(
    "ringfolio.11ty.js",
    ({ ringfolioPage: page }: { ringfolioPage: SitePage }) => {
      done += 1;
      hooks.onProgress?.("written", done, pages.length);
      try {
        const text = page.render();
        return hooks.finish === undefined ? text : hooks.finish(text, page);
      } catch (error) {
        // Eleventy would stop at the first page that throws; all of them are told together instead.
        const failure = { path: page.path, error };
        if (hooks.onFailure !== undefined) return hooks.onFailure(failure);
        failures.push(failure);
        return "";
      }
    },
    {
      pagination: {
        data: "ringfolioPages",
        size: 1,
        alias: "ringfolioPage",
        addAllPagesToCollections: false,
      },
      permalink: ({ ringfolioPage }: { ringfolioPage: SitePage }) => folder + ringfolioPage.path,
      eleventyExcludeFromCollections: true,
      layout: null,
    },
  );

  config.on("eleventy.after", async ({ directories }: { directories: { output: string } }) => {
    if (failures.length > 0) throw failedPages(failures);
    if (pages.length > 0) await copyAssets(directories.output + folder);
  });
  config.addWatchTarget(content);
}

function printAll(diagnostics: readonly Diagnostic[]): void {
  for (const diagnostic of diagnostics) console.error(`${printDiagnostic(diagnostic)}\n`);
}

/** `dossiers/` for `dossiers`; a folder that leads out of the output is a mistake of the configuration. */
function placeInOutput(folder: string): string {
  const names = folder.split("/").filter((name) => name !== "" && name !== ".");
  if (folder.startsWith("/") || names.includes("..")) {
    throw new Error(`The option "folder" must name a folder inside the output; "${folder}" leads out of it.`);
  }
  return names.map((name) => `${name}/`).join("");
}

function failedPages(failures: readonly PageFailure[]): Error {
  const lines = failures.map(
    ({ path, error }) => `  ${path}: ${error instanceof Error ? error.message : String(error)}`,
  );
  return new Error(`These files of the site could not be made:\n${lines.join("\n")}`, {
    cause: failures[0]?.error,
  });
}
