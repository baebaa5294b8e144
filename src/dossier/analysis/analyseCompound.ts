import { MAXIMUM_CONFORMERS } from "../../conformers/enumerateConformers.ts";
import type { EnergyContext } from "../../energetics/EnergyContext.ts";
import type { MediumClass } from "../../register/Register.ts";
import { analyseRings } from "../../structure/analyseRings.ts";
import { describeBody } from "../../structure/describeBody.ts";
import type {
  Alert,
  ChairRelation,
  Conditions,
  Conformer,
  Equilibrium,
  Identity,
  Kinship,
  MemberSummary,
  Ring,
  RingSystem,
  Structure,
  TemperatureRow,
} from "../Dossier.ts";
import { analyseConformers, type ConformerResult } from "./analyseConformers.ts";
import { conformerAlerts } from "./conformerAlerts.ts";
import { describeCentres } from "./describeCentres.ts";
import { configurationOf, describeRing } from "./describeRing.ts";
import { describeStereoisomers, type StereoisomerResult } from "./describeStereoisomers.ts";
import { describeSystems } from "./describeSystems.ts";
import { readStructure } from "./readStructure.ts";
import type { Services } from "./Services.ts";
import type { Refusal, StructureResult } from "./StructureResult.ts";

/** What one analysis is asked: a structure and the conditions it is wanted for. */
export interface AnalysisRequest {
  readonly smiles: string;
  readonly ringLocants: readonly number[] | null;
  /** K, above zero. */
  readonly temperature_K: number;
  /** Register key, or null when none is stated. */
  readonly solvent: string | null;
  readonly enumerateStereoisomers: boolean;
}

/** Everything computed for one compound: the heart of a Dossier, and of a line of the batch command. */
export interface Analysis {
  readonly conditions: Conditions;
  readonly identity: Identity;
  readonly structure: Structure;
  /** Place of each atom in the SMILES as written; not its index only where hydrogens are written as atoms. */
  readonly writtenAtoms: readonly number[];
  readonly rings: readonly Ring[];
  readonly systems: readonly RingSystem[];
  readonly conformers: readonly Conformer[];
  readonly relation: ChairRelation | null;
  readonly kinship: Kinship;
  readonly equilibria: readonly Equilibrium[];
  readonly temperatures: readonly TemperatureRow[];
  readonly members: readonly MemberSummary[];
  /** Every stereoisomer of the constitution; takes a while for many centres, so only on request. */
  readonly listStereoisomers: () => StereoisomerResult;
  readonly alerts: readonly Alert[];
  /** Set when the structure is understood and its conformers are not analysed. */
  readonly refusal: Refusal | null;
}

/** The medium assumed when none is stated: most single-group values were measured in such mixtures. */
const DEFAULT_MEDIUM: MediumClass = "chlorinated";
const DEFAULT_LABEL = "CDCl_3";

