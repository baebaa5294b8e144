import type { Conformer, Dossier, Position, Ring } from "../dossier/Dossier.ts";
import { formatPopulation } from "../quantity/formatPopulation.ts";
import { labelText } from "../quantity/labelText.ts";
import { wordList } from "./wordList.ts";

/** The form of each ring of a conformer, the place of each group and ring bond, and the population. */
export function conformerSentence(dossier: Dossier, conformer: Conformer): string {
  const rings = dossier.rings.map((ring, index) => {
    const places = [...groupPlaces(conformer, ring), ...otherGroups(dossier, conformer, ring)];
    const groups = places.length === 0 ? "no groups" : wordList(places);
    const form = conformer.rings.find((each) => each.ring === ring.index)?.form ?? "chair";
    const name =
      dossier.rings.length > 1 ? `ring ${index + 1}, ${ring.parent}, ${form}` : `${ring.parent} ${form}`;
    return `${name}: ${[groups, ...bondPlaces(conformer, ring)].join(", ")}`;
  });
  return `Conformer ${conformer.id}: ${rings.join("; ")}. Population ${formatPopulation(conformer.population, conformer.population95)}.`;
}

function positionsOf(conformer: Conformer, ring: Ring, kind: Position["kind"]): readonly Position[] {
  return conformer.positions
    .filter((position) => position.ring === ring.index && position.kind === kind)
    .sort((a, b) => Number.parseInt(a.locant, 10) - Number.parseInt(b.locant, 10));
}

function orientationOf({ orientation, pseudo }: Position): string {
  return `${pseudo ? "pseudo" : ""}${orientation}`;
}

function groupPlaces(conformer: Conformer, ring: Ring): readonly string[] {
  return positionsOf(conformer, ring, "group").map(
    (position) => `${labelText(position.group)} ${orientationOf(position)} at ${position.locant}`,
  );
}

/** Groups that are neither axial nor equatorial: on trigonal atoms, and in boats. */
function otherGroups(dossier: Dossier, conformer: Conformer, ring: Ring): readonly string[] {
  const placed = new Set(positionsOf(conformer, ring, "group").map((position) => position.substituent));
  return ring.substituents
    .filter((group) => !placed.has(group.atom))
    .map((group) => {
      const bond = dossier.structure.bonds.find(
        ({ from, to }) =>
          (from === group.ringAtom && to === group.atom) || (to === group.ringAtom && from === group.atom),
      );
      return `${bond?.order === 2 ? "=" : ""}${labelText(group.label)} at ${group.locant}`;
    });
}

/** Bonds into other rings, those of one orientation together. */
function bondPlaces(conformer: Conformer, ring: Ring): readonly string[] {
  const bonds = positionsOf(conformer, ring, "ring bond");
  return [...new Set(bonds.map(orientationOf))].map((orientation) => {
    const locants = bonds.filter((bond) => orientationOf(bond) === orientation).map(placeOf);
    return `ring bond${locants.length === 1 ? "" : "s"} ${orientation} at ${wordList(locants)}`;
  });

  /** At a spiro atom, which has two such bonds, the other end is named too. */
  function placeOf({ locant, ringAtom, substituent }: Position): string {
    const several = bonds.filter((bond) => bond.ringAtom === ringAtom).length > 1;
    const towards = ring.branches.find((branch) => branch.atom === substituent)?.towards ?? "";
    return several && towards !== "" ? `${locant} (to ${towards})` : locant;
  }
}
