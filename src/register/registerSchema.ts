import { z } from "zod";
import { MEDIUM_CLASSES } from "./Register.ts";

const text = z.string().min(1);
const standing = z.enum(["confirmed", "memory", "estimate"]);
/** No conformational energy of the register lies outside this range, kcal/mol. */
const energy = z.number().min(-12).max(20);
const locant = z.int().min(1).max(6);
const entropy = z.strictObject({
  value: z.number().min(-10).max(10),
  u: z.number().positive(),
  sources: z.array(text).min(1),
  standing,
});

const measured = {
  id: text,
  value: energy,
  u: z.number().min(0).max(5),
  solvent: text,
  temperature_K: z.number().min(20).max(700).optional(),
  sources: z.array(text).min(1),
  standing,
  note: text.optional(),
};
const inMedium = { ...measured, media: z.array(z.enum(MEDIUM_CLASSES)), solvents: z.array(text).optional() };

/** One entry of each data file, by file name. */
export const REGISTER_FILES = {
  "groups.yaml": z.strictObject({
    key: text,
    smiles: text.startsWith("[*]"),
    prefix: text,
    label: text,
    labelReversed: text,
    groupClass: text,
    aliases: z.array(text),
  }),
  "groupClasses.yaml": z.strictObject({
    key: text,
    title: text,
    axial: z.strictObject({ value: energy, u: z.number().positive() }),
    polar: z.boolean(),
    donor: z.boolean(),
    carbon: z.boolean(),
    pattern: text,
  }),
  "axialGroups.yaml": z.strictObject({ ...inMedium, group: text, entropy: entropy.optional() }),
  "ringPositions.yaml": z.strictObject({ ...inMedium, ring: text, locant, group: text }),
  "anomeric.yaml": z.strictObject({
    ...inMedium,
    ring: text,
    locant,
    group: text,
    entropy: entropy.optional(),
  }),
  "nitrogen.yaml": z.strictObject({ ...inMedium, ring: text, locant, group: text }),
  "vicinalGauche.yaml": z.strictObject({ ...inMedium, groups: z.tuple([text, text]) }),
  "synAxial.yaml": z.strictObject({
    ...inMedium,
    groups: z.tuple([text, text]),
    ring: text.optional(),
    locants: z.tuple([locant, locant]).optional(),
  }),
  "geminal.yaml": z.strictObject({ ...inMedium, groups: z.tuple([text, text]) }),
  "barriers.yaml": z.strictObject({
    ...measured,
    system: text,
    smiles: text.optional(),
    quantity: text,
    unit: text,
  }),
  "nonChair.yaml": z.strictObject({ ...measured, system: text, quantity: text, unit: text }),
  "parents.yaml": z.strictObject({ name: text, elements: z.array(text).length(6), aliases: z.array(text) }),
  "solvents.yaml": z.strictObject({
    key: text,
    aliases: z.array(text),
    label: text,
    medium: z.enum(MEDIUM_CLASSES),
  }),
  "bibliography.yaml": z.strictObject({
    key: text,
    text,
    standing: z.enum(["confirmed", "partly confirmed", "memory", "none"]),
  }),
} as const;

export type RegisterFile = keyof typeof REGISTER_FILES;
export type Entry<F extends RegisterFile> = z.infer<(typeof REGISTER_FILES)[F]>;