/** The whole pipeline for one structure: pure, and the same for the site and the batch command. */
export function analyseCompound(
  request: AnalysisRequest,
  services: Services,
): { readonly ok: true; readonly analysis: Analysis } | { readonly ok: false; readonly refusal: Refusal } {
  const conditions = conditionsOf(request, services);
  const context: EnergyContext = {
    register: services.register,
    solvent: request.solvent,
    medium: conditions.medium,
  };
  const read = readStructure(request.smiles, request.ringLocants, services);
  if (!read.ok) return read;
  const structure = read.result;
  const open = new Set(
    structure.molecule === null
      ? structure.identity.stereocentres.flatMap(({ atom, descriptor }) =>
          descriptor === "unspecified" ? [atom] : [],
        )
      : [],
  );
  const rings = structure.rings.map((ring) => describeRing(ring, open));
  const alerts: Alert[] = [...structure.alerts];
  if (!conditions.stated) {
    alerts.push({
      code: "solvent-unstated",
      severity: "note",
      message: "No solvent is stated; values for chlorinated solvents are preferred.",
    });
  }

  let refusal = structure.refusal;
  let result: ConformerResult | null = null;
  if (refusal === null && structure.molecule !== null && structure.body !== null) {
    const { molecule, body } = structure;
    const answer = analyseConformers(
      { molecule, body, rings: structure.rings },
      context,
      request.temperature_K,
      services.mechanics,
    );
    if (answer === "too many") {
      refusal = {
        code: "unsupported-too-many-conformers",
        message: `The rings and inverting nitrogens give more than ${MAXIMUM_CONFORMERS} conformers.`,
        position: null,
      };
    } else if (answer === "none") {
      alerts.push({
        code: "no-chair",
        severity: "stop",
        message:
          "No arrangement closes every six-membered ring as a chair (or as the half-chair or boat its bonds ask for): at least one ring must be a twist-boat. No chair conformers are listed.",
      });
    } else {
      result = answer;
    }
  }
  if (refusal !== null) alerts.push({ code: refusal.code, severity: "stop", message: refusal.message });
  if (result !== null)
    alerts.push(...conformerAlerts(result, structure.rings, context, request.temperature_K));

  const undecided = structure.molecule === null && refusal === null;
  const members =
    undecided && request.enumerateStereoisomers ? membersOf(structure, context, request, services) : [];
  const order = ["stop", "caution", "note"];
  return {
    ok: true,
    analysis: {
      conditions,
      identity: structure.identity,
      structure: structure.structure,
      writtenAtoms: structure.writtenAtoms,
      rings,
      systems: describeSystems(structure.molecule ?? structure.written, structure.rings, open),
      conformers: result?.conformers ?? [],
      relation: result?.relation ?? null,
      kinship: result?.kinship ?? { distinct: 0, distinctUpToMirror: 0, pairs: [] },
      equilibria: result?.equilibria ?? [],
      temperatures: result?.temperatures ?? [],
      members,
      listStereoisomers: () => describeStereoisomers(structure.written, structure.rings, services.toolkit),
      alerts: alerts
        // Listing the members answers an open configuration; what is left is a caution.
        .map((alert) =>
          members.length > 0 && alert.code === "stereo-unspecified"
            ? { ...alert, severity: "caution" as const }
            : alert,
        )
        .sort((a, b) => order.indexOf(a.severity) - order.indexOf(b.severity)),
      refusal,
    },
  };
}

function conditionsOf(request: AnalysisRequest, services: Services): Conditions {
  const solvent = services.register.solvents.find((entry) => entry.key === request.solvent);
  return {
    temperature_K: request.temperature_K,
    solvent: solvent?.key ?? "unstated",
    solventLabel: solvent?.label ?? DEFAULT_LABEL,
    medium: solvent?.medium ?? DEFAULT_MEDIUM,
    stated: solvent !== undefined,
  };
}

/** Each stereoisomer that an open structure may stand for, with its own major conformer. */
function membersOf(
  structure: StructureResult,
  context: EnergyContext,
  request: AnalysisRequest,
  services: Services,
): readonly MemberSummary[] {
  return structure.members.flatMap((member) => {
    const numbering = structure.rings[0];
    const locants =
      numbering === undefined
        ? null
        : [1, 2, 3, 4, 5, 6].map((n) => numbering.atoms[numbering.locants.indexOf(n)]!);
    const rings = analyseRings(
      member.molecule,
      structure.found,
      { ...structure.author, ring: locants },
      services,
    );
    const body = describeBody(member.molecule, rings, services.toolkit);
    const result = analyseConformers(
      { molecule: member.molecule, body, rings },
      context,
      request.temperature_K,
      null,
    );
    if (typeof result === "string") return [];
    const major = result.conformers[0]!;
    const configuration = rings.flatMap((ring) =>
      configurationOf(ring).map(({ locants: pair, relation }) => `${relation}-${pair.join(",")}`),
    );
    const descriptors = describeCentres(services.toolkit.descriptors(member.molecule).atoms, rings);
    return [
      {
        canonicalSmiles: member.canonicalSmiles,
        description: [configuration.join(", "), descriptors.length > 0 ? `(${descriptors.join(",")})` : ""]
          .filter((part) => part !== "")
          .join(" "),
        majorLabel: major.label,
        population: major.population,
        population95: major.population95,
      },
    ];
  });
}
