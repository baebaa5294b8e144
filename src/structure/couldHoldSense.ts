import { bondBetween, type Molecule } from "./Molecule.ts";

/**
 * True for an atom that could be a stereocentre by its element and places: four different-looking places, or a stable
 * pyramid. Whether reversing it gives another substance is for the caller to find out.
 * @param index - of the atom; whether it carries a sense already makes no difference.
 */
export function couldHoldSense(molecule: Molecule, index: number): boolean {
  const atom = molecule.atoms[index]!;
  if (atom.aromatic || atom.radicals > 0) return false;
  const places = atom.neighbours.length + atom.hydrogens;
  const orders = atom.neighbours.map((neighbour) => bondBetween(molecule, index, neighbour)!.order);
  const single = orders.every((order) => order === 1);
  switch (atom.element) {
    case "C":
    case "Si":
    case "Ge":
    case "Sn":
      if (!single || places !== 4 || atom.hydrogens > 1) return false;
      break;
    case "N":
      if (!single || places !== 4 || atom.hydrogens > 0) return false;
      break;
    case "P":
    case "As":
      if (!((places === 3 && single && atom.charge === 0) || places === 4) || atom.hydrogens > 0)
        return false;
      break;
    case "S":
    case "Se":
      if (places !== 3 || atom.hydrogens > 0) return false;
      break;
    default:
      return false;
  }
  return !hasEqualTerminalNeighbours(molecule, index);
}

/** Two equal one-atom neighbours (two methyls, two oxygens of a sulfone) settle the matter without a trial. */
function hasEqualTerminalNeighbours(molecule: Molecule, index: number): boolean {
  const seen = new Set<string>();
  for (const neighbour of molecule.atoms[index]!.neighbours) {
    const atom = molecule.atoms[neighbour]!;
    if (atom.neighbours.length !== 1) continue;
    const order = bondBetween(molecule, index, neighbour)!.order;
    const key = `${atom.element}:${atom.isotope}:${atom.charge}:${atom.hydrogens}:${order}`;
    if (seen.has(key)) return true;
    seen.add(key);
  }
  return false;
}
