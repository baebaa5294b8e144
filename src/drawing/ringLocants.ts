import { freePlace } from "./freePlace.ts";
import type { Ground } from "./Ground.ts";
import { isInside } from "./isInside.ts";
import { labelRuns } from "./labelRuns.ts";
import type { LaidChair } from "./layChair.ts";
import { CAP_HEIGHT, LABEL_SIZE, SMALL_SIZE } from "./measures.ts";
import { placeText } from "./placeText.ts";
import type { Point, SceneText } from "./Scene.ts";

const DIRECTIONS = 32;
/** Distances tried from the corner to the middle of the number, px; farther where a letter stands on the corner. */
const REACHES = [9.5, 11, 13, 15.5, 18, 21];
const LETTER_REACH = 0.4 * LABEL_SIZE;
/** Price of a direction straight into the ring. */
const INWARD = 50;

/** Price of standing inside a ring of a system, where an atom that rings share may have no other place. */
const INSIDE = 9;

/** The small numbers of the ring atoms, outside the ring, clear of bonds and letters. */
export function ringLocants({ view, letters }: LaidChair, ground: Ground): readonly SceneText[] {
  const placed: SceneText[] = [];
  const outlines = view.rings.map((ring) => ring.map((index) => view.vertices[index]!.at));
  const insideRing = (point: Point) => outlines.some((outline) => isInside(point, outline));
  for (const [index, vertex] of view.vertices.entries()) {
    const extra = letters.has(index) ? LETTER_REACH : 0;
    const { outward } = vertex;
    if (vertex.locant === "") continue;
    const runs = labelRuns(vertex.locant, { size: SMALL_SIZE, ink: "muted" });
    const places = Array.from({ length: DIRECTIONS }, (_, step) => {
      // Directions alternate to both sides of the outward one, so that equal places go to the same side everywhere.
      const turn = (step % 2 === 0 ? 1 : -1) * Math.ceil(step / 2);
      const angle = outward + (turn * 2 * Math.PI) / DIRECTIONS;
      return REACHES.map((reach) => {
        const middle = {
          x: vertex.at.x + (reach + extra) * Math.cos(angle),
          y: vertex.at.y + (reach + extra) * Math.sin(angle),
        };
        const inward =
          view.rings.length === 1
            ? inwardCost(angle - outward)
            : 2 * (1 - Math.cos(angle - outward)) + (insideRing(middle) ? INSIDE : 0);
        return {
          text: placeText(runs, {
            at: { x: middle.x, y: middle.y + (CAP_HEIGHT * SMALL_SIZE) / 2 },
            anchor: "middle" as const,
            part: "locant" as const,
            atoms: [vertex.atom],
            group: view.group,
          }),
          cost: inward + 1.2 * (reach - REACHES[0]!),
        };
      });
    }).flat();
    placed.push(
      freePlace(places, {
        lines: ground.lines,
        boxes: ground.boxes,
        small: [...ground.small, ...placed.map((each) => each.box)],
      }),
    );
  }
  return placed;
}

/** Free up to a right angle to either side of the outward direction, then dear: numbers stand outside the ring. */
function inwardCost(turn: number): number {
  const inward = Math.max(0, -Math.cos(turn) - 0.05);
  return 2 * (1 - Math.cos(turn)) + INWARD * inward;
}
