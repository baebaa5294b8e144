import type { Group, RingParent } from "../register/Register.ts";
import { attachGroup } from "./attachGroup.ts";
import { isPermutationEven } from "./isPermutationEven.ts";

/** What hangs on one ring atom: one group a face. */
export interface FaceGroups {
  readonly up?: Group;
  readonly down?: Group;
}

/** Ring-closure number of the parent ring; the groups' own rings are numbered above it. */
const RING_CLOSURE = 1;
/** Elements that may be written without brackets. */
const ORGANIC_SUBSET = ["B", "C", "N", "O", "P", "S"];
/** Pyramidal atoms that keep their configuration, their lone pair standing where a hydrogen would. */
const PYRAMIDAL = ["P", "As", "S", "Se", "Te"];
/** Elements that carry one group, and two as a cation. */
const TRIVALENT = ["N", "P", "As"];
const LOCANTS = [1, 2, 3, 4, 5, 6] as const;
const FACES = ["up", "down"] as const;

/**
 * SMILES of a parent ring with groups up and down, and the SMILES atoms (from 0) at locants 1…6.
 *
 * The ring is seen from above with its locants running clockwise; `up` points to the viewer. At a ring
 * atom with previous atom p and next atom n, seen with the lower group at the back, p, n and the upper
 * group therefore run counter-clockwise; seen *from* the lower group they run clockwise, which SMILES
 * writes `@@` for the order lower, p, n, upper. One absolute configuration is worked out by hand in the tests.
 *
 * Marks are written wherever the two faces differ; on a centre that is not stereogenic a mark is
 * harmless. Nitrogen inverts, so one group on it has no face. The ring is closed between atoms
 * that need no mark for a lone pair, because readers disagree about such an atom in first place or at a closure.
 */
export function benchStructure(
  parent: RingParent,
  groups: ReadonlyMap<number, FaceGroups>,
): { readonly smiles: string; readonly ringLocants: readonly number[] } {
  if (parent.elements.length !== 6) throw new Error(`${parent.name} is not a six-membered ring`);
  for (const locant of groups.keys()) {
    if (!Number.isInteger(locant) || locant < 1 || locant > 6) throw new Error(`no locant ${locant}`);
  }
  const hasLonePairMark = (locant: number): boolean => {
    const { up, down } = groups.get(locant) ?? {};
    return PYRAMIDAL.includes(parent.elements[locant - 1]!) && (up === undefined) !== (down === undefined);
  };
  const start =
    LOCANTS.find((k) => !hasLonePairMark(k) && !hasLonePairMark(k === 1 ? 6 : k - 1)) ??
    LOCANTS.find((k) => !hasLonePairMark(k)) ??
    1;
  const ringLocants: number[] = [];
  let smiles = "";
  let atoms = 0;
  for (let step = 0; step < 6; step += 1) {
    const locant = ((start - 1 + step) % 6) + 1;
    ringLocants[locant - 1] = atoms;
    const site = writeSite(parent.elements[locant - 1]!, groups.get(locant) ?? {}, step);
    smiles += site.smiles;
    atoms += site.atomCount;
  }
  return { smiles, ringLocants };
}

type Neighbour = "p" | "n" | "up" | "down";

function writeSite(element: string, faces: FaceGroups, step: number): { smiles: string; atomCount: number } {
  const faceNames = FACES.filter((face) => faces[face] !== undefined);
  const attached = faceNames.map((face) => attachGroup(faces[face]!.smiles, RING_CLOSURE));
  // The last group of the last atom ends the string and needs no brackets.
  const branches = attached.map((group, index) =>
    step === 5 && index === attached.length - 1 ? group.smiles : `(${group.smiles})`,
  );
  const atom = writeAtom(element, faces, step);
  const closure = step === 0 || step === 5 ? String(RING_CLOSURE) : "";
  return {
    smiles: `${atom}${closure}${branches.join("")}`,
    atomCount: 1 + attached.reduce((sum, group) => sum + group.atomCount, 0),
  };
}

function writeAtom(element: string, faces: FaceGroups, step: number): string {
  const count = Number(faces.up !== undefined) + Number(faces.down !== undefined);
  const trivalent = TRIVALENT.includes(element);
  const charge = trivalent && count === 2 ? "+" : "";
  const inverts = element === "B" || element === "O" || (element === "N" && count === 1);
  const marked = faces.up?.key !== faces.down?.key && !inverts;
  if (!marked && charge === "" && ORGANIC_SUBSET.includes(element)) return element;
  const room = PYRAMIDAL.includes(element) && !trivalent ? 0 : trivalent ? 1 : 2;
  const hydrogens = Math.max(0, room - count);
  const shown = hydrogens === 0 ? "" : hydrogens === 1 ? "H" : `H${hydrogens}`;
  return `[${element}${marked ? chirality(faces, step) : ""}${shown}${charge}]`;
}

/** `@` or `@@` for the four neighbours in the order in which the SMILES names them. */
function chirality(faces: FaceGroups, step: number): "@" | "@@" {
  // The empty face holds a hydrogen or a lone pair, which SMILES counts right after the preceding atom.
  const present = FACES.filter((face) => faces[face] !== undefined);
  const empty = FACES.filter((face) => faces[face] === undefined);
  const order: Neighbour[] =
    step === 0
      ? [...empty, "p", ...present, "n"]
      : step === 5
        ? ["p", ...empty, "n", ...present]
        : ["p", ...empty, ...present, "n"];
  const reference: readonly Neighbour[] = ["down", "p", "n", "up"];
  return isPermutationEven(
    reference.map((neighbour) => reference.indexOf(neighbour)),
    order.map((neighbour) => reference.indexOf(neighbour)),
  )
    ? "@@"
    : "@";
}
