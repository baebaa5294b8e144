import type { Diagnostic, Place } from "../../diagnostics/Diagnostic.ts";
import type { Claim } from "../Dossier.ts";
import type { AttachedFile, CompoundInput, ContentFile } from "./CompoundInput.ts";
import { checkProse } from "./checkProse.ts";
import type { ContentSchema } from "./contentSchema.ts";
import { explainIssues } from "./issues/explainIssues.ts";
import { parseFrontMatter } from "./parseFrontMatter.ts";
import { readEvidence } from "./readEvidence.ts";
import { readStructure } from "./readStructure.ts";
import type { SeriesDefaults } from "./SeriesDefaults.ts";
import { slugOf } from "./values/slugOf.ts";

/** Room temperature as the trade tabulates it, used where nobody states another. */
const DEFAULT_TEMPERATURE_K = 298.15;

/** What was read from a compound file. */
export interface CompoundReading {
  /** Null when there is no structure to analyse; given in spite of other mistakes, so that all are found in one run. */
  readonly compound: CompoundInput | null;
  /** The code with its place, for the search for duplicates; null when none could be read. */
  readonly code: { readonly text: string; readonly place: Place } | null;
  readonly diagnostics: readonly Diagnostic[];
}

/** Reads one compound file; what it leaves out is taken from the defaults of its series, key by key. */
export function readCompound(
  file: ContentFile,
  series: string,
  defaults: SeriesDefaults,
  attached: readonly AttachedFile[],
  schema: ContentSchema,
): CompoundReading {
  const matter = parseFrontMatter(file);
  const diagnostics = [...matter.diagnostics, ...checkProse(file, matter.prose, "compound")];
  if (matter.data === null) return { compound: null, code: null, diagnostics };

  const whole = schema.compound.safeParse(matter.data);
  if (!whole.success) diagnostics.push(...explainIssues(whole.error.issues, schema.compound, matter));
  const structure = readStructure(matter, schema);
  const evidence = readEvidence(file, matter, schema, attached);
  diagnostics.push(...structure.diagnostics, ...evidence.diagnostics);

  // One wrong key makes the whole invalid; the others are read one by one, so that analysis can go on to report more.
  const { shape } = schema.compound;
  const data = matter.data;
  const code = shape.code.safeParse(data["code"]);
  const conditions = shape.conditions.safeParse(data["conditions"]).data;
  const stereoisomers = shape.stereoisomers.safeParse(data["stereoisomers"]).data ?? defaults.stereoisomers;
  const temperature = conditions?.temperature?.kelvin ?? defaults.temperature_K;
  const fileName = file.path.split("/").at(-1)!.replace(/\.md$/, "");
  const text = code.data ?? fileName;
  const compound: CompoundInput | null =
    structure.structure === null
      ? null
      : {
          file,
          code: text,
          slug: slugOf(text),
          series,
          name: shape.name.safeParse(data["name"]).data ?? text,
          structure: structure.structure,
          temperature_K: temperature ?? DEFAULT_TEMPERATURE_K,
          temperatureStated: temperature !== null,
          solvent: conditions?.solvent?.key ?? defaults.solvent,
          enumerateStereoisomers: stereoisomers === "enumerate",
          claim: inheritClaim(shape.claim.safeParse(data["claim"]).data, defaults.claim),
          evidence: evidence.evidence,
          review: (shape.review.safeParse(data["review"]).data ?? []).map(({ by, on, as, meaning }) => ({
            by,
            on,
            as,
            meaning: meaning ?? null,
          })),
          prose: matter.prose,
          place: matter.place,
        };
  return {
    compound,
    code: code.success ? { text: code.data, place: matter.place(["code"]) } : null,
    diagnostics,
  };
}

function inheritClaim(
  own:
    | { configuration?: string | undefined; basis?: string | undefined; statement?: string | undefined }
    | undefined,
  inherited: Claim | null,
): Claim | null {
  if (own === undefined) return inherited;
  return {
    configuration: own.configuration ?? inherited?.configuration ?? null,
    basis: own.basis ?? inherited?.basis ?? null,
    statement: own.statement ?? inherited?.statement ?? null,
  };
}
