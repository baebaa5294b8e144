import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { deepFreeze } from "../register/deepFreeze.ts";
import { type Analysis, analyseCompound } from "./analysis/analyseCompound.ts";
import type { Services } from "./analysis/Services.ts";
import { writeConclusion } from "./analysis/writeConclusion.ts";
import { canonicalJson } from "./canonicalJson.ts";
import { checkClaim } from "./claim/checkClaim.ts";
import type { CompoundInput } from "./content/CompoundInput.ts";
import { DOSSIER_SCHEMA_VERSION, type Dossier, type SourceNote } from "./Dossier.ts";
import { sha256 } from "./sha256.ts";

/**
 * Analyses one compound as its author defined it. Every problem is a diagnostic at its place in the file; none is
 * thrown. A structure that cannot be read gives no dossier; one that is understood and not analysed gives a dossier
 * that says so.
 */
export function buildDossier(
  input: CompoundInput,
  services: Services,
): { readonly dossier: Dossier | null; readonly diagnostics: readonly Diagnostic[] } {
  const answer = analyseCompound(
    {
      smiles: input.structure.smiles,
      ringLocants: input.structure.ringLocants,
      temperature_K: input.temperature_K,
      solvent: input.solvent,
      enumerateStereoisomers: input.enumerateStereoisomers,
    },
    services,
  );
  if (!answer.ok) {
    const { refusal } = answer;
    return {
      dossier: null,
      diagnostics: [refusalDiagnostic(input, refusal.code, refusal.message, refusal.position)],
    };
  }
  const { analysis } = answer;
  const diagnostics: Diagnostic[] = [];
  if (analysis.refusal !== null) {
    diagnostics.push({
      code: analysis.refusal.code,
      severity: "caution",
      place: input.place(["structure"]),
      message: `${analysis.refusal.message} The dossier shows the identity and no conformers.`,
    });
  }
  const open = analysis.alerts.find(
    (alert) => alert.code === "stereo-unspecified" && alert.severity === "stop",
  );
  if (open !== undefined && analysis.refusal === null) {
    diagnostics.push({
      code: "stereo-unspecified",
      severity: "caution",
      place: input.place(["structure"]),
      message: `${open.message} Write "stereoisomers: enumerate" to list every member.`,
    });
  }
  const { equalNumberings, ...stereoisomers } = analysis.listStereoisomers();
  diagnostics.push(...checkClaim(input, { ...analysis, equalNumberings }));
  return { dossier: assemble(input, analysis, stereoisomers, services), diagnostics };
}

function assemble(
  input: CompoundInput,
  analysis: Analysis,
  stereoisomers: Pick<Dossier, "stereoisomers" | "stereoisomerCount">,
  services: Services,
): Dossier {
  const {
    refusal: _refusal,
    writtenAtoms: _writtenAtoms,
    listStereoisomers: _listStereoisomers,
    ...parts
  } = analysis;
  const record: Dossier = {
    schemaVersion: DOSSIER_SCHEMA_VERSION,
    program: services.program,
    register: { version: services.register.version, sha256: services.register.sha256 },
    input: { file: input.file.path, sha256: input.file.sha256 },
    resultSha256: "",
    code: input.code,
    slug: input.slug,
    series: input.series,
    name: input.name,
    prose: input.prose,
    ...parts,
    ...stereoisomers,
    conclusion: writeConclusion({ name: input.name, ...parts }),
    claim: input.claim,
    evidence: input.evidence,
    review: input.review,
    sources: sourcesOf(analysis, services),
  };
  return deepFreeze({ ...record, resultSha256: sha256(canonicalJson(record)) });
}

function sourcesOf(analysis: Analysis, services: Services): readonly SourceNote[] {
  const keys = analysis.conformers.flatMap((conformer) =>
    [...conformer.contributions, ...conformer.nitrogens].flatMap(({ sourceKeys }) => sourceKeys),
  );
  return [...new Set(keys)].sort().map((key) => {
    const citation = services.register.citations.find((entry) => entry.key === key);
    if (citation === undefined) throw new Error(`the register has no citation ${key}`);
    return { key, text: citation.text, standing: citation.standing };
  });
}

/** Points into the SMILES itself where the character is known. */
function refusalDiagnostic(
  input: CompoundInput,
  code: string,
  message: string,
  position: number | null,
): Diagnostic {
  const place = position === null ? input.place(["structure"]) : input.place(["structure"], position);
  return { code, severity: "error", place, message: `${message} Found "${input.structure.smiles}".` };
}
