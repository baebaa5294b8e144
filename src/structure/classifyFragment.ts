import type { Fragment } from "./extractFragment.ts";
import { type Atom, bondBetween, type Molecule } from "./Molecule.ts";

/**
 * The class of a group by its first atom and that atom's neighbours, for groups the register does not list.
 * Keys are those of the register's group classes.
 */
export function classifyFragment(fragment: Fragment): string {
  const molecule = fragment.molecule;
  const first = molecule.atoms[molecule.atoms[fragment.attachment]!.neighbours[0]!]!;
  const others = first.neighbours
    .filter((index) => index !== fragment.attachment)
    .map((index) => molecule.atoms[index]!);
  switch (first.element) {
    case "C":
      return carbonClass(molecule, first, others);
    case "O":
      return oxygenClass(molecule, first, others);
    case "N":
      return nitrogenClass(molecule, first, others);
    case "S":
    case "Se":
      return sulfurClass(molecule, first, others);
    case "P":
      return "phosphorus";
    case "Si":
    case "Ge":
      return "silyl";
    case "F":
      return "fluoro";
    case "Cl":
      return "chloro";
    case "Br":
      return "bromo";
    case "I":
      return "iodo";
    case "Sn":
    case "Pb":
    case "Hg":
    case "Mg":
    case "Zn":
    case "Li":
      return "metal";
    default:
      return "other";
  }
}

const doubleTo = (molecule: Molecule, atom: Atom, others: readonly Atom[], ...elements: string[]) =>
  others.filter(
    (other) =>
      elements.includes(other.element) && bondBetween(molecule, atom.index, other.index)!.order === 2,
  );

function carbonClass(molecule: Molecule, first: Atom, others: readonly Atom[]): string {
  if (first.aromatic) {
    return aromaticPart(molecule, first).every((atom) => atom.element === "C") ? "aryl" : "heteroaryl";
  }
  const triple = others.find((other) => bondBetween(molecule, first.index, other.index)!.order === 3);
  if (triple !== undefined) return triple.element === "N" ? "cyano" : "alkynyl";
  if (doubleTo(molecule, first, others, "O", "S", "N").length > 0) {
    const single = others.find((other) => bondBetween(molecule, first.index, other.index)!.order === 1);
    if (single?.element === "N") return "carboxamide";
    if (single?.element === "O") return single.charge < 0 ? "carboxylate" : "ester";
    return "acyl";
  }
  if (doubleTo(molecule, first, others, "C").length > 0) return "alkenyl";
  if (others.some((other) => other.element === "F")) return "fluoroalkyl";
  const heavy = others.filter((other) => other.element !== "H").length;
  return heavy <= 1 ? "primary-alkyl" : heavy === 2 ? "secondary-alkyl" : "tertiary-alkyl";
}

/** The aromatic atoms joined to one without a break. */
function aromaticPart(molecule: Molecule, start: Atom): readonly Atom[] {
  const found = new Set([start.index]);
  const queue = [start];
  while (queue.length > 0) {
    for (const neighbour of queue.pop()!.neighbours) {
      const atom = molecule.atoms[neighbour]!;
      if (!atom.aromatic || found.has(neighbour)) continue;
      found.add(neighbour);
      queue.push(atom);
    }
  }
  return [...found].map((index) => molecule.atoms[index]!);
}

function oxygenClass(molecule: Molecule, first: Atom, others: readonly Atom[]): string {
  const next = others[0];
  if (next === undefined) return first.hydrogens > 0 ? "hydroxyl" : "oxo";
  if (next.element === "Si") return "silyloxy";
  if (next.element === "S" || next.element === "P") return "sulfonyloxy";
  if (next.aromatic) return "aryloxy";
  const far = next.neighbours
    .map((index) => molecule.atoms[index]!)
    .filter((atom) => atom.index !== first.index);
  if (doubleTo(molecule, next, far, "O", "S", "N").length > 0) return "acyloxy";
  return "alkoxy";
}

function nitrogenClass(molecule: Molecule, first: Atom, others: readonly Atom[]): string {
  const multiple = others.find((other) => bondBetween(molecule, first.index, other.index)!.order > 1);
  if (multiple?.element === "N") return "azido";
  if (multiple?.element === "O") return "nitro";
  // Isocyanides, isocyanates and their kin resemble no amine.
  if (multiple !== undefined) return "other";
  if (first.charge > 0) return "ammonium";
  const acyl = others.some((other) => {
    const far = other.neighbours.map((index) => molecule.atoms[index]!);
    return (
      ["C", "S", "P"].includes(other.element) &&
      !other.aromatic &&
      doubleTo(molecule, other, far, "O", "S", "N").length > 0
    );
  });
  if (acyl) return "amido";
  if (others.length === 0) return "amino";
  return first.hydrogens > 0 ? "alkylamino" : "dialkylamino";
}

function sulfurClass(molecule: Molecule, first: Atom, others: readonly Atom[]): string {
  const oxygens = doubleTo(molecule, first, others, "O").length;
  if (oxygens >= 2) return "sulfonyl";
  if (oxygens === 1) return "sulfinyl";
  return others.length === 0 ? "thiol" : "sulfanyl";
}
