import { mkdtempSync, rmSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import type { EleventyConfig } from "@11ty/eleventy";
import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import type { SitePage } from "./pages/SitePage.ts";
import type { FoundSite, PageFailure } from "./plugin.ts";
import { problemPage, withProblemBanner } from "./problemBanner.ts";
import { startEleventy } from "./startEleventy.ts";

export interface RunningServer {
  readonly url: string;
  readonly stop: () => Promise<void>;
}

export interface ServeOptions {
  readonly content: string;
  /** TCP port to begin with; the next free one is taken when it is in use. */
  readonly port: number;
  /** Told after every analysis, with an empty list when all is well. */
  readonly onDiagnostics: (diagnostics: readonly Diagnostic[]) => void;
  /** Told of a page that could not be made: a fault of the program, shown in its place. */
  readonly onFailure: (failure: PageFailure) => void;
}

/**
 * Serves the site from a folder of its own and rebuilds it when the content changes; `_site/` is never touched.
 * Errors are handed to `onDiagnostics` and shown on top of every page: what can be read is shown as it is now, and
 * pages that cannot be made any more are kept as they were last.
 */
export async function serveSite(options: ServeOptions): Promise<RunningServer> {
  const output = mkdtempSync(path.join(os.tmpdir(), "ringfolio-serve-"));
  const memory = new LastGoodPages();
  let problems: readonly Diagnostic[] = [];
  let url = "";
  const { eleventy, input } = startEleventy(
    output,
    "serve",
    { content: options.content },
    {
      choosePages: (found) => {
        problems = found.diagnostics;
        options.onDiagnostics(problems);
        return memory.choose(found);
      },
      finish: (text, page) => {
        memory.keep(page.path, text);
        return page.path.endsWith(".html") ? allowReload(withProblemBanner(text, problems)) : text;
      },
      onFailure: (failure) => {
        options.onFailure(failure);
        const { error } = failure;
        return problemPage(
          `${failure.path} could not be made`,
          error instanceof Error ? (error.stack ?? error.message) : String(error),
        );
      },
    },
    (config) => {
      config.setServerOptions({
        showAllHosts: false,
        domDiff: false,
        messageOnStart: () => false,
        middleware: [refuseOtherMachines],
        ready: (server: { getServerUrl(host: string): string }) => {
          url = server.getServerUrl("localhost");
        },
      });
      removeGonePages(config);
    },
  );
  const clean = () => {
    for (const folder of [output, input]) rmSync(folder, { recursive: true, force: true });
  };
  // A rebuild under way when the server stops writes on; its files go when the process does.
  process.once("exit", clean);
  try {
    await eleventy.init();
    const rebuild = await eleventy.watch();
    rebuildOnDeletion(eleventy, rebuild);
    await eleventy.serve(options.port);
  } catch (error) {
    clean();
    throw error;
  }
  return {
    url,
    stop: async () => {
      await eleventy.stopWatch();
      clean();
    },
  };
}

/** Keeps the last text of every page, so that a mistake never takes away the page an author is reading. */
class LastGoodPages {
  private readonly texts = new Map<string, string>();

  keep(path: string, text: string): void {
    this.texts.set(path, text);
  }

  /** The pages of now; while there are errors, also those of before that are missing. */
  choose({ pages, diagnostics }: FoundSite): readonly SitePage[] {
    const now = new Set(pages.map((page) => page.path));
    if (!diagnostics.some(({ severity }) => severity === "error")) {
      for (const path of [...this.texts.keys()]) if (!now.has(path)) this.texts.delete(path);
      return pages;
    }
    const kept = [...this.texts].filter(([path]) => !now.has(path));
    const old = kept.map(([path, text]) => ({ path, render: () => text }));
    const hasHome = now.has("index.html") || this.texts.has("index.html");
    const home = { path: "index.html", render: () => problemPage("There is no site yet", "") };
    return [...pages, ...old, ...(hasHome ? [] : [home])];
  }
}

/** Pages of the site may connect to nothing; while served they listen to the server for the next build. */
function allowReload(text: string): string {
  return text.replace(/(content="default-src (?:'|&#39;)none(?:'|&#39;);)/, "$1 connect-src 'self';");
}

/** A compound that is gone takes its pages with it. */
function removeGonePages(config: EleventyConfig): void {
  let written = new Set<string>();
  config.on("eleventy.after", ({ results }: { results: readonly { outputPath: string }[] }) => {
    const now = new Set(results.map((result) => result.outputPath));
    for (const gone of written) if (!now.has(gone)) rmSync(gone, { force: true });
    written = now;
  });
}

/** Eleventy 3.1 ignores deleted files; its watcher (an undocumented property) tells of them. */
function rebuildOnDeletion(
  eleventy: { readonly watcher?: { on(event: string, handler: (path: string) => void): void } },
  rebuild: (path: string) => Promise<void>,
): void {
  eleventy.watcher?.on("unlink", (file) => void rebuild(file));
}

/** The server listens on every address of the machine; unpublished work is shown on the machine itself only. */
function refuseOtherMachines(
  request: { readonly socket: { readonly remoteAddress?: string } },
  response: { writeHead(status: number, headers: Record<string, string>): void; end(text: string): void },
  next: () => void,
): void {
  const from = request.socket.remoteAddress ?? "";
  if (/^(::1$|127\.|::ffff:127\.)/.test(from)) {
    next();
    return;
  }
  response.writeHead(403, { "content-type": "text/plain; charset=utf-8" });
  response.end("ringfolio serve answers on its own machine only.\n");
}
