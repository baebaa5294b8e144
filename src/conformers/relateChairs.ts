import type { Molecule } from "../structure/Molecule.ts";
import { axialFace, type Chair } from "./Chair.ts";

export type ChairRelation = "identical" | "enantiomeric" | "diastereomeric";

interface Site {
  readonly above: boolean;
  readonly atom: string;
  readonly axial: Branch;
  readonly equatorial: Branch;
}
interface Branch {
  readonly form: string;
  readonly mirrorForm: string;
}
const HYDROGEN: Branch = { form: "H", mirrorForm: "H" };

/**
 * Whether two chairs of one ring are superimposable, mirror images, or neither.
 *
 * Each chair is six sites with an axial and an equatorial branch. A chair can be laid on another by the twelve
 * maps of the ring onto itself, each turned over or not as the heights demand. A shift keeps the sense of walking
 * and a reversal changes it; turning over changes the vertical sense: the map is a proper motion when neither or
 * both change. Branches must match as they are under a proper motion and as mirror images under an improper one.
 */
export function relateChairs(molecule: Molecule, a: Chair, b: Chair): ChairRelation {
  const first = sitesOf(molecule, a);
  const second = sitesOf(molecule, b);
  let mirror = false;
  for (let offset = 0; offset < 6; offset++) {
    for (const reversed of [false, true]) {
      const image = (i: number) => second[(reversed ? offset - i + 6 : offset + i) % 6]!;
      const turned = first[0]!.above !== image(0).above;
      const proper = reversed === turned;
      const fits = first.every((site, i) => {
        const other = image(i);
        return (
          site.atom === other.atom &&
          matches(site.axial, other.axial, proper) &&
          matches(site.equatorial, other.equatorial, proper)
        );
      });
      if (fits && proper) return "identical";
      if (fits) mirror = true;
    }
  }
  return mirror ? "enantiomeric" : "diastereomeric";
}

function matches(a: Branch, b: Branch, proper: boolean): boolean {
  return a.form === (proper ? b.form : b.mirrorForm);
}

function sitesOf(molecule: Molecule, chair: Chair): readonly Site[] {
  return chair.ring.atoms.map((index) => {
    const atom = molecule.atoms[index]!;
    const face = axialFace(chair, index);
    const here = chair.ring.substituents.filter((substituent) => substituent.ringAtom === index);
    return {
      above: face === "up",
      atom: `${atom.isotope}${atom.element}${atom.charge}h${atom.hydrogens}`,
      axial: here.find((substituent) => chair.faces.get(substituent.atom) === face) ?? HYDROGEN,
      equatorial: here.find((substituent) => chair.faces.get(substituent.atom) !== face) ?? HYDROGEN,
    };
  });
}
