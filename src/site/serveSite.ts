import { existsSync, mkdtempSync, rmSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { withProblemBanner } from "./problemBanner.ts";
import { startEleventy } from "./startEleventy.ts";

export interface RunningServer {
  readonly url: string;
  readonly stop: () => Promise<void>;
}

/**
 * Serves the site from a folder of its own and rebuilds it when the content changes. Errors are handed to
 * `onDiagnostics` and shown on every page, above the pages of what could be read; `_site/` is never touched.
 * @param port - TCP port (dimensionless).
 */
export async function serveSite(options: {
  readonly content: string;
  readonly port: number;
  readonly onDiagnostics: (diagnostics: readonly Diagnostic[]) => void;
}): Promise<RunningServer> {
  const output = mkdtempSync(path.join(os.tmpdir(), "ringfolio-serve-"));
  let problems: readonly Diagnostic[] = [];
  let written = new Set<string>();
  const { eleventy, input } = startEleventy(
    output,
    "serve",
    {
      content: options.content,
      onDiagnostics: (found) => {
        problems = found;
        options.onDiagnostics(found);
        return true;
      },
      finish: (text, page) => (page.path.endsWith(".html") ? withProblemBanner(text, problems) : text),
    },
    (config) => {
      config.setServerOptions({ showAllHosts: false, domDiff: false, port: options.port });
      // A compound that is gone takes its pages with it.
      config.on("eleventy.after", ({ results }: { results: readonly { outputPath: string }[] }) => {
        const now = new Set(results.map((result) => result.outputPath));
        for (const gone of written) if (!now.has(gone)) rmSync(gone, { force: true });
        written = now;
      });
    },
  );
  await eleventy.init();
  const rebuild = await eleventy.watch();
  rebuildOnDeletion(eleventy, rebuild);
  await eleventy.serve(options.port);
  return {
    url: `http://localhost:${options.port}/`,
    stop: async () => {
      await eleventy.stopWatch();
      for (const folder of [output, input])
        if (existsSync(folder)) rmSync(folder, { recursive: true, force: true });
    },
  };
}

/** Eleventy 3.1 ignores deleted files; its watcher (an undocumented property) tells of them. */
function rebuildOnDeletion(
  eleventy: { readonly watcher?: { on(event: string, handler: (path: string) => void): void } },
  rebuild: (path: string) => Promise<void>,
): void {
  eleventy.watcher?.on("unlink", (file) => void rebuild(file));
}
