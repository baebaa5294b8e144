import type { RelaxedGeometry } from "./Dossier.ts";

/**
 * A geometry as an XYZ file: number of atoms, one line of comment, then element and coordinates in Å, atoms of the input
 * first. The format has no room for charges, bonds or energies, so the comment names the force field and what it is of.
 * @param about - what the coordinates are of; line breaks are taken out.
 */
export function writeXyz(geometry: RelaxedGeometry, about: string): string {
  const lines = geometry.atoms.map(({ element, x, y, z }) => {
    const symbol = element === "D" || element === "T" ? "H" : element;
    return `${symbol.padEnd(2)} ${[x, y, z].map((value) => value.toFixed(4).padStart(9)).join(" ")}`;
  });
  return `${geometry.atoms.length}\n${geometry.method} minimum, Å: ${about.replace(/\s+/g, " ")}\n${lines.join("\n")}\n`;
}
