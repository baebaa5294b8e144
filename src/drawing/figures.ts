import type { Conformer, Dossier } from "../dossier/Dossier.ts";
import { formatTemperature } from "../quantity/formatTemperature.ts";
import { nameMarkup } from "../quantity/nameMarkup.ts";
import { chairScene } from "./chairScene.ts";
import { describeConformer } from "./describeConformer.ts";
import { describeConformers } from "./describeConformers.ts";
import { describeStructure } from "./describeStructure.ts";
import { describeTemperatures } from "./describeTemperatures.ts";
import { equilibriumScene } from "./equilibriumScene.ts";
import type { Figure } from "./Figure.ts";
import type { FigureOptions } from "./FigureOptions.ts";
import { temperatureScene } from "./temperatureScene.ts";
import { wedgeScene } from "./wedgeScene.ts";

export type FigureName = "equilibrium" | "chair" | "wedge" | "temperature";

/** Every kind of figure by the name that authors write in `::figure[…]`. */
export const FIGURES: Readonly<Record<FigureName, Figure>> = {
  equilibrium: {
    title: "Conformers and their equilibrium",
    caption: captionOfEquilibrium,
    describe: (dossier) => describeConformers(dossier),
    canShow: drawable,
    scene: equilibriumScene,
  },
  chair: {
    title: "One conformer",
    caption: (dossier, options = {}) => {
      const { id, label } = chosenConformer(dossier, options);
      return `Conformer ${id}${label === "" ? "" : ` (${label})`} of ${nameMarkup(dossier.name)}. ${cues(dossier)}`;
    },
    describe: (dossier, options = {}) => describeConformer(dossier, chosenConformer(dossier, options)),
    canShow: (dossier, options = {}) =>
      drawable(dossier) &&
      (options.conformer === undefined || dossier.conformers.some(({ id }) => id === options.conformer)),
    scene: (dossier, options = {}) => chairScene(dossier, chosenConformer(dossier, options).id, options),
  },
  wedge: {
    title: "Structural diagram",
    caption: (dossier) => {
      const wedged = dossier.structure.bonds.some((bond) => bond.wedge !== null);
      const wedges = wedged
        ? " Solid wedges point towards the viewer, hashed wedges away; the narrow end is at the stereocentre."
        : "";
      return `Structural diagram of ${nameMarkup(dossier.name)} with ring locants.${wedges}`;
    },
    describe: (dossier) => describeStructure(dossier),
    canShow: (dossier) => dossier.structure.atoms.length > 0,
    scene: wedgeScene,
  },
  temperature: {
    title: "Populations against temperature",
    caption: (dossier) =>
      `Populations of the conformers of ${nameMarkup(dossier.name)} (${medium(dossier)}) against temperature. ` +
      "Bands: 95\u00a0% intervals; dotted line: 50\u00a0%; " +
      `vertical line: ${formatTemperature(dossier.conditions.temperature_K)}.`,
    describe: (dossier) => describeTemperatures(dossier),
    canShow: (dossier) => dossier.conformers.length > 0 && dossier.temperatures.length > 1,
    scene: temperatureScene,
  },
};

/** Every conformer has coordinates for all ring atoms; a system that could not be built in space has none. */
function drawable(dossier: Dossier): boolean {
  return (
    dossier.conformers.length > 0 &&
    dossier.conformers.every(({ geometry }) =>
      dossier.systems.every(({ atoms }) =>
        atoms.every((atom) => geometry.atoms.some((each) => each.atom === atom)),
      ),
    )
  );
}

/** What the weight of lines and the letters beside bonds mean, as far as the dossier's drawings use them. */
function cues({ conformers }: Dossier): string {
  const groups = conformers.flatMap(({ positions }) => positions.filter(({ kind }) => kind === "group"));
  const mixed = conformers.some(({ positions }) =>
    positions.some(
      (one) =>
        one.kind === "group" &&
        positions.some(
          (other) => other.substituent === one.substituent && other.orientation !== one.orientation,
        ),
    ),
  );
  const both = mixed ? ", a/e a bond that is axial in one ring and equatorial in another" : "";
  const pseudo = groups.some((position) => position.pseudo) ? ", ψ those beside a double bond" : "";
  return `The nearer ring edge is heavier; the letters a and e mark axial and equatorial bonds${both}${pseudo}.`;
}

function captionOfEquilibrium(dossier: Dossier): string {
  const several = dossier.conformers.length > 1;
  const what = several ? "Conformers" : "The conformer";
  const arrows =
    several && !dossier.equilibria.every((each) => each.bySymmetry)
      ? " Arrow lengths show the direction of the equilibrium, on a logarithmic scale."
      : "";
  return (
    `${what} of ${nameMarkup(dossier.name)} (${medium(dossier)}) at ${formatTemperature(dossier.conditions.temperature_K)}, ` +
    `with populations and 95\u00a0% intervals. ${cues(dossier)}${arrows}`
  );
}

function medium({ conditions }: Dossier): string {
  return conditions.solvent === "unstated" ? "solvent not stated" : conditions.solventLabel;
}

function chosenConformer(dossier: Dossier, options: FigureOptions): Conformer {
  const id = options.conformer ?? dossier.conformers[0]?.id;
  const found = dossier.conformers.find((conformer) => conformer.id === id);
  if (found === undefined) throw new RangeError(`${dossier.code} has no conformer ${id ?? "to draw"}`);
  return found;
}
