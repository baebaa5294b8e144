import * as z from "zod";
import type { Register } from "../../register/Register.ts";
import { evidenceSchema } from "./evidenceSchema.ts";
import { type FieldDescription, field } from "./field.ts";
import { describeFound } from "./values/describeFound.ts";
import { problem } from "./values/Reading.ts";
import { readCode } from "./values/readCode.ts";
import { readDate } from "./values/readDate.ts";
import { readTemperature } from "./values/readTemperature.ts";
import { readText } from "./values/readText.ts";
import { registerWords } from "./values/registerWords.ts";

/** Code words of the CIF core dictionary for how an absolute configuration was established. */
export const CLAIM_BASES = ["rm", "ad", "rmad", "syn", "unk"] as const;

export type ContentSchema = ReturnType<typeof contentSchema>;

/**
 * The one schema of all front matter: it checks what is read, types what follows, and is printed for
 * editors by `contentJsonSchema`. Group, ring and solvent words are those of the register.
 */
export function contentSchema(register: Register) {
  const words = registerWords(register);
  const text = (description: string, more: Partial<FieldDescription> = {}) =>
    field(readText, { description, ...more });

  const conditions = z
    .strictObject({
      temperature: field(readTemperature, {
        description: "Temperature with its unit",
        pattern: "^[+\\-−–]?\\s*[0-9.]+\\s*\\S+",
        examples: ["298.15 K", "25 °C"],
      }).optional(),
      solvent: field(words.solvent, {
        description: "Solvent, by a name the register knows",
        ...(words.spellings.solvent.length > 0 ? { enum: words.spellings.solvent } : {}),
      }).optional(),
    })
    .meta({ description: "Temperature and solvent that the dossier is for" });

  const stereoisomers = z.enum(["refuse", "enumerate"]).meta({
    description:
      "What to do where a stereocentre has no configuration: refuse (the default), or list every stereoisomer",
  });

  const claim = z
    .strictObject({
      configuration: text("Configuration that is claimed", { examples: ["trans", "1R,2S"] }).optional(),
      basis: z
        .enum(CLAIM_BASES)
        .meta({
          description:
            "How it was established, in CIF code words: rm reference molecule, ad anomalous dispersion, rmad both, syn synthesis, unk unknown",
        })
        .optional(),
      statement: text("The claim in a sentence").optional(),
    })
    .meta({ description: "The configuration the team claims, and on what basis" });

  const group = field(
    (found) =>
      Array.isArray(found)
        ? problem("two-groups-one-face", "Here stands a list; one face of a ring atom carries one group.")
        : words.group(found),
    {
      description: "A group by its usual abbreviation",
      ...(words.spellings.group.length > 1 ? { enum: words.spellings.group } : {}),
    },
  );
  const faces = z
    .strictObject({ up: group.optional(), down: group.optional() })
    .meta({ description: "Groups on the two faces of this ring atom" })
    .optional();
  const bench = z
    .strictObject({
      ring: field(words.ring, {
        description: "Parent ring by its systematic name",
        ...(words.spellings.ring.length > 0 ? { enum: words.spellings.ring } : {}),
      }),
      groups: z
        .strictObject({ 1: faces, 2: faces, 3: faces, 4: faces, 5: faces, 6: faces })
        .meta({
          description:
            "Groups by locant and face. Seen from above, locants run clockwise and up points to the viewer",
        })
        .optional(),
    })
    .meta({ description: "A parent ring with groups up and down" });
  const smiles = field(
    (found) =>
      typeof found === "string" && found.trim() !== ""
        ? { value: found.trim() }
        : problem(
            "wrong-type",
            `Here stands ${describeFound(found)}; a SMILES, or a set of the keys ring and groups, is needed.`,
          ),
    { description: "OpenSMILES of the whole compound", examples: ["C[C@H]1CC[C@@H](O)CC1"] },
  );

  const review = z
    .array(
      z.strictObject({
        by: text("Name of the reviewer"),
        on: field(readDate, { description: "Day, year-month-day", pattern: "^\\d{4}-\\d{2}-\\d{2}$" }),
        as: text("Role", { examples: ["author", "reviewer", "approver"] }),
        meaning: text("What the signature means").optional(),
      }),
    )
    .meta({ description: "Who wrote, reviewed or approved this dossier" });

  const evidence = evidenceSchema(words);
  const compound = z
    .strictObject({
      code: field(readCode, {
        description: "Code of the compound, unique in the site",
        pattern: "^[A-Za-z0-9]([A-Za-z0-9._\\-]*[A-Za-z0-9])?$",
      }),
      name: text("Systematic or usual name"),
      structure: z
        .union([smiles, bench])
        .meta({ description: "SMILES, or a parent ring with groups up and down" }),
      conditions: conditions.optional(),
      stereoisomers: stereoisomers.optional(),
      claim: claim.optional(),
      evidence: z.array(evidence).meta({ description: "What was measured" }).optional(),
      review: review.optional(),
    })
    .meta({ title: "Compound", description: "Front matter of a compound file, series/<series>/<name>.md" });

  const series = z
    .strictObject({
      title: text("Title of the series"),
      summary: text("One or two sentences for lists").optional(),
      notice: text("Shown on every page of the series, such as that its scenario is invented").optional(),
      defaults: z
        .strictObject({
          conditions: conditions.optional(),
          stereoisomers: stereoisomers.optional(),
          claim: claim.optional(),
        })
        .meta({
          description: "Values that every compound of the series inherits and may override key by key",
        })
        .optional(),
    })
    .meta({ title: "Series", description: "Front matter of a series file, series/<series>/index.md" });

  const site = z
    .strictObject({ title: text("Title of the whole site") })
    .meta({ title: "Site", description: "Front matter of index.md in the content folder" });

  return { compound, series, site, evidence, words };
}
