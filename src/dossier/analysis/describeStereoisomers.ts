import { enumerateStereoisomers, type Stereoisomer } from "../../structure/enumerateStereoisomers.ts";
import type { Molecule } from "../../structure/Molecule.ts";
import { ringFaces } from "../../structure/ringFaces.ts";
import type { AnalysedRing } from "../../structure/StructureAnalysis.ts";
import type { Toolkit } from "../../structure/Toolkit.ts";
import { compareLocants } from "../compareLocants.ts";
import type { Stereocentre, StereoisomerCount, StereoisomerSummary } from "../Dossier.ts";
import { relativeConfiguration } from "../relativeConfiguration.ts";
import { describeCentres } from "./describeCentres.ts";
import { configurationOf } from "./describeRing.ts";
import { describeSystems } from "./describeSystems.ts";

/** Most stereoisomers that are described one by one, five centres' worth; more are counted only. */
const MAXIMUM_LISTED = 32;

export interface StereoisomerResult {
  /** Empty when there is one only, or too many. */
  readonly stereoisomers: readonly StereoisomerSummary[];
  readonly stereoisomerCount: StereoisomerCount;
  /**
   * The stereocentres of the compound under every numbering that the symmetry of its constitution makes as good as the
   * printed one, which comes first: (1S,2R) beside (1R,2S) for a meso compound. Empty where the compound is not one known
   * stereoisomer.
   */
  readonly equalNumberings: readonly (readonly Stereocentre[])[];
}

/**
 * Every stereoisomer of a compound's constitution in words. All keep the locants of the compound; where symmetry leaves a
 * choice, R comes before S (IUPAC P-31.1.4).
 * @param rings - analysed rings of the compound; only their numbering and groups are used.
 */
export function describeStereoisomers(
  molecule: Molecule,
  rings: readonly AnalysedRing[],
  toolkit: Toolkit,
): StereoisomerResult {
  const { isomers, upTo, complete } = enumerateStereoisomers(molecule, toolkit);
  const locants = locantsOf(rings);
  const same = isomers.filter(({ relation }) => relation === "same");
  const equalNumberings =
    same.length === 1
      ? [same[0]!.molecule, ...same[0]!.arrangements].map((made) => centresOf(made, locants, toolkit))
      : [];
  const listed = isomers.length > 1 && isomers.length <= MAXIMUM_LISTED ? isomers : [];
  return {
    stereoisomers: listed.map((isomer) => summarise(isomer, rings, locants, toolkit)),
    stereoisomerCount: { distinct: complete ? isomers.length : null, upTo },
    equalNumberings,
  };
}

function locantsOf(rings: readonly AnalysedRing[]): ReadonlyMap<number, string> {
  return new Map(
    rings.flatMap((ring) => ring.atoms.map((atom, i): [number, string] => [atom, ring.names[i]!])),
  );
}

/** Labelled centres, those with locants first in their order. */
function centresOf(
  molecule: Molecule,
  locants: ReadonlyMap<number, string>,
  toolkit: Toolkit,
): readonly Stereocentre[] {
  return [...toolkit.descriptors(molecule).atoms]
    .flatMap(([atom, label]) =>
      label === "R" || label === "S" || label === "r" || label === "s"
        ? [{ atom, descriptor: label, locant: locants.get(atom) ?? null } as const]
        : [],
    )
    .sort((a, b) => compareLocants(a.locant ?? "", b.locant ?? "") || a.atom - b.atom);
}

function summarise(
  isomer: Stereoisomer,
  rings: readonly AnalysedRing[],
  locants: ReadonlyMap<number, string>,
  toolkit: Toolkit,
): StereoisomerSummary {
  const shown = isomer.relation === "same" ? isomer.molecule : firstR(isomer, locants, toolkit);
  const labels = toolkit.descriptors(shown);
  const bonds = labels.bonds.filter(({ descriptor }) => descriptor === "E" || descriptor === "Z");
  const turned = rings.map((ring) => ({ ...ring, sites: ringFaces(shown, ring.atoms) }));
  const handed = [...labels.atoms.values()].some((label) => label === "R" || label === "S");
  return {
    canonicalSmiles: isomer.canonicalSmiles,
    relation: isomer.relation,
    descriptors: [
      ...describeCentres(labels.atoms, rings),
      ...bonds.map(({ atoms, descriptor }) =>
        bonds.length === 1 ? descriptor : `atoms ${atoms.join("=")} ${descriptor}`,
      ),
    ].join(","),
    configuration: relativeConfiguration(
      turned.map((ring) => ({ configuration: configurationOf(ring) })),
      describeSystems(shown, turned, new Set()),
    ),
    chirality: isomer.superimposable ? (handed ? "meso" : "achiral") : "chiral",
  };
}

/** Of the equal ways of numbering a stereoisomer the one with R, then r, at the lowest locants. */
function firstR(isomer: Stereoisomer, locants: ReadonlyMap<number, string>, toolkit: Toolkit): Molecule {
  const key = (molecule: Molecule) =>
    centresOf(molecule, locants, toolkit)
      .map(({ descriptor }) => "RrsS".indexOf(descriptor))
      .join("");
  const keyed = isomer.arrangements.map((molecule) => ({ molecule, key: key(molecule) }));
  return keyed.reduce((best, next) => (next.key < best.key ? next : best)).molecule;
}
