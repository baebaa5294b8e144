import * as z from "zod";
import { type FieldDescription, field } from "./field.ts";
import { describeFound } from "./values/describeFound.ts";
import { QUANTITY_KINDS } from "./values/quantityKinds.ts";
import { problem, type Reading } from "./values/Reading.ts";
import { readQuantity } from "./values/readQuantity.ts";
import { readTemperature } from "./values/readTemperature.ts";
import { readText } from "./values/readText.ts";
import type { RegisterWords } from "./values/registerWords.ts";

/** Kinds of evidence; an item holds exactly one of these keys. */
export const EVIDENCE_KINDS = [
  "coupling",
  "population",
  "exchange",
  "contact",
  "geometry",
  "observation",
] as const;

const HYDROGEN = "^H[1-6]['′]*(up|down)?$";

/** A ring hydrogen by locant and face, since axial and equatorial change on ring inversion. */
function readHydrogen(found: unknown): Reading<string> {
  if (typeof found === "string" && new RegExp(HYDROGEN).test(found.trim())) return { value: found.trim() };
  return problem(
    "bad-hydrogen",
    `Here stands ${describeFound(found)}. A hydrogen is named by its locant and, where two stand there, its face: H1, H2up, H2down.`,
  );
}

/** Front matter of one evidence item. */
export function evidenceSchema(words: RegisterWords) {
  const text = (description: string, more: Partial<FieldDescription> = {}) =>
    field(readText, { description, ...more });
  const quantity = (kind: keyof typeof QUANTITY_KINDS, description: string) =>
    field((found) => readQuantity(found, QUANTITY_KINDS[kind]), {
      description,
      examples: [QUANTITY_KINDS[kind].example],
    });
  const temperature = (description: string) =>
    field(readTemperature, { description, examples: ["213 K", "-60 °C"] });
  const hydrogens = z
    .tuple([
      field(readHydrogen, { description: "First hydrogen: H1, H2up, H2down", pattern: HYDROGEN }),
      field(readHydrogen, { description: "Second hydrogen", pattern: HYDROGEN }),
    ])
    .meta({ description: "Two ring hydrogens, by locant and face" });
  const file = text("A file next to this one, by its path from here", { examples: ["ks-07.cif"] });

  return z
    .strictObject({
      coupling: z
        .strictObject({
          between: hydrogens,
          observed: quantity("coupling", "Observed coupling constant in Hz"),
          uncertainty: quantity("couplingUncertainty", "Standard uncertainty in Hz").optional(),
        })
        .meta({ description: "A coupling constant between two hydrogens" })
        .optional(),
      population: z
        .strictObject({
          chair: text("The chair by its label, such as 1e,4e"),
          observed: quantity("population", "Observed share of this chair in per cent"),
          uncertainty: quantity("populationUncertainty", "Standard uncertainty in per cent").optional(),
        })
        .meta({ description: "The measured share of one chair" })
        .optional(),
      exchange: z
        .strictObject({
          coalescence: temperature("Temperature at which two signals coalesce"),
          separation: quantity("separation", "Separation of the two signals without exchange"),
          nucleus: text("Observed nucleus", { examples: ["13C", "1H", "19F"] }),
          uncertainty: quantity(
            "temperatureUncertainty",
            "Standard uncertainty of the coalescence temperature",
          ).optional(),
        })
        .meta({ description: "Chemical exchange between the chairs, seen as coalescence" })
        .optional(),
      contact: z
        .strictObject({
          between: hydrogens,
          observed: z
            .enum(["present", "absent", "strong", "medium", "weak"])
            .meta({ description: "Whether a contact through space was seen, or how strong" }),
        })
        .meta({ description: "A contact through space between two hydrogens" })
        .optional(),
      geometry: z
        .strictObject({ file })
        .meta({ description: "A structure determined by diffraction or computed, in a file" })
        .optional(),
      observation: text("Anything else that was observed, in words").optional(),
      conditions: z
        .strictObject({
          temperature: temperature("Temperature of the measurement").optional(),
          solvent: field(words.solvent, {
            description: "Solvent of the measurement",
            examples: words.spellings.solvent.slice(0, 8),
          }).optional(),
        })
        .meta({ description: "Conditions of the measurement" })
        .optional(),
      source: text("Where the observation is recorded: notebook and page, report, article").optional(),
      file: file.optional(),
      note: text("Anything a reader should know about it").optional(),
    })
    .meta({
      description:
        "One piece of evidence: exactly one of coupling, population, exchange, contact, geometry, observation",
      oneOf: EVIDENCE_KINDS.map((kind) => ({ required: [kind] })),
    });
}
