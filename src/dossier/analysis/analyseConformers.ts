import { type Chair, orientationOf } from "../../conformers/Chair.ts";
import { type ChairSet, enumerateConformers } from "../../conformers/enumerateConformers.ts";
import { idealChairGeometry } from "../../conformers/idealChairGeometry.ts";
import { relateChairs } from "../../conformers/relateChairs.ts";
import { conformerTerms } from "../../energetics/conformerTerms.ts";
import type { EnergyContext } from "../../energetics/EnergyContext.ts";
import type { EnergyTerm } from "../../energetics/EnergyTerm.ts";
import { equilibriumConstant } from "../../energetics/equilibriumConstant.ts";
import { combine, type LinearEnergy, linearEnergy } from "../../energetics/LinearEnergy.ts";
import { populations } from "../../energetics/populations.ts";
import { standIn } from "../../energetics/standIn.ts";
import { labelText } from "../../quantity/labelText.ts";
import { kelvin, kilojoulePerMole, NORMAL_95 } from "../../quantity/units.ts";
import type { Molecule } from "../../structure/Molecule.ts";
import type { AnalysedRing, Substituent } from "../../structure/StructureAnalysis.ts";
import type {
  ChairRelation,
  Conformer,
  Contribution,
  Equilibrium,
  Position,
  TemperatureRow,
} from "../Dossier.ts";

/** Doubt between conformers that differ and yet are charged alike, kcal/mol. */
const RESIDUAL = 0.2;
/** Temperatures of the dossier's table, K; its own is added. */
const TEMPERATURE_GRID = [173.15, 198.15, 223.15, 248.15, 273.15, 298.15, 323.15, 348.15, 373.15];

export interface ConformerResult {
  readonly conformers: readonly Conformer[];
  readonly relation: ChairRelation | null;
  readonly equilibria: readonly Equilibrium[];
  readonly temperatures: readonly TemperatureRow[];
  /** Parameters that differ between conformers and so decide the result: id and basis. */
  readonly deciding: readonly {
    readonly id: string;
    readonly basis: string;
    readonly standing: string | null;
  }[];
  /** The chairs behind each conformer, in the same order. */
  readonly chairSets: readonly ChairSet[];
}

interface Candidate {
  readonly chairs: ChairSet;
  readonly label: string;
  readonly terms: readonly EnergyTerm[];
  readonly energy: LinearEnergy;
}

/**
 * Every all-chair conformer with its energy, population and geometry, most stable first.
 * @param temperature - in K, above zero.
 * @returns null when there are too many conformers to list.
 */
export function analyseConformers(
  molecule: Molecule,
  rings: readonly AnalysedRing[],
  context: EnergyContext,
  temperature: number,
): ConformerResult | null {
  const sets = enumerateConformers(rings);
  if (sets === null) return null;
  const candidates = distinguish(
    molecule,
    sets.map((chairs) => {
      const terms = conformerTerms(chairs, context);
      return { chairs, label: labelOf(chairs), terms, energy: linearEnergy(terms) };
    }),
  );
  const T = kelvin(temperature);
  const base = candidates[0]!.energy;
  const relativeTo = (reference: LinearEnergy, energy: LinearEnergy) =>
    combine(
      [
        { energy, weight: 1 },
        { energy: reference, weight: -1 },
      ],
      T,
    );
  const height = new Map(
    candidates.map((candidate) => [candidate, relativeTo(base, candidate.energy).value]),
  );
  const ordered = [...candidates].sort(
    (a, b) => height.get(a)! - height.get(b)! || (a.label < b.label ? -1 : a.label > b.label ? 1 : 0),
  );
  const lowest = ordered[0]!;
  const energies = ordered.map((candidate) => candidate.energy);
  const shares = populations(energies, T);
  const conformers = ordered.map((candidate, i): Conformer => {
    const { value, u } = relativeTo(lowest.energy, candidate.energy);
    return {
      id: conformerId(i),
      label: candidate.label,
      rings: candidate.chairs.map((chair) => ({ ring: chair.ring.index, form: "chair" })),
      positions: candidate.chairs.flatMap(positionsOf),
      deltaG_kJ_mol: clean(value),
      u_kJ_mol: clean(u),
      sum_kJ_mol: clean(combine([{ energy: candidate.energy, weight: 1 }], T).value),
      population: shares[i]!.population,
      population95: shares[i]!.population95,
      contributions: candidate.terms.map((term) => contributionOf(term, temperature)),
      geometry: { atoms: candidate.chairs.flatMap((chair) => idealChairGeometry(molecule, chair)) },
    };
  });
  const grid = [...new Set([...TEMPERATURE_GRID, temperature])].sort((a, b) => a - b);
  return {
    conformers,
    chairSets: ordered.map((candidate) => candidate.chairs),
    relation: relationOf(molecule, ordered),
    equilibria: ordered.slice(1).map((candidate, i) => {
      const { value, u } = relativeTo(lowest.energy, candidate.energy);
      const bySymmetry = equalBySymmetry(molecule, lowest.chairs, candidate.chairs);
      const low = value - NORMAL_95 * u;
      const high = value + NORMAL_95 * u;
      const K = (deltaG: number) => equilibriumConstant(kilojoulePerMole(deltaG), T);
      return {
        from: conformerId(0),
        to: conformerId(i + 1),
        deltaG_kJ_mol: clean(value),
        u_kJ_mol: clean(u),
        deltaG95_kJ_mol: [clean(low), clean(high)],
        K: K(value),
        K95: [K(high), K(low)],
        unresolved: !bySymmetry && low <= 0 && high >= 0,
        bySymmetry,
      };
    }),
    temperatures: grid.map((t) => ({
      temperature_K: t,
      populations: populations(energies, kelvin(t)).map((share, i) => ({
        conformer: conformerId(i),
        ...share,
      })),
    })),
    deciding: decidingParameters(energies),
  };
}

