import type { Structure, StructureBond } from "../dossier/Dossier.ts";
import { clipSegment } from "./clipSegment.ts";
import type { FlatAtom } from "./FlatAtom.ts";
import { growBox } from "./growBox.ts";
import { FLAT_BOND, LABEL_GAP } from "./measures.ts";
import type { Part, Point, SceneItem, SceneLine } from "./Scene.ts";
import { shortestRing } from "./shortestRing.ts";

const STROKE = 0.038 * FLAT_BOND;
/** Between the lines of a multiple bond; how much an inner line is shortened at either end. */
const SPACING = 0.17 * FLAT_BOND;
const SHORTENED = 0.13 * FLAT_BOND;
/** Width of a wedge at its wide end; distance of the bars of a hashed one. */
const WEDGE_WIDTH = 0.2 * FLAT_BOND;
const HASH_SPACING = 0.085 * FLAT_BOND;

/** One bond of the flat diagram: lines, a solid wedge or the bars of a hashed one, the narrow end at `from`. */
export function flatBondItems(
  bond: StructureBond,
  structure: Structure,
  atoms: readonly FlatAtom[],
): readonly SceneItem[] {
  const [from, to] = trimmed(atoms[bond.from]!, atoms[bond.to]!);
  const along = unit(from, to);
  const across = { x: -along.y, y: along.x };
  const ids = [bond.from, bond.to];
  if (bond.wedge === "solid") return [solidWedge(from, to, across, ids)];
  if (bond.wedge === "hashed") return hashedWedge(from, to, across, ids);
  const line = (offset: number, shortened: number): SceneLine =>
    plainLine(
      move(move(from, across, offset), along, shortened),
      move(move(to, across, offset), along, -shortened),
      STROKE,
      "bond",
      ids,
    );
  if (bond.order === 3) return [line(0, 0), line(SPACING, 0), line(-SPACING, 0)];
  if (bond.order === 1) return [line(0, 0)];
  const side = innerSide(bond, structure, atoms, across);
  if (side === 0) return [line(SPACING / 2, 0), line(-SPACING / 2, 0)];
  const [start, end] = [bond.from, bond.to].map((atom) =>
    atoms[atom]!.texts.length > 0 ? 0 : SHORTENED,
  ) as [number, number];
  const inner = plainLine(
    move(move(from, across, side * SPACING), along, start),
    move(move(to, across, side * SPACING), along, -end),
    STROKE,
    "bond",
    ids,
  );
  return [line(0, 0), inner];
}

/**
 * Side of the second line of a double bond: towards the ring it belongs to, else towards the side with more
 * neighbours; 0 for a line on either side, as for the end of a chain.
 */
function innerSide(
  bond: StructureBond,
  structure: Structure,
  atoms: readonly FlatAtom[],
  across: Point,
): 1 | -1 | 0 {
  const [from, to] = [atoms[bond.from]!, atoms[bond.to]!];
  const ring = shortestRing(structure, bond);
  const sideOf = (points: readonly Point[]) =>
    points.reduce((sum, point) => {
      const distance = (point.x - from.at.x) * across.x + (point.y - from.at.y) * across.y;
      return sum + (Math.abs(distance) < 1 ? 0 : Math.sign(distance));
    }, 0);
  if (ring !== null) return sideOf(ring.map((atom) => atoms[atom]!.at)) >= 0 ? 1 : -1;
  if (from.neighbours.length === 1 || to.neighbours.length === 1) return 0;
  const balance = sideOf([...from.neighbours, ...to.neighbours].map((atom) => atoms[atom]!.at));
  return balance > 0 ? 1 : balance < 0 ? -1 : 0;
}

function solidWedge(from: Point, to: Point, across: Point, atoms: readonly number[]): SceneItem {
  return {
    kind: "polygon",
    part: "wedge",
    atoms,
    group: "",
    points: [
      move(from, across, STROKE / 2),
      move(to, across, WEDGE_WIDTH / 2),
      move(to, across, -WEDGE_WIDTH / 2),
      move(from, across, -STROKE / 2),
    ],
    closed: true,
    ink: "ink",
    opacity: 1,
    width: 0,
    dash: [],
  };
}

function hashedWedge(from: Point, to: Point, across: Point, atoms: readonly number[]): readonly SceneItem[] {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const count = Math.max(4, Math.round(length / HASH_SPACING));
  return Array.from({ length: count }, (_, index) => {
    const share = (index + 0.6) / count;
    const middle = { x: from.x + share * (to.x - from.x), y: from.y + share * (to.y - from.y) };
    const half = Math.max(STROKE / 2, (share * WEDGE_WIDTH) / 2);
    return plainLine(move(middle, across, half), move(middle, across, -half), STROKE, "hash", atoms);
  });
}

/** The ends of a bond, each drawn back from the letters that stand there. */
function trimmed(a: FlatAtom, b: FlatAtom): readonly [Point, Point] {
  const inside = (atom: FlatAtom, from: Point, to: Point) =>
    Math.max(0, ...atom.boxes.map((box) => clipSegment(from, to, growBox(box, LABEL_GAP))?.[1] ?? 0));
  const start = inside(a, a.at, b.at);
  const end = inside(b, b.at, a.at);
  const at = (share: number) => ({
    x: a.at.x + share * (b.at.x - a.at.x),
    y: a.at.y + share * (b.at.y - a.at.y),
  });
  return [at(start), at(Math.max(start, 1 - end))];
}

function plainLine(from: Point, to: Point, width: number, part: Part, atoms: readonly number[]): SceneLine {
  return {
    kind: "line",
    part,
    atoms,
    group: "",
    from,
    to,
    width,
    endWidth: width,
    ink: "ink",
    dash: [],
    depth: null,
  };
}

function move(point: Point, direction: Point, distance: number): Point {
  return { x: point.x + distance * direction.x, y: point.y + distance * direction.y };
}

function unit(from: Point, to: Point): Point {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  return { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
}
