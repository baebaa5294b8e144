import type { Structure } from "../dossier/Dossier.ts";
import { type AtomLetters, atomLetters } from "./atomLetters.ts";
import type { FlatAtom } from "./FlatAtom.ts";
import { labelRuns } from "./labelRuns.ts";
import { CAP_HEIGHT, FLAT_BOND, LABEL_SIZE } from "./measures.ts";
import { placeText } from "./placeText.ts";
import { runBoxes } from "./runBoxes.ts";
import type { Point, SceneText, TextAnchor } from "./Scene.ts";

const HEIGHT = CAP_HEIGHT * LABEL_SIZE;
const STACK = HEIGHT + 3.5;
const STYLE = { size: LABEL_SIZE, ink: "ink" } as const;

/**
 * Puts the atoms of the flat diagram on the page: one bond length, y downwards, letters for every atom but
 * carbon, hydrogens on the side that is free of bonds.
 */
export function flatAtoms(structure: Structure): readonly FlatAtom[] {
  const scale = FLAT_BOND / usualLength(structure);
  const points = structure.atoms.map(({ x, y }): Point => ({ x: scale * x, y: -scale * y + 0 }));
  return structure.atoms.map((atom, index): FlatAtom => {
    const neighbours = structure.bonds.flatMap(({ from, to }) =>
      from === index ? [to] : to === index ? [from] : [],
    );
    const at = points[index]!;
    const bare = atom.element === "C" && atom.charge === 0 && atom.isotope === 0 && neighbours.length > 0;
    const letters = atomLetters(atom, true);
    const texts = bare
      ? []
      : setLetters(
          letters,
          index,
          at,
          neighbours.map((other) => points[other]!),
        );
    return { at, neighbours, texts, boxes: texts.flatMap(runBoxes) };
  });
}

function usualLength(structure: Structure): number {
  const lengths = structure.bonds
    .map(({ from, to }) => {
      const [a, b] = [structure.atoms[from]!, structure.atoms[to]!];
      return Math.hypot(a.x - b.x, a.y - b.y);
    })
    .sort((a, b) => a - b);
  return lengths[Math.floor(lengths.length / 2)] || 1.5;
}

type Side = "right" | "left" | "below" | "above";
const SIDES: readonly { readonly side: Side; readonly angle: number; readonly bonus: number }[] = [
  { side: "right", angle: 0, bonus: 12 },
  { side: "left", angle: 180, bonus: 10 },
  { side: "below", angle: 90, bonus: 2 },
  { side: "above", angle: -90, bonus: 0 },
];

function setLetters(
  { element, hydrogens, charge }: AtomLetters,
  index: number,
  at: Point,
  others: readonly Point[],
): readonly SceneText[] {
  const width = (markup: string) => {
    const last = labelRuns(markup, STYLE).at(-1);
    return last === undefined ? 0 : last.x + last.width;
  };
  const baseline = at.y + HEIGHT / 2;
  // A mass number hangs before the letter that stands on the atom's place.
  const symbol = element.replace(/^\^\d+/, "");
  const prefix = width(element) - width(symbol);
  const half = width(symbol) / 2;
  const set = (markup: string, x: number, y: number, anchor: TextAnchor) =>
    placeText(labelRuns(markup, STYLE), { at: { x, y }, anchor, part: "atom label", atoms: [index] });
  const side = hydrogens === "" ? "right" : freeSide(at, others);
  if (side === "right") return [set(element + hydrogens + charge, at.x - half - prefix, baseline, "start")];
  if (side === "left")
    return [set(hydrogens + element + charge, at.x + half + width(charge), baseline, "end")];
  const y = baseline + (side === "below" ? STACK : -STACK);
  return [
    set(element + charge, at.x - half - prefix, baseline, "start"),
    set(hydrogens, at.x - width("H") / 2, y, "start"),
  ];
}

/** The side on which the next bond is farthest away, sideways rather than stacked where both will do. */
function freeSide(at: Point, others: readonly Point[]): Side {
  const angles = others.map((other) => (Math.atan2(other.y - at.y, other.x - at.x) * 180) / Math.PI);
  // At the end of a chain hydrogens are never stacked.
  const allowed = others.length > 1 ? SIDES : SIDES.slice(0, 2);
  const scored = allowed.map(({ side, angle, bonus }) => {
    const nearest = Math.min(180, ...angles.map((each) => Math.abs(((each - angle + 540) % 360) - 180)));
    return { side, score: nearest + bonus };
  });
  return scored.reduce((best, each) => (each.score > best.score + 1e-6 ? each : best)).side;
}
