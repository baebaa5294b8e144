import { type Command, EXIT } from "./Command.ts";

export const schema: Command = {
  name: "schema",
  summary: "print the JSON Schema of content files or of the batch command",
  details:
    "Prints JSON Schema (2020-12): of the front matter of a compound, a series or the site, or of all three in one, for\n" +
    "editors that check and complete YAML; or of the lines that analyse reads and writes.",
  argument: {
    name: "what",
    allowed: ["compound", "series", "site", "all", "analyse-input", "analyse-output"],
    fallback: "compound",
  },
  options: [],
  run: async ({ argument }, io) => {
    io.output.write(`${JSON.stringify(await schemaOf(argument), null, 2)}\n`);
    return EXIT.done;
  },
};

async function schemaOf(what: string): Promise<unknown> {
  if (what === "analyse-input" || what === "analyse-output") {
    const { analyseJsonSchema } = await import("../dossier/analyseSchema.ts");
    return analyseJsonSchema(what === "analyse-input" ? "input" : "output");
  }
  const { contentJsonSchema } = await import("../dossier/content/contentJsonSchema.ts");
  const { readRegister } = await import("../site/readRegister.ts");
  const { anyOf, ...rest } = contentJsonSchema(readRegister());
  return what === "all" ? { ...rest, anyOf } : { ...rest, $ref: `#/$defs/${what}` };
}
