import { type Command, EXIT } from "./Command.ts";
import { report } from "./report.ts";

export const serve: Command = {
  name: "serve",
  summary: "show the site while you write, rebuilt on every save",
  details:
    "Builds the site into a folder of its own and serves it on this machine; pages reload when a content file is\n" +
    "saved. Problems are printed here and shown on top of every page until they are mended. Stop it with Ctrl-C.",
  options: [
    { name: "content", value: "DIR", fallback: "content", help: "folder with the Markdown files" },
    {
      name: "port",
      value: "N",
      fallback: "8080",
      help: "port to serve on; the next free one when it is in use",
    },
  ],
  run: async ({ options }, io) => {
    const port = Number(options["port"]);
    if (!Number.isInteger(port) || port < 1 || port > 65535) {
      io.errors.write(
        `ringfolio: "${options["port"]}" is not a port; give a whole number from 1 to 65535.\n`,
      );
      return EXIT.wrongUse;
    }
    const stopped = new Promise<void>((resolve) => {
      process.once("SIGINT", resolve);
      process.once("SIGTERM", resolve);
    });
    const { serveSite } = await import("../site/serveSite.ts");
    let builds = 0;
    const running = await serveSite({
      content: options["content"]!,
      port,
      onDiagnostics: (diagnostics) => {
        const { errors } = report(diagnostics, io);
        builds += 1;
        if (errors > 0) io.errors.write("The pages show these errors until they are mended.\n");
        else if (builds > 1) io.errors.write("Site rebuilt.\n");
      },
      onFailure: ({ path, error }) => {
        io.errors.write(
          `ringfolio: ${path} could not be made: ${error instanceof Error ? error.message : String(error)}\n`,
        );
      },
    });
    io.output.write(`Serving ${running.url} (Ctrl-C stops)\n`);
    await stopped;
    await running.stop();
    return EXIT.done;
  },
};
