import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import type { RingParent } from "../../register/Register.ts";
import { benchStructure, type FaceGroups } from "../../structure/benchStructure.ts";
import { ringAtomCapacity } from "../../structure/ringAtomCapacity.ts";
import type { StructureInput } from "./CompoundInput.ts";
import type { ContentSchema } from "./contentSchema.ts";
import type { FrontMatter } from "./parseFrontMatter.ts";

/**
 * The structure as SMILES, from either notation, or null when it cannot be made. The schema has
 * already reported wrong words; what is found here is a group on a ring atom that cannot carry it.
 */
export function readStructure(
  matter: FrontMatter,
  schema: ContentSchema,
): { readonly structure: StructureInput | null; readonly diagnostics: readonly Diagnostic[] } {
  const raw = matter.data?.["structure"];
  const smiles = schema.compound.shape.structure.safeParse(raw);
  if (typeof raw === "string") {
    return {
      structure:
        smiles.success && typeof smiles.data === "string" ? { smiles: smiles.data, ringLocants: null } : null,
      diagnostics: [],
    };
  }
  const rawGroups = asMap(asMap(raw)["groups"]);
  const ring = schema.words.ring(asMap(raw)["ring"]);
  if ("problem" in ring) return { structure: null, diagnostics: [] };
  const diagnostics = Object.keys(rawGroups).flatMap((locant) =>
    /^[1-6]$/.test(locant) ? checkLocant(matter, schema, ring.value, locant, asMap(rawGroups[locant])) : [],
  );
  if (!smiles.success || typeof smiles.data === "string" || diagnostics.length > 0) {
    return { structure: null, diagnostics };
  }
  const groups = new Map<number, FaceGroups>();
  for (const [locant, faces] of Object.entries(smiles.data.groups ?? {})) {
    // A hydrogen written out says nothing that an empty face does not say.
    const up = faces?.up === "H" ? undefined : faces?.up;
    const down = faces?.down === "H" ? undefined : faces?.down;
    if (up === undefined && down === undefined) continue;
    groups.set(Number(locant), {
      ...(up === undefined ? {} : { up }),
      ...(down === undefined ? {} : { down }),
    });
  }
  return { structure: benchStructure(ring.value, groups), diagnostics };
}

const asMap = (value: unknown): Readonly<Record<string, unknown>> =>
  typeof value === "object" && value !== null && !Array.isArray(value)
    ? (value as Record<string, unknown>)
    : {};

function checkLocant(
  matter: FrontMatter,
  schema: ContentSchema,
  ring: RingParent,
  locant: string,
  faces: Readonly<Record<string, unknown>>,
): readonly Diagnostic[] {
  const element = ring.elements[Number(locant) - 1]!;
  const capacity = ringAtomCapacity(element);
  let single = 0;
  for (const face of ["up", "down"]) {
    if (!Object.hasOwn(faces, face)) continue;
    const group = schema.words.group(faces[face]);
    const isHydrogen = "value" in group && group.value === "H";
    const isOxo = "value" in group && group.value !== "H" && group.value.smiles.startsWith("[*]=");
    if (isHydrogen) continue;
    single += isOxo ? 0 : 1;
    if (isOxo ? capacity.oxo > 0 : single <= capacity.single) continue;
    const able = ring.elements
      .map((other, index) => ({ locant: index + 1, capacity: ringAtomCapacity(other) }))
      .filter((other) => (isOxo ? other.capacity.oxo : other.capacity.single) > 0)
      .map((other) => other.locant);
    const allowed = able.length === 0 ? "No atom of this ring can." : `Locants that can: ${able.join(", ")}.`;
    const many =
      single > 1
        ? `carries only ${capacity.single} group`
        : isOxo
          ? "cannot carry a doubly bonded group"
          : "carries no group";
    return [
      {
        code: "wrong-locant",
        severity: "error",
        place: matter.placeOfKey(["structure", "groups", locant]),
        message: `Locant ${locant} of ${ring.name} is ${element}, which ${many}. ${allowed}`,
      },
    ];
  }
  return [];
}
