import type { EleventyConfig } from "@11ty/eleventy";
import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { printDiagnostic } from "../diagnostics/printDiagnostic.ts";
import type { Collection } from "../dossier/Collection.ts";
import { copyAssets } from "./copyAssets.ts";
import { loadCollection } from "./loadCollection.ts";
import type { SitePage } from "./pages/SitePage.ts";
import { sitePages } from "./pages/sitePages.ts";

export interface RingfolioOptions {
  /** Content folder, relative to the working folder; `content` when absent. */
  readonly content?: string;
  /**
   * Receives every problem before pages are written and says whether to write them. When absent, errors are thrown
   * together, so that a team's own Eleventy build fails with all of them.
   */
  readonly onDiagnostics?: (diagnostics: readonly Diagnostic[], collection: Collection) => boolean;
  /** Changes a page's finished text; the live server uses it to show problems. */
  readonly finish?: (text: string, page: SitePage) => string;
  readonly onProgress?: (done: number, total: number) => void;
}

/**
 * The Eleventy plugin: analyses a content folder before each build and adds the dossier site as one paginated
 * function template. Eleventy never reads the content folder itself, so nothing in it can be executed.
 */
export function ringfolioPlugin(config: EleventyConfig, options: RingfolioOptions = {}): void {
  const folder = options.content ?? "content";
  let pages: readonly SitePage[] = [];
  config.on("eleventy.before", async () => {
    const collection = await loadCollection(folder, options.onProgress);
    const site = sitePages(collection);
    const diagnostics = [...collection.diagnostics, ...site.diagnostics];
    pages = site.pages;
    if (options.onDiagnostics !== undefined) {
      if (!options.onDiagnostics(diagnostics, collection)) pages = [];
      return;
    }
    const errors = diagnostics.filter(({ severity }) => severity === "error");
    if (errors.length > 0) {
      throw new Error(
        `ringfolio found ${errors.length} error(s):\n${errors.map(printDiagnostic).join("\n")}`,
      );
    }
  });
  config.addGlobalData("ringfolioPages", () => pages);
  config.addTemplate(
    "ringfolio.11ty.js",
    ({ ringfolioPage }: { ringfolioPage: SitePage }) => {
      const text = ringfolioPage.render();
      return options.finish === undefined ? text : options.finish(text, ringfolioPage);
    },
    {
      pagination: {
        data: "ringfolioPages",
        size: 1,
        alias: "ringfolioPage",
        addAllPagesToCollections: false,
      },
      permalink: ({ ringfolioPage }: { ringfolioPage: SitePage }) => ringfolioPage.path,
      eleventyExcludeFromCollections: true,
      layout: null,
    },
  );
  config.on("eleventy.after", async ({ directories }: { directories: { output: string } }) => {
    await copyAssets(directories.output);
  });
  config.addWatchTarget(folder);
}
