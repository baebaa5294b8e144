import { type Chair, hasOrientations, isPseudo, orientationOf } from "../../conformers/Chair.ts";
import {
  type Arrangement,
  type ChairSet,
  enumerateConformers,
} from "../../conformers/enumerateConformers.ts";
import { idealGeometry } from "../../conformers/idealGeometry.ts";
import type { Mechanics } from "../../conformers/mechanics/Mechanics.ts";
import { relateConformers } from "../../conformers/relateConformers.ts";
import { type RelaxedConformer, relaxConformer } from "../../conformers/relaxConformer.ts";
import { twistConformers } from "../../conformers/twistConformers.ts";
import { conformerTerms } from "../../energetics/conformerTerms.ts";
import type { EnergyContext } from "../../energetics/EnergyContext.ts";
import type { EnergyTerm } from "../../energetics/EnergyTerm.ts";
import { equilibriumConstant } from "../../energetics/equilibriumConstant.ts";
import { combine, type LinearEnergy, linearEnergy } from "../../energetics/LinearEnergy.ts";
import { nitrogenPlaces } from "../../energetics/nitrogenPlaces.ts";
import { populations } from "../../energetics/populations.ts";
import { computedParameter, standIn } from "../../energetics/standIn.ts";
import { kelvin, kilojoulePerMole, NORMAL_95 } from "../../quantity/units.ts";
import type { Body } from "../../structure/Body.ts";
import type { Molecule } from "../../structure/Molecule.ts";
import type { AnalysedRing } from "../../structure/StructureAnalysis.ts";
import type {
  ChairRelation,
  Conformer,
  Contribution,
  Equilibrium,
  Kinship,
  Position,
  TemperatureRow,
} from "../Dossier.ts";
import { conformerLabels } from "./conformerLabels.ts";
import { describeRelaxed } from "./describeRelaxed.ts";
import { axialTertButyls, isStrained } from "./isStrained.ts";

/** Standard uncertainty of an energy difference between two forms by mechanics, kcal/mol (judged). */
const MECHANICS_DOUBT = 1.5;
/** What MMFF94s charges an axial tert-butyl group beyond its published value, kcal/mol (6.2 against 4.8). */
const TERT_BUTYL_EXCESS = 1.4;
/** Doubt between conformers that differ and yet are charged alike, kcal/mol. */
const RESIDUAL = 0.2;
/** Doubt of each conformer of a system of several rings, whose strain single values do not show, kcal/mol. */
const RING_SYSTEM = { fused: 0.4, bridged: 1.0 };
/** Temperatures of the dossier's table, K; its own is added. */
const TEMPERATURE_GRID = [173.15, 198.15, 223.15, 248.15, 273.15, 298.15, 323.15, 348.15, 373.15];

export interface ConformerResult {
  readonly conformers: readonly Conformer[];
  readonly relation: ChairRelation | null;
  readonly kinship: Kinship;
  readonly equilibria: readonly Equilibrium[];
  readonly temperatures: readonly TemperatureRow[];
  /** Parameters that differ between conformers and so decide the result: id and basis. */
  readonly deciding: readonly {
    readonly id: string;
    readonly basis: string;
    readonly standing: string | null;
  }[];
  /** The ring states and the energy terms behind each conformer, in the same order. */
  readonly chairSets: readonly ChairSet[];
  readonly terms: readonly (readonly EnergyTerm[])[];
}

/** A molecule with all senses that matter, the rings to analyse in it, and the part that is compared. */
export interface ConformerInput {
  readonly molecule: Molecule;
  readonly body: Body;
  readonly rings: readonly AnalysedRing[];
}

interface Candidate {
  readonly arrangement: Arrangement;
  /** Filled in where it is known before the others, as for twist-boats. */
  readonly relaxed: RelaxedConformer | null;
  readonly chairs: ChairSet;
  readonly label: string;
  readonly terms: readonly EnergyTerm[];
  readonly energy: LinearEnergy;
}