/** `A` … `Z`, then `AA`, `AB` … */
function conformerId(index: number): string {
  const letter = (n: number) => String.fromCharCode(65 + n);
  return index < 26 ? letter(index) : letter(Math.floor(index / 26) - 1) + letter(index % 26);
}

/** Sums of exact multiples leave noise in the sixteenth digit, which must not reach a record. */
function clean(value: number): number {
  return Math.round(value * 1e9) / 1e9 + 0;
}

/** Locants with a or e; the group in brackets where two share a ring atom, and always on a ring of several. */
function labelOf(chairs: ChairSet): string {
  const parts = chairs.flatMap((chair) => {
    const { ring } = chair;
    const count = (group: Substituent) =>
      ring.substituents.filter((s) => s.ringAtom === group.ringAtom).length;
    const entries = ring.substituents.map((group) => {
      const locant = ring.locants[ring.atoms.indexOf(group.ringAtom)]!;
      const letter = orientationOf(chair, group) === "axial" ? "a" : "e";
      const name = count(group) > 1 ? `(${labelText(group.label)})` : "";
      return { locant, text: `${locant}${"′".repeat(ring.index)}${letter}${name}` };
    });
    return entries.sort((a, b) => a.locant - b.locant || (a.text < b.text ? -1 : 1)).map(({ text }) => text);
  });
  return parts.length === 0 ? "unsubstituted" : parts.join(",");
}

function positionsOf(chair: Chair): readonly Position[] {
  const { ring } = chair;
  return ring.substituents.map((group) => ({
    ring: ring.index,
    ringAtom: group.ringAtom,
    substituent: group.atom,
    locant: `${ring.locants[ring.atoms.indexOf(group.ringAtom)]}${"′".repeat(ring.index)}`,
    group: group.label,
    orientation: orientationOf(chair, group),
    face: chair.faces.get(group.atom)!,
  }));
}

