import type { Dossier } from "../dossier/Dossier.ts";
import type { FlatAtom } from "./FlatAtom.ts";
import { freePlace } from "./freePlace.ts";
import { labelRuns } from "./labelRuns.ts";
import { CAP_HEIGHT, LABEL_SIZE, SMALL_SIZE } from "./measures.ts";
import { placeText } from "./placeText.ts";
import type { Box, Point, SceneItem, SceneText } from "./Scene.ts";

const DIRECTIONS = 24;
const REACHES = [10, 12, 14, 17, 20];

/**
 * Small numbers at the atoms of analysed rings, and at every stereocentre its descriptor: `1S`, as in the name.
 * They stand outside the ring where there is room.
 */
export function flatLocants(
  dossier: Dossier,
  atoms: readonly FlatAtom[],
  bonds: readonly SceneItem[],
): readonly SceneText[] {
  const lines = bonds.flatMap((item) => {
    if (item.kind === "line") return [{ from: item.from, to: item.to, width: item.width }];
    const [first, wide, other] = item.kind === "polygon" ? item.points : [];
    if (first === undefined || wide === undefined || other === undefined) return [];
    return [
      { from: first, to: wide, width: 0 },
      { from: wide, to: other, width: 0 },
      { from: other, to: first, width: 0 },
    ];
  });
  const boxes: readonly Box[] = atoms.flatMap((atom) => atom.boxes);
  const placed: SceneText[] = [];
  for (const { atom, markup, centre } of notesOf(dossier, atoms)) {
    const at = atoms[atom]!.at;
    const extra = atoms[atom]!.texts.length > 0 ? 0.4 * LABEL_SIZE : 0;
    const outward = Math.atan2(at.y - centre.y, at.x - centre.x);
    const runs = labelRuns(markup, { size: SMALL_SIZE, ink: "muted" });
    const last = runs.at(-1)!;
    const half = (last.x + last.width) / 2;
    const places = Array.from({ length: DIRECTIONS }, (_, step) => {
      const turn = (step % 2 === 0 ? 1 : -1) * Math.ceil(step / 2);
      const angle = outward + (turn * 2 * Math.PI) / DIRECTIONS;
      return REACHES.map((reach) => {
        const far = reach + extra;
        const x = at.x + (far + Math.max(0, half - 4) * Math.abs(Math.cos(angle))) * Math.cos(angle);
        const y = at.y + far * Math.sin(angle) + (CAP_HEIGHT * SMALL_SIZE) / 2;
        return {
          text: placeText(runs, { at: { x, y }, anchor: "middle", part: "locant", atoms: [atom] }),
          cost: 3 * (1 - Math.cos(angle - outward)) + 1.2 * (reach - REACHES[0]!),
        };
      });
    }).flat();
    placed.push(freePlace(places, { lines, boxes, small: placed.map((each) => each.box) }));
  }
  return placed;
}

interface Note {
  readonly atom: number;
  readonly markup: string;
  /** Away from here the note stands outside. */
  readonly centre: Point;
}

function notesOf(dossier: Dossier, atoms: readonly FlatAtom[]): readonly Note[] {
  const middle = (points: readonly Point[]): Point => ({
    x: points.reduce((sum, point) => sum + point.x, 0) / points.length,
    y: points.reduce((sum, point) => sum + point.y, 0) / points.length,
  });
  const descriptor = (atom: number) => {
    const centre = dossier.identity.stereocentres.find((each) => each.atom === atom);
    return centre === undefined || centre.descriptor === "unspecified" ? "" : `*${centre.descriptor}*`;
  };
  // An atom that rings share is numbered once, away from the middle of them all.
  const inRings = [...new Set(dossier.rings.flatMap((ring) => ring.atoms))].map((atom) => {
    const holders = dossier.rings.filter((ring) => ring.atoms.includes(atom));
    return {
      atom,
      markup: `${holders[0]!.locants[holders[0]!.atoms.indexOf(atom)] ?? ""}${descriptor(atom)}`,
      centre: middle(holders.flatMap((ring) => ring.atoms.map((each) => atoms[each]!.at))),
    };
  });
  const numbered = new Set(inRings.map((note) => note.atom));
  const others = dossier.identity.stereocentres
    .filter(({ atom }) => !numbered.has(atom) && descriptor(atom) !== "")
    .map(({ atom }) => ({
      atom,
      markup: descriptor(atom),
      centre: middle(atoms[atom]!.neighbours.map((each) => atoms[each]!.at)),
    }));
  return [...inRings, ...others];
}
