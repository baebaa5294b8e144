import { type Command, EXIT } from "./Command.ts";
import { progress } from "./progress.ts";
import { count, report } from "./report.ts";

export const check: Command = {
  name: "check",
  summary: "analyse everything and report problems, writing nothing",
  details:
    "Does all that build does except writing: reads, analyses, and reports every problem with file, line and column.\n" +
    "The last line counts compounds and what a reviewer still has to look at.",
  options: [{ name: "content", value: "DIR", fallback: "content", help: "folder with the Markdown files" }],
  run: async ({ options }, io) => {
    const { loadCollection } = await import("../site/loadCollection.ts");
    const { sitePages } = await import("../site/pages/sitePages.ts");
    const shown = progress(io);
    const collection = await loadCollection(options["content"]!, (done, total) =>
      shown("analysed", done, total),
    );
    const diagnostics = [...collection.diagnostics, ...sitePages(collection).diagnostics];
    const { errors, cautions } = report(diagnostics, io);
    const dossiers = collection.series.flatMap((series) => series.dossiers);
    const alerts = (severity: string) =>
      dossiers.reduce(
        (sum, dossier) => sum + dossier.alerts.filter((alert) => alert.severity === severity).length,
        0,
      );
    io.output.write(
      `${count(dossiers.length, "compound")} in ${collection.series.length} series; ${count(errors, "error")}, ` +
        `${count(cautions, "caution")} in the files; in the dossiers ${alerts("stop")} stop, ${alerts("caution")} caution, ${alerts("note")} note\n`,
    );
    return errors > 0 ? EXIT.contentErrors : EXIT.done;
  },
};
