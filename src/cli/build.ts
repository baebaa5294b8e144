import { type Command, EXIT } from "./Command.ts";
import { progress } from "./progress.ts";
import { count, report } from "./report.ts";

export const build: Command = {
  name: "build",
  summary: "write the dossier site",
  details:
    "Reads the content folder, analyses every compound and writes the site. The site is written beside the output\n" +
    "folder and put in its place at the end; with any error nothing is published and the old site stays as it was.\n" +
    "All problems of all files are reported in one run. The site opens from the folder, without a server.",
  options: [
    { name: "content", value: "DIR", fallback: "content", help: "folder with the Markdown files" },
    { name: "output", value: "DIR", fallback: "_site", help: "folder to write" },
  ],
  run: async ({ options }, io) => {
    const { buildSite, OutputRefused } = await import("../site/buildSite.ts");
    try {
      const result = await buildSite({
        content: options["content"]!,
        output: options["output"]!,
        onProgress: progress(io),
      });
      report(result.diagnostics, io);
      if (!result.ok) {
        io.errors.write(`Nothing was published; ${options["output"]} is as it was.\n`);
        return EXIT.contentErrors;
      }
      io.output.write(
        `${count(result.dossiers, "dossier")}, ${count(result.pages, "file")}: ${options["output"]}/index.html\n`,
      );
      return EXIT.done;
    } catch (error) {
      if (!(error instanceof OutputRefused)) throw error;
      io.errors.write(`ringfolio: ${error.message}\n`);
      return EXIT.wrongUse;
    }
  },
};
