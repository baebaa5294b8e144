import { z } from "zod";

const energy = z.number().describe("kJ/mol");
const uncertainty = z.number().min(0).describe("Standard uncertainty, kJ/mol");
const share = z.number().min(0).max(1).describe("Fraction of the molecules, 0 to 1");
const atom = z.int().min(0).describe("Atom in input SMILES order, from 0");
const identifier = z.union([z.string(), z.number()]).describe("Returned with the answer");

/** One line that the batch command reads. */
export const analyseInput = z.strictObject({
  id: identifier,
  smiles: z.string().describe("OpenSMILES with stereochemistry"),
  temperature_K: z
    .number()
    .min(1)
    .max(1000)
    .optional()
    .describe("Absolute temperature, K; 298.15 when absent"),
  solvent: z.string().optional().describe("A solvent of the register, by key or alias"),
});

const success = z.strictObject({
  id: identifier,
  ok: z.literal(true),
  identity: z.strictObject({
    canonicalSmiles: z.string(),
    inchi: z.string(),
    inchikey: z.string(),
    formula: z.string().describe("Hill order"),
    stereocentres: z.array(z.strictObject({ atom, descriptor: z.enum(["R", "S", "r", "s", "unspecified"]) })),
    stereobonds: z.array(
      z.strictObject({ atoms: z.tuple([atom, atom]), descriptor: z.enum(["E", "Z", "unspecified"]) }),
    ),
    chirality: z.enum(["achiral", "meso", "chiral"]),
  }),
  rings: z.array(
    z.strictObject({
      atoms: z.array(atom).length(6).describe("Clockwise seen from the face called up"),
      parent: z.string(),
      system: z
        .int()
        .min(0)
        .describe("Rings with the same number share atoms, directly or through other rings"),
      kind: z
        .enum(["chair", "half-chair", "boat"])
        .describe("What states it has: two chairs, two half-chairs, or a boat that a bridge forces"),
      locants: z.array(z.string()).length(6).describe("Of the atoms, in the same order"),
      configuration: z.array(
        z.strictObject({ locants: z.tuple([z.string(), z.string()]), relation: z.enum(["cis", "trans"]) }),
      ),
    }),
  ),
  conformers: z
    .array(
      z.strictObject({
        id: z.string(),
        label: z.string().describe("Locants with a (axial) or e (equatorial)"),
        forms: z
          .array(z.enum(["chair", "half-chair", "boat", "twist-boat"]))
          .describe("Of each ring, in the order of rings"),
        positions: z.array(
          z.strictObject({
            ring: z.int().min(0).describe("Index into rings"),
            ringAtom: atom,
            substituent: atom.describe("First atom of the group"),
            kind: z.enum(["group", "ring bond"]).describe("A group, or a bond to an atom of another ring"),
            orientation: z.enum(["axial", "equatorial"]),
            pseudo: z.boolean().describe("Next to a flat bond: pseudoaxial, pseudoequatorial"),
            face: z.enum(["up", "down"]),
            locant: z.string(),
          }),
        ),
        deltaG_kJ_mol: energy.describe("Relative to the most stable conformer, which comes first; kJ/mol"),
        u_kJ_mol: uncertainty,
        population: share,
        population95: z.tuple([share, share]).describe("95 % interval"),
        xyz: z.string().optional().describe("Relaxed coordinates in Å as an XYZ file; only with mechanics"),
        contributions: z.array(
          z.strictObject({
            kind: z.enum([
              "axial group",
              "anomeric",
              "vicinal gauche",
              "syn-axial",
              "geminal",
              "nitrogen substituent",
              "ring fusion",
              "non-chair form",
              "additivity allowance",
            ]),
            label: z.string(),
            atoms: z.array(atom),
            value_kJ_mol: energy,
            u_kJ_mol: uncertainty,
            basis: z.enum(["published", "computed", "not available"]),
            standing: z.enum(["confirmed", "memory", "estimate"]).nullable(),
            source: z.string(),
          }),
        ),
      }),
    )
    .describe("Most stable first; empty when an alert of severity stop says why"),
  relation: z
    .enum(["identical", "enantiomeric", "diastereomeric"])
    .nullable()
    .describe("Of the two chairs of a single flexible ring"),
  fusions: z
    .array(z.strictObject({ atoms: z.tuple([atom, atom]), relation: z.enum(["cis", "trans"]) }))
    .describe("Bonds that two rings share, and whether they are cis- or trans-fused"),
  kinship: z.strictObject({
    distinct: z.int().min(0).describe("Conformers when superimposable ones count once"),
    distinctUpToMirror: z.int().min(0).describe("Conformers when mirror images count once too"),
    pairs: z.array(
      z.strictObject({
        first: z.string(),
        second: z.string(),
        relation: z.enum(["identical", "enantiomeric"]),
      }),
    ),
  }),
  couplings: z.array(
    z.strictObject({
      between: z.tuple([z.string(), z.string()]),
      carbons: z.tuple([atom, atom]),
      faces: z.tuple([z.enum(["up", "down"]), z.enum(["up", "down"])]),
      perConformer_Hz: z.record(z.string(), z.number()),
      average_Hz: z.number(),
    }),
  ),
  alerts: z.array(
    z.strictObject({ code: z.string(), severity: z.enum(["note", "caution", "stop"]), message: z.string() }),
  ),
});

const failure = z.strictObject({
  id: identifier.nullable(),
  ok: z.literal(false),
  error: z.strictObject({
    code: z
      .string()
      .regex(/^(invalid|unsupported)-/)
      .describe("invalid-…: the line is wrong; unsupported-…: understood, not analysed"),
    message: z.string(),
    position: z.int().min(0).optional().describe("Character of the SMILES or the line, from 0"),
  }),
});

/** One line that the batch command writes. */
export const analyseOutput = z.union([success, failure]);

/** JSON Schema (2020-12) of the batch command's input and output lines. */
export function analyseJsonSchema(side: "input" | "output"): unknown {
  const title = `ringfolio analyse, one line of ${side}`;
  return { title, ...z.toJSONSchema(side === "input" ? analyseInput : analyseOutput) };
}