function contributionOf(term: EnergyTerm, temperature: number): Contribution {
  const energy = linearEnergy([term]);
  const { value, u } = combine([{ energy, weight: 1 }], temperature);
  const parameters = [...energy.values()].map(({ parameter }) => parameter);
  const missing = parameters.filter((parameter) => parameter.basis === "not available");
  const keys = [...new Set(parameters.flatMap((parameter) => parameter.sources))].sort();
  const lead = term.parts[0]!.parameter;
  const standings = parameters.map((parameter) => parameter.standing);
  const weakest =
    (["estimate", "memory", "confirmed"] as const).find((mark) => standings.includes(mark)) ?? null;
  const notes = [...new Set(parameters.map((parameter) => parameter.note).filter((note) => note !== null))];
  return {
    kind: term.kind,
    label: term.label,
    atoms: term.atoms,
    value_kJ_mol: clean(value),
    u_kJ_mol: clean(u),
    basis: missing.length > 0 ? "not available" : "published",
    standing: missing.length > 0 ? null : weakest,
    source: missing.length > 0 ? missing.map((parameter) => parameter.note).join(" ") : keys.join(", "),
    sourceKeys: keys,
    terms: term.parts.map(({ parameter, coefficient }) => ({
      row: parameter.id,
      coefficient,
      value_kJ_mol: clean(parameter.at(temperature).value),
      u_kJ_mol: clean(parameter.at(temperature).u),
    })),
    medium: lead.medium,
    temperature_K: lead.temperature_K,
    note: notes.length === 0 ? null : notes.join(" "),
  };
}

/**
 * True when each ring of one conformer can be laid on that of the other, for two rings also crosswise, or for a single
 * ring on its mirror image. More than two rings are compared in their own places only: whether an exchange of several
 * rings is a symmetry of the whole molecule cannot be seen from the rings one by one.
 */
function equalBySymmetry(molecule: Molecule, a: ChairSet, b: ChairSet): boolean {
  const relation = (i: number, j: number) => relateChairs(molecule, a[i]!, b[j]!);
  if (a.every((_, i) => relation(i, i) === "identical")) return true;
  if (a.length === 1) return relation(0, 0) === "enantiomeric";
  return a.length === 2 && relation(0, 1) === "identical" && relation(1, 0) === "identical";
}

/**
 * Conformers that are charged exactly alike without being equal by symmetry get a doubt of their own, so that
 * the equality of a model is never printed as an equality of nature.
 */
function distinguish(molecule: Molecule, candidates: readonly Candidate[]): readonly Candidate[] {
  const done: Candidate[] = [];
  for (const candidate of candidates) {
    const twin = done.find(
      (other) =>
        sameCharge(other.energy, candidate.energy) &&
        !equalBySymmetry(molecule, other.chairs, candidate.chairs),
    );
    if (twin === undefined) {
      done.push(candidate);
      continue;
    }
    const count = done.length;
    const parameter = standIn(
      `allowance/alike/${count}`,
      0,
      RESIDUAL,
      `Nothing in the model tells this conformer from ${twin.label}, though they are not equal by symmetry; ${RESIDUAL} kcal/mol of doubt.`,
    );
    const term: EnergyTerm = {
      kind: "additivity allowance",
      label: "not told apart by the model",
      atoms: [],
      parts: [{ parameter, coefficient: 1 }],
    };
    const terms = [...candidate.terms, term];
    done.push({ ...candidate, terms, energy: linearEnergy(terms) });
  }
  return done;
}

function sameCharge(a: LinearEnergy, b: LinearEnergy): boolean {
  const factor = (energy: LinearEnergy, id: string) => energy.get(id)?.coefficient ?? 0;
  return [...new Set([...a.keys(), ...b.keys()])].every((id) => factor(a, id) === factor(b, id));
}

/**
 * Relation of the two chairs of a single ring: the better conformer of each chair, or, where only the group on an
 * inverting atom tells conformers apart, the two places of that group.
 */
function relationOf(molecule: Molecule, ordered: readonly Candidate[]): ChairRelation | null {
  const first = ordered[0]!;
  if (first.chairs.length !== 1) return null;
  const own = first.chairs[0]!;
  const other = ordered.find((candidate) => candidate.chairs[0]!.sign !== own.sign) ?? ordered[1];
  return other === undefined ? null : relateChairs(molecule, own, other.chairs[0]!);
}

/** Parameters whose factor is not the same in all conformers. */
function decidingParameters(energies: readonly LinearEnergy[]): ConformerResult["deciding"] {
  const ids = [...new Set(energies.flatMap((energy) => [...energy.keys()]))].sort();
  return ids.flatMap((id) => {
    const factors = energies.map((energy) => energy.get(id)?.coefficient ?? 0);
    if (factors.every((factor) => factor === factors[0])) return [];
    const { parameter } = energies.find((energy) => energy.has(id))!.get(id)!;
    return [{ id, basis: parameter.basis, standing: parameter.standing }];
  });
}
