import type { Writable } from "node:stream";
import { type Command, EXIT } from "./Command.ts";
import { splitLines } from "./splitLines.ts";

/** Characters kept of one line: more than any line that is accepted, so that a longer one is refused as such. */
const LONGEST_LINE = 1_000_000;

export const analyse: Command = {
  name: "analyse",
  summary: "answer JSON lines on standard input with JSON lines",
  details:
    'Reads one JSON object a line, {"id": "x1", "smiles": "C[C@H]1CC[C@@H](O)CC1", "temperature_K": 298.15,\n' +
    '"solvent": "CDCl3"} (the last two optional), and writes one JSON object a line, in order. A bad line is answered\n' +
    "with an error and does not stop the rest; the exit code is 0 all the same. It is the same analysis as the site's.\n" +
    '"ringfolio schema analyse-input" and "ringfolio schema analyse-output" print the JSON Schema of both sides.',
  options: [
    {
      name: "mechanics",
      help: "also relax every conformer: adds xyz, and twist-boats where no chair is good",
    },
  ],
  run: async ({ options }, io) => {
    const { loadServices } = await import("../site/loadServices.ts");
    const { analyseLine } = await import("../dossier/analyseLine.ts");
    const services = await loadServices({ mechanics: options["mechanics"] === "true" });
    const writeLine = lineWriter(io.output);
    for await (const line of splitLines(io.input, LONGEST_LINE)) {
      if (!(await writeLine(analyseLine(line, services)))) break;
    }
    return EXIT.done;
  },
};

/** Writes lines no faster than they are read; the returned promise is false once nobody reads any more. */
function lineWriter(output: Writable): (line: string) => Promise<boolean> {
  let closed = false;
  let wake = () => {};
  const close = () => {
    closed = true;
    wake();
  };
  output.on("error", close).on("close", close);
  output.on("drain", () => wake());
  return async (line) => {
    if (closed) return false;
    const mayGoOn = output.write(`${line}\n`);
    if (!mayGoOn && !closed) {
      await new Promise<void>((resolve) => {
        wake = resolve;
      });
    }
    return !closed;
  };
}
