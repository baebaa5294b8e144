import { branchChoices } from "./branchChoices.ts";
import type { ChairView } from "./ChairView.ts";
import { chooseLabels } from "./chooseLabels.ts";
import type { LabelChoice, LabelSlot } from "./LabelSlot.ts";
import { vertexChoices } from "./vertexChoices.ts";

/** A chair with its labels chosen. */
export interface LaidChair {
  readonly view: ChairView;
  /** One for each branch, in the order of the view. */
  readonly branches: readonly LabelChoice[];
  /** One for each vertex that has letters, by its index. */
  readonly letters: ReadonlyMap<number, LabelChoice>;
  /** How crowded the drawing is; lower is better. */
  readonly cost: number;
}

/** Chooses the labels of a chair. */
export function layChair(view: ChairView): LaidChair {
  const { vertices, branches, group } = view;
  const slots: LabelSlot[] = [
    ...branches.map((branch, index) => ({
      vertex: branch.vertex,
      branch: index,
      choices: branchChoices(vertices[branch.vertex]!, branch, group),
    })),
    ...vertices.flatMap((vertex, index) =>
      vertex.letters === null ? [] : [{ vertex: index, branch: null, choices: vertexChoices(vertex, group) }],
    ),
  ];
  const ring = view.bonds.map(({ from, to }) => ({
    from: vertices[from]!.at,
    to: vertices[to]!.at,
    vertices: [from, to],
  }));
  const { chosen, cost } = chooseLabels(slots, ring);
  const choices = slots.map((slot, index) => slot.choices[chosen[index]!]!);
  return {
    view,
    branches: choices.slice(0, branches.length),
    letters: new Map(
      slots.flatMap((slot, index): [number, LabelChoice][] =>
        slot.branch === null ? [[slot.vertex, choices[index]!]] : [],
      ),
    ),
    cost,
  };
}
