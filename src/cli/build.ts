import path from "node:path";
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
    const began = process.hrtime.bigint();
    const output = options["output"]!;
    const { buildSite } = await import("../site/buildSite.ts");
    const { OutputRefused } = await import("../site/OutputRefused.ts");
    try {
      const result = await buildSite({ content: options["content"]!, output, onProgress: progress(io) });
      report(result.diagnostics, io);
      if (!result.ok) {
        io.errors.write(`Nothing was published; ${output} is as it was.\n`);
        return EXIT.contentErrors;
      }
      // The time is of use to a person only, and would make two logs differ.
      const seconds = Number(process.hrtime.bigint() - began) / 1e9;
      const time = io.output.isTTY === true ? ` in ${seconds.toFixed(1)} s` : "";
      io.output.write(
        `${count(result.dossiers, "dossier")}, ${count(result.pages, "page")}${time}: ${path.join(output, "index.html")}\n`,
      );
      return EXIT.done;
    } catch (error) {
      if (!(error instanceof OutputRefused)) throw error;
      io.errors.write(`ringfolio: ${error.message}\n`);
      return EXIT.wrongUse;
    }
  },
};
