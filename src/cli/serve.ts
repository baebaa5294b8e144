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
    { name: "port", value: "N", fallback: "8080", help: "port to serve on" },
  ],
  run: async ({ options }, io) => {
    const port = Number(options["port"]);
    if (!Number.isInteger(port) || port < 1 || port > 65535) {
      io.errors.write(
        `ringfolio: "${options["port"]}" is not a port; give a whole number from 1 to 65535.\n`,
      );
      return EXIT.wrongUse;
    }
    const { serveSite } = await import("../site/serveSite.ts");
    const running = await serveSite({
      content: options["content"]!,
      port,
      onDiagnostics: (diagnostics) => {
        const { errors } = report(diagnostics, io);
        if (errors === 0) io.errors.write("site rebuilt\n");
      },
    });
    io.output.write(`serving ${running.url}\n`);
    await new Promise<void>((resolve) => {
      process.once("SIGINT", resolve);
      process.once("SIGTERM", resolve);
    });
    await running.stop();
    return EXIT.done;
  },
};
