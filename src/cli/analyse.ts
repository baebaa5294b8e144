import { once } from "node:events";
import { createInterface } from "node:readline";
import { analyseLine } from "../dossier/analyseLine.ts";
import { loadServices } from "../site/loadServices.ts";
import { type Command, EXIT } from "./Command.ts";

export const analyse: Command = {
  name: "analyse",
  summary: "answer JSON lines on standard input with JSON lines",
  details:
    'Reads one JSON object a line, {"id": "x1", "smiles": "C[C@H]1CC[C@@H](O)CC1", "temperature_K": 298.15,\n' +
    '"solvent": "CDCl3"} (the last two optional), and writes one JSON object a line, in order. A bad line is answered\n' +
    'with an error and does not stop the rest. It is the same analysis as the site\'s. "ringfolio schema analyse-input"\n' +
    'and "ringfolio schema analyse-output" print the JSON Schema of both sides.',
  options: [],
  run: async (_given, io) => {
    const services = await loadServices();
    let broken = false;
    io.output.on("error", () => {
      broken = true;
    });
    const lines = createInterface({ input: io.input, crlfDelay: Number.POSITIVE_INFINITY });
    for await (const line of lines) {
      if (broken) break;
      if (!io.output.write(`${analyseLine(line, services)}\n`) && !broken) {
        await Promise.race([
          once(io.output, "drain"),
          once(io.output, "close"),
          once(io.output, "error"),
        ]).catch(() => {});
      }
    }
    return EXIT.done;
  },
};
