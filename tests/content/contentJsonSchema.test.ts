import { describe, expect, it } from "vitest";
import * as z from "zod";
import { contentJsonSchema } from "../../src/dossier/content/contentJsonSchema.ts";
import { SMALL_REGISTER } from "./smallRegister.ts";

type Schema = { [key: string]: unknown } & {
  description?: string;
  properties?: Record<string, Schema>;
  items?: Schema;
  anyOf?: Schema[];
  additionalProperties?: unknown;
};
const schema = contentJsonSchema(SMALL_REGISTER) as {
  $schema: string;
  $defs: Record<"compound" | "series" | "site", Schema>;
};
const accepts = (name: "compound" | "series" | "site", value: unknown) =>
  z.fromJSONSchema(schema.$defs[name] as never).safeParse(value).success;

describe("the JSON Schema for editors", () => {
  it("is of the 2020-12 dialect (source: JSON Schema Core 2020-12, section 8.1.1)", () => {
    expect(schema.$schema).toBe("https://json-schema.org/draft/2020-12/schema");
  });

  it("describes every key but locants and faces, and allows no others", () => {
    const silent: string[] = [];
    const visit = (part: Schema, path: string) => {
      for (const [key, inner] of Object.entries(part.properties ?? {})) {
        if (inner.description === undefined) silent.push(`${path}.${key}`);
        visit(inner, `${path}.${key}`);
      }
      if (part.properties !== undefined && part.additionalProperties !== false)
        silent.push(`${path} is open`);
      if (part.items !== undefined && !Array.isArray(part.items)) visit(part.items, `${path}[]`);
      for (const branch of part.anyOf ?? []) visit(branch, path);
    };
    for (const [name, part] of Object.entries(schema.$defs)) visit(part, name);
    expect(silent).toEqual([]);
  });

  it("accepts what the reader accepts and refuses what it refuses", () => {
    const compound = {
      code: "TN-01",
      name: "x",
      structure: { ring: "oxane", groups: { 2: { up: "Me" } } },
      conditions: { temperature: "298.15 K", solvent: "CDCl3" },
    };
    expect(accepts("compound", compound)).toBe(true);
    expect(accepts("compound", { ...compound, structure: "C1CCCCC1" })).toBe(true);
    expect(accepts("compound", { ...compound, nmae: "x" })).toBe(false);
    expect(accepts("compound", { ...compound, structure: { ring: "oxan" } })).toBe(false);
    expect(accepts("compound", { ...compound, conditions: { temperature: 298 } })).toBe(false);
    expect(
      accepts("compound", { ...compound, structure: { ring: "oxane", groups: { 7: { up: "Me" } } } }),
    ).toBe(false);
    expect(accepts("series", { title: "x", defaults: { stereoisomers: "enumerate" } })).toBe(true);
    expect(accepts("series", { defaults: {} })).toBe(false);
    expect(accepts("site", { title: "x" })).toBe(true);
  });

  it("offers the register's groups, rings and solvents by every spelling", () => {
    const text = JSON.stringify(schema);
    for (const word of ["t-Bu", "tBu", "methoxy", "tetrahydropyran", "chloroform-d"])
      expect(text).toContain(`"${word}"`);
  });
});