/**
 * Every all-chair conformer with its energy, population and geometry, most stable first.
 * @param temperature - in K, above zero.
 * @returns `too many` when they cannot be listed, `none` when no arrangement of chairs closes every ring.
 */
export function analyseConformers(
  { molecule, body, rings }: ConformerInput,
  context: EnergyContext,
  temperature: number,
  mechanics: Mechanics | null,
): ConformerResult | "too many" | "none" {
  const arrangements = enumerateConformers(molecule, rings);
  if (arrangements === null) return "too many";
  const labels = conformerLabels(arrangements.map(({ chairs }) => chairs));
  const chairForms = distinguish(
    body,
    arrangements.map((arrangement, i) => {
      const { chairs } = arrangement;
      const terms = conformerTerms(chairs, context);
      return { arrangement, relaxed: null, chairs, label: labels[i]!, terms, energy: linearEnergy(terms) };
    }),
  );
  const candidates = [
    ...chairForms,
    ...twistForms({ molecule, body, rings }, chairForms, temperature, mechanics),
  ];
  if (candidates.length === 0) return "none";
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
      rings: candidate.chairs.map((chair) => ({ ring: chair.ring.index, form: chair.form })),
      positions: candidate.chairs.filter(hasOrientations).flatMap(positionsOf),
      deltaG_kJ_mol: clean(value),
      u_kJ_mol: clean(u),
      sum_kJ_mol: clean(combine([{ energy: candidate.energy, weight: 1 }], T).value),
      population: shares[i]!.population,
      population95: shares[i]!.population95,
      contributions: candidate.terms.map((term) => contributionOf(term, temperature)),
      geometry: { atoms: idealGeometry(candidate.arrangement) },
      relaxed: relaxedOf(candidate, mechanics),
      nitrogens: candidate.chairs
        .filter(({ form }) => form === "chair")
        .flatMap(({ ring }) =>
          ring.atoms
            .filter((atom) => isSecondaryAmine(molecule, ring, atom))
            .map((atom) => ({
              ring: ring.index,
              atom,
              locant: ring.names[ring.atoms.indexOf(atom)]!,
              ...nitrogenPlaces(context, ring, temperature),
            })),
        ),
    };
  });
  const grid = [...new Set([...TEMPERATURE_GRID, temperature])].sort((a, b) => a - b);
  return {
    conformers,
    chairSets: ordered.map((candidate) => candidate.chairs),
    terms: ordered.map((candidate) => candidate.terms),
    relation: relationOf(body, ordered),
    kinship: kinshipOf(body, ordered),
    equilibria: ordered.slice(1).map((candidate, i) => {
      const { value, u } = relativeTo(lowest.energy, candidate.energy);
      const bySymmetry = equalBySymmetry(body, lowest, candidate);
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

function relaxedOf({ arrangement, relaxed }: Candidate, mechanics: Mechanics | null): Conformer["relaxed"] {
  if (mechanics === null) return null;
  const found = relaxed ?? relaxConformer(arrangement, mechanics);
  return found === null ? null : describeRelaxed(arrangement, found);
}

/**
 * Forms with a twist-boat, where mechanics is at hand and no chair is good: none at all, a tertiary group axial in the
 * best, or more than 4 kcal/mol of contributions in it. Their energy is that of the best chair plus the difference by
 * mechanics, with a wide doubt, since force fields are poor judges of single groups.
 */
function twistForms(
  { molecule, body, rings }: ConformerInput,
  chairForms: readonly Candidate[],
  temperature: number,
  mechanics: Mechanics | null,
): readonly Candidate[] {
  if (mechanics === null) return [];
  const best = [...chairForms].sort(
    (a, b) =>
      combine([{ energy: a.energy, weight: 1 }], temperature).value -
      combine([{ energy: b.energy, weight: 1 }], temperature).value,
  )[0];
  if (best !== undefined && !isStrained(best.chairs, best.terms, temperature)) return [];
  const reference = best === undefined ? null : relaxConformer(best.arrangement, mechanics);
  if (best !== undefined && reference === null) return [];
  const twists = twistConformers(molecule, rings, body, mechanics);
  const labels = conformerLabels(twists.map(({ arrangement }) => arrangement.chairs));
  const base = reference?.energy_kJ_mol ?? twists[0]?.relaxed.energy_kJ_mol ?? 0;
  const excess = best === undefined ? 0 : TERT_BUTYL_EXCESS * axialTertButyls(best.chairs);
  return twists.map(({ arrangement, relaxed }, i): Candidate => {
    const difference = (relaxed.energy_kJ_mol - base) / 4.184 + excess;
    const why = `Energy of this form over ${best === undefined ? "the lowest one" : `the best chair, ${best.label}`} by ${mechanics.method}${excess > 0 ? `, with ${excess.toFixed(1)} kcal/mol added for what the force field overcharges axial tert-butyl` : ""}; ${MECHANICS_DOUBT} kcal/mol of doubt.`;
    // Forms equal by symmetry share one parameter, so that they move together.
    const own = computedParameter(
      `mechanics/${relaxed.method}/${difference.toFixed(2)}`,
      difference,
      MECHANICS_DOUBT,
      relaxed.method,
      why,
    );
    const terms: EnergyTerm[] = [
      ...(best?.terms ?? []).map((term) => ({ ...term, label: `${term.label} (in the best chair)` })),
      {
        kind: "non-chair form",
        label: "this form over the best chair",
        atoms: [],
        parts: [{ parameter: own, coefficient: 1 }],
      },
    ];
    return {
      arrangement,
      relaxed,
      chairs: arrangement.chairs,
      label: labels[i]!,
      terms,
      energy: linearEnergy(terms),
    };
  });
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

/** A ring N–H whose hydrogen has two places: pyramidal, uncharged. */
function isSecondaryAmine(molecule: Molecule, ring: AnalysedRing, index: number): boolean {
  const atom = molecule.atoms[index]!;
  const flat = ring.flatAtoms.includes(ring.atoms.indexOf(index));
  return atom.element === "N" && atom.charge === 0 && atom.hydrogens === 1 && !flat;
}

function positionsOf(chair: Chair): readonly Position[] {
  const { ring } = chair;
  const branches = new Set(ring.branches);
  return [...ring.substituents, ...ring.branches].map((group) => ({
    ring: ring.index,
    ringAtom: group.ringAtom,
    substituent: group.atom,
    locant: ring.names[ring.atoms.indexOf(group.ringAtom)]!,
    kind: branches.has(group) ? ("ring bond" as const) : ("group" as const),
    group: group.label,
    orientation: orientationOf(chair, group),
    pseudo: isPseudo(chair, group.ringAtom),
    face: chair.faces.get(group.atom)!,
  }));
}

function contributionOf(term: EnergyTerm, temperature: number): Contribution {
  const energy = linearEnergy([term]);
  const { value, u } = combine([{ energy, weight: 1 }], temperature);
  const parameters = [...energy.values()].map(({ parameter }) => parameter);
  const missing = parameters.filter((parameter) => parameter.basis === "not available");
  const computed = parameters.some((parameter) => parameter.basis === "computed");
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
    basis: missing.length > 0 ? "not available" : computed ? "computed" : "published",
    standing: missing.length > 0 || computed ? null : weakest,
    source:
      missing.length > 0
        ? missing.map((parameter) => parameter.note).join(" ")
        : computed
          ? parameters.map((parameter) => parameter.note).join(" ")
          : keys.join(", "),
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

/** Superimposable and mirror-image conformers have equal energies, and no others have by symmetry. */
function equalBySymmetry(body: Body, a: Candidate, b: Candidate): boolean {
  return relateConformers(body, a.arrangement, b.arrangement) !== "diastereomeric";
}

/** Pairs that are superimposable or mirror images, and how many conformers are left without them. */
function kinshipOf(body: Body, ordered: readonly Candidate[]): Kinship {
  const pairs: Kinship["pairs"][number][] = [];
  // Each conformer is compared with the first of every class so far; the rest of a class follows from that.
  const classes: { readonly members: { readonly index: number; readonly mirrored: boolean }[] }[] = [];
  ordered.forEach((candidate, index) => {
    for (const { members } of classes) {
      const first = ordered[members[0]!.index]!;
      const relation = relateConformers(body, first.arrangement, candidate.arrangement);
      if (relation === "diastereomeric") continue;
      const mirrored = relation === "enantiomeric";
      for (const member of members) {
        pairs.push({
          first: conformerId(member.index),
          second: conformerId(index),
          relation: member.mirrored === mirrored ? "identical" : "enantiomeric",
        });
      }
      members.push({ index, mirrored });
      return;
    }
    classes.push({ members: [{ index, mirrored: false }] });
  });
  return {
    distinct: classes.reduce(
      (sum, { members }) => sum + (members.some(({ mirrored }) => mirrored) ? 2 : 1),
      0,
    ),
    distinctUpToMirror: classes.length,
    pairs,
  };
}

/**
 * Conformers that are charged exactly alike without being equal by symmetry get a doubt of their own, so that
 * the equality of a model is never printed as an equality of nature.
 */
function distinguish(body: Body, candidates: readonly Candidate[]): readonly Candidate[] {
  const rings = (candidates[0]?.chairs ?? []).map(({ ring }) => ring);
  const severalRings = rings.some((ring) => ring.branches.length > 0);
  const bridged = rings.some((ring) => ring.partners.some(({ shared }) => shared.length > 2));
  const strain = bridged ? RING_SYSTEM.bridged : RING_SYSTEM.fused;
  const done: Candidate[] = [];
  const kinds: Candidate[] = [];
  for (const candidate of candidates) {
    const alike = done.filter((other) => sameCharge(other.energy, candidate.energy));
    const twin = alike.find((other) => !equalBySymmetry(body, other, candidate));
    if (severalRings) {
      let kind = kinds.findIndex((other) => equalBySymmetry(body, other, candidate));
      if (kind < 0) kind = kinds.push(candidate) - 1;
      done.push(
        withDoubt(
          candidate,
          `allowance/ring-system/${kind}`,
          strain,
          "strain of the ring system",
          `What the rings of the system do to each other beyond single contacts is not charged; ${strain} kcal/mol of doubt for each conformer of its own.`,
        ),
      );
      continue;
    }
    done.push(
      twin === undefined
        ? candidate
        : withDoubt(
            candidate,
            `allowance/alike/${done.length}`,
            RESIDUAL,
            "not told apart by the model",
            `Nothing in the model tells this conformer from ${twin.label}, though they are not equal by symmetry; ${RESIDUAL} kcal/mol of doubt.`,
          ),
    );
  }
  return done;
}

function withDoubt(candidate: Candidate, id: string, u: number, label: string, why: string): Candidate {
  const parameter = standIn(id, 0, u, why);
  const term: EnergyTerm = {
    kind: "additivity allowance",
    label,
    atoms: [],
    parts: [{ parameter, coefficient: 1 }],
  };
  const terms = [...candidate.terms, term];
  return { ...candidate, terms, energy: linearEnergy(terms) };
}

function sameCharge(a: LinearEnergy, b: LinearEnergy): boolean {
  const factor = (energy: LinearEnergy, id: string) => energy.get(id)?.coefficient ?? 0;
  return [...new Set([...a.keys(), ...b.keys()])].every((id) => factor(a, id) === factor(b, id));
}

/**
 * Relation of the two chairs of a single ring: the better conformer of each chair, or, where only the group on an
 * inverting atom tells conformers apart, the two places of that group.
 */
function relationOf(body: Body, ordered: readonly Candidate[]): ChairRelation | null {
  const first = ordered[0]!;
  if (first.chairs.length !== 1) return null;
  const own = first.chairs[0]!;
  const other = ordered.find((candidate) => candidate.chairs[0]!.sign !== own.sign) ?? ordered[1];
  return other === undefined ? null : relateConformers(body, first.arrangement, other.arrangement);
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
