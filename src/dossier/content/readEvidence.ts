import type * as z from "zod";
import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import type { EvidenceItem } from "../Dossier.ts";
import type { AttachedFile, ContentFile } from "./CompoundInput.ts";
import type { ContentSchema } from "./contentSchema.ts";
import { EVIDENCE_KINDS, type evidenceSchema } from "./evidenceSchema.ts";
import type { FrontMatter } from "./parseFrontMatter.ts";
import { findAttached } from "./values/findAttached.ts";
import type { WrittenQuantity } from "./values/readQuantity.ts";

type Evidence = z.output<ReturnType<typeof evidenceSchema>>;

/** The evidence list, each item in plain words, with the checks that a schema cannot make. */
export function readEvidence(
  file: ContentFile,
  matter: FrontMatter,
  schema: ContentSchema,
  attached: readonly AttachedFile[],
): { readonly evidence: readonly EvidenceItem[]; readonly diagnostics: readonly Diagnostic[] } {
  const raw = matter.data?.["evidence"];
  if (!Array.isArray(raw)) return { evidence: [], diagnostics: [] };
  const item = schema.evidence;
  const evidence: EvidenceItem[] = [];
  const diagnostics: Diagnostic[] = [];
  for (const [index, found] of raw.entries()) {
    if (typeof found !== "object" || found === null || Array.isArray(found)) continue;
    const path = ["evidence", index];
    const kinds = Object.keys(found).filter((key): key is (typeof EVIDENCE_KINDS)[number] =>
      (EVIDENCE_KINDS as readonly string[]).includes(key),
    );
    if (kinds.length !== 1) {
      diagnostics.push({
        code: "evidence-kind",
        severity: "error",
        place: kinds.length === 0 ? matter.place(path) : matter.placeOfKey([...path, kinds[1]!]),
        message:
          kinds.length === 0
            ? `An item of evidence needs one of the keys ${EVIDENCE_KINDS.join(", ")}.`
            : `One item of evidence holds one observation; ${kinds.join(" and ")} need an item each.`,
      });
    }
    const files = findFiles(found, path, file, matter, attached);
    diagnostics.push(...files.diagnostics);
    const parsed = item.safeParse(found);
    const kind = kinds[0];
    if (!parsed.success || kind === undefined) continue;
    const conditions = [
      parsed.data.conditions?.temperature === undefined
        ? undefined
        : withUnit(parsed.data.conditions.temperature),
      parsed.data.conditions?.solvent?.key,
    ].filter((part) => part !== undefined);
    const note = parsed.data.note === undefined ? "" : `. Note: ${parsed.data.note}`;
    evidence.push({
      kind,
      summary: `${summarise(parsed.data)}${note}`,
      conditions: conditions.length === 0 ? null : conditions.join(", "),
      source: parsed.data.source ?? null,
      file: files.first,
      line: matter.place(path).line,
    });
  }
  return { evidence, diagnostics };
}

function findFiles(
  found: object,
  path: readonly (string | number)[],
  file: ContentFile,
  matter: FrontMatter,
  attached: readonly AttachedFile[],
): { first: AttachedFile | null; diagnostics: readonly Diagnostic[] } {
  const geometry = (found as { geometry?: unknown }).geometry;
  const named: [readonly (string | number)[], unknown][] = [
    [[...path, "geometry", "file"], (geometry as { file?: unknown } | null | undefined)?.file],
    [[...path, "file"], (found as { file?: unknown }).file],
  ];
  let first: AttachedFile | null = null;
  const diagnostics: Diagnostic[] = [];
  for (const [at, name] of named) {
    if (typeof name !== "string" || name.trim() === "") continue;
    const result = findAttached(name.trim(), file.path, attached);
    if ("problem" in result)
      diagnostics.push({ severity: "error", place: matter.place(at), ...result.problem });
    else first ??= result.value;
  }
  return { first, diagnostics };
}

const withUnit = ({ text, unit }: WrittenQuantity) => `${text}\u00A0${unit}`;

const withUncertainty = (observed: WrittenQuantity, uncertainty: WrittenQuantity | undefined) =>
  uncertainty === undefined
    ? withUnit(observed)
    : observed.unit === uncertainty.unit
      ? `${observed.text}\u00A0±\u00A0${uncertainty.text}\u00A0${observed.unit}`
      : `${withUnit(observed)} (uncertainty ${withUnit(uncertainty)})`;

/** What was observed, with value and uncertainty as the author gave them. */
function summarise({ coupling, population, exchange, contact, geometry, observation }: Evidence): string {
  if (coupling !== undefined) {
    return `Coupling between ${coupling.between.join(" and ")}: ${withUncertainty(coupling.observed, coupling.uncertainty)}`;
  }
  if (population !== undefined) {
    return `Population of chair ${population.chair}: ${withUncertainty(population.observed, population.uncertainty)}`;
  }
  if (exchange !== undefined) {
    return `Exchange seen in ${exchange.nucleus}: coalescence at ${withUncertainty(exchange.coalescence, exchange.uncertainty)}, signals ${withUnit(exchange.separation)} apart`;
  }
  if (contact !== undefined) {
    return `Contact through space between ${contact.between.join(" and ")}: ${contact.observed}`;
  }
  if (geometry !== undefined) return `Geometry in ${geometry.file}`;
  return observation ?? "";
}
