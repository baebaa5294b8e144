import { nearestWord } from "../diagnostics/nearestWord.ts";
import { findSolvent } from "../register/findSolvent.ts";
import { analyseCompound } from "./analysis/analyseCompound.ts";
import type { Services } from "./analysis/Services.ts";
import { writeXyz } from "./writeXyz.ts";

/** Temperatures the batch command takes, K: the same limits as in content files. */
const LOWEST = 1;
const HIGHEST = 1000;
/** Longest input line, in characters. */
const MAXIMUM_LINE = 100_000;
const KEYS = ["id", "smiles", "temperature_K", "solvent"];

/** Answers one JSON line of the batch command with one JSON line; never throws. */
export function analyseLine(line: string, services: Services): string {
  let id: unknown = null;
  try {
    if (line.length > MAXIMUM_LINE)
      return failure(id, "invalid-line", `A line holds at most ${MAXIMUM_LINE} characters.`);
    let request: unknown;
    try {
      request = JSON.parse(line);
    } catch (error) {
      const at = /position (\d+)/.exec(error instanceof Error ? error.message : "");
      return failure(id, "invalid-json", "The line is not valid JSON.", at === null ? null : Number(at[1]));
    }
    if (typeof request !== "object" || request === null || Array.isArray(request)) {
      return failure(id, "invalid-line", 'The line must be a JSON object with "id" and "smiles".');
    }
    const fields = request as Record<string, unknown>;
    id = typeof fields["id"] === "string" || typeof fields["id"] === "number" ? fields["id"] : null;
    return answer(id, fields, services);
  } catch (error) {
    return failure(
      id,
      "unsupported-unexpected",
      `The analysis failed: ${error instanceof Error ? error.message : String(error)}`,
    );
  }
}

function answer(id: unknown, fields: Record<string, unknown>, services: Services): string {
  const stray = Object.keys(fields).find((key) => !KEYS.includes(key));
  if (stray !== undefined) {
    const near = nearestWord(stray, KEYS);
    return failure(
      id,
      "invalid-key",
      `"${stray}" is not a key of a line; allowed: ${KEYS.join(", ")}.${near === undefined ? "" : ` Did you mean "${near}"?`}`,
    );
  }
  if (id === null) return failure(id, "invalid-id", 'The line needs an "id": text or a number.');
  const smiles = fields["smiles"];
  if (typeof smiles !== "string") return failure(id, "invalid-smiles", 'The line needs a "smiles": text.');
  const temperature = fields["temperature_K"] ?? 298.15;
  if (typeof temperature !== "number" || !(temperature >= LOWEST && temperature <= HIGHEST)) {
    return failure(
      id,
      "invalid-temperature",
      `"temperature_K" must be a number from ${LOWEST} to ${HIGHEST} K.`,
    );
  }
  const word = fields["solvent"] ?? null;
  const solvent = typeof word === "string" ? findSolvent(services.register, word) : undefined;
  if (word !== null && solvent === undefined) {
    const words = services.register.solvents.flatMap((entry) => [entry.key, ...entry.aliases]);
    const near = typeof word === "string" ? nearestWord(word, words) : undefined;
    return failure(
      id,
      "invalid-solvent",
      `The solvent ${JSON.stringify(word)} is not in the register.${near === undefined ? "" : ` Did you mean "${near}"?`}`,
    );
  }
  const result = analyseCompound(
    {
      smiles,
      ringLocants: null,
      temperature_K: temperature,
      solvent: solvent?.key ?? null,
      enumerateStereoisomers: false,
    },
    services,
  );
  const refusal = result.ok ? result.analysis.refusal : result.refusal;
  if (!result.ok || refusal !== null) return failure(id, refusal!.code, refusal!.message, refusal!.position);
  const { analysis } = result;
  const { identity } = analysis;
  const written = (atom: number) => analysis.writtenAtoms[atom]!;
  return JSON.stringify({
    id,
    ok: true,
    identity: {
      canonicalSmiles: identity.canonicalSmiles,
      inchi: identity.inchi,
      inchikey: identity.inchikey,
      formula: identity.formula,
      stereocentres: identity.stereocentres.map(({ atom, descriptor }) => ({
        atom: written(atom),
        descriptor,
      })),
      stereobonds: identity.stereobonds.map(({ atoms, descriptor }) => ({
        atoms: atoms.map(written),
        descriptor,
      })),
      chirality: identity.chirality,
    },
    rings: analysis.rings.map(({ atoms, parent, system, kind, locants, configuration }) => ({
      atoms: atoms.map(written),
      parent,
      system,
      kind,
      locants,
      configuration,
    })),
    conformers: analysis.conformers.map((conformer) => ({
      id: conformer.id,
      label: conformer.label,
      forms: conformer.rings.map(({ form }) => form),
      positions: conformer.positions.map(({ ringAtom, substituent, group: _group, ...position }) => ({
        ...position,
        ringAtom: written(ringAtom),
        substituent: written(substituent),
      })),
      deltaG_kJ_mol: conformer.deltaG_kJ_mol,
      u_kJ_mol: conformer.u_kJ_mol,
      population: conformer.population,
      population95: conformer.population95,
      ...(conformer.relaxed === null
        ? {}
        : {
            xyz: writeXyz(
              conformer.relaxed,
              `${identity.canonicalSmiles} ${conformer.id} ${conformer.label}`,
            ),
          }),
      contributions: conformer.contributions.map((contribution) => ({
        kind: contribution.kind,
        label: contribution.label,
        atoms: contribution.atoms.map(written),
        value_kJ_mol: contribution.value_kJ_mol,
        u_kJ_mol: contribution.u_kJ_mol,
        basis: contribution.basis,
        standing: contribution.standing,
        source: contribution.source,
      })),
    })),
    relation: analysis.relation,
    fusions: analysis.systems.flatMap(({ fusions }) =>
      fusions.map(({ atoms, relation }) => ({ atoms: atoms.map(written), relation })),
    ),
    kinship: analysis.kinship,
    couplings: [],
    alerts: analysis.alerts,
  });
}

function failure(id: unknown, code: string, message: string, position: number | null = null): string {
  return JSON.stringify({
    id,
    ok: false,
    error: { code, message, ...(position === null ? {} : { position }) },
  });
}
