import { boxGap } from "./boxGap.ts";
import type { LabelChoice, LabelSlot } from "./LabelSlot.ts";
import { pointSegmentGap } from "./pointSegmentGap.ts";
import type { Box, Point } from "./Scene.ts";
import { segmentBoxGap } from "./segmentBoxGap.ts";

interface Segment {
  readonly from: Point;
  readonly to: Point;
}

interface RingSegment extends Segment {
  readonly vertices: readonly number[];
}

/** Free space wanted around letters, px, and the price of having less or none. */
const WANTED = 4;
const CROWDED = 8;
const TOUCHING = 60;
/** Bonds that run side by side closer than this read as one. */
const APART = 9;
const PASSES = 8;

/**
 * Chooses how to set every label of a chair so that none touches another or a bond.
 *
 * Each label starts with its own cheapest choice and then is chosen again in turn while the others stay, until
 * nothing changes: the result depends on nothing but the input.
 *
 * @param ring - the ring bonds, which cannot move, with the vertices at their ends.
 * @returns index of the choice of each slot and the total cost, which also judges the camera.
 */
export function chooseLabels(
  slots: readonly LabelSlot[],
  ring: readonly RingSegment[],
): { readonly chosen: readonly number[]; readonly cost: number } {
  const alone = slots.map((slot) => slot.choices.map((choice) => choice.cost + ringCost(slot, choice, ring)));
  const chosen = alone.map(cheapest);
  const costOf = (slot: number, choice: number) =>
    slots.reduce(
      (sum, other, index) =>
        index === slot
          ? sum
          : sum +
            pairCost(slots[slot]!, slots[slot]!.choices[choice]!, other, other.choices[chosen[index]!]!),
      alone[slot]![choice]!,
    );
  for (let pass = 0; pass < PASSES; pass++) {
    let changed = false;
    for (let slot = 0; slot < slots.length; slot++) {
      const best = cheapest(slots[slot]!.choices.map((_, choice) => costOf(slot, choice)));
      if (best === chosen[slot]) continue;
      chosen[slot] = best;
      changed = true;
    }
    if (!changed) break;
  }
  let cost = 0;
  for (const [index, slot] of slots.entries()) {
    const choice = slot.choices[chosen[index]!]!;
    cost += alone[index]![chosen[index]!]!;
    for (let other = 0; other < index; other++) {
      cost += pairCost(slot, choice, slots[other]!, slots[other]!.choices[chosen[other]!]!);
    }
  }
  return { chosen, cost };
}

function cheapest(costs: readonly number[]): number {
  let best = 0;
  for (let index = 1; index < costs.length; index++) if (costs[index]! < costs[best]! - 1e-6) best = index;
  return best;
}

function ringCost(slot: LabelSlot, choice: LabelChoice, ring: readonly RingSegment[]): number {
  let cost = 0;
  for (const segment of ring) {
    for (const box of choice.boxes) cost += price(segmentBoxGap(segment.from, segment.to, box));
    const meets = segment.vertices.includes(slot.vertex);
    if (choice.bond !== null && !meets) cost += sideBySide(choice.bond, segment);
  }
  return cost;
}

function pairCost(slot: LabelSlot, choice: LabelChoice, other: LabelSlot, otherChoice: LabelChoice): number {
  const sameVertex = slot.vertex === other.vertex;
  const boxes = allBoxes(choice, sameVertex && other.branch !== null);
  const otherBoxes = allBoxes(otherChoice, sameVertex && slot.branch !== null);
  let cost = 0;
  for (const box of boxes) for (const otherBox of otherBoxes) cost += price(boxGap(box, otherBox));
  if (choice.bond !== null) {
    for (const box of otherBoxes) cost += price(segmentBoxGap(choice.bond.from, choice.bond.to, box));
  }
  if (otherChoice.bond !== null) {
    for (const box of boxes) cost += price(segmentBoxGap(otherChoice.bond.from, otherChoice.bond.to, box));
  }
  if (choice.bond !== null && otherChoice.bond !== null && !sameVertex) {
    cost += sideBySide(choice.bond, otherChoice.bond);
  }
  return cost;
}

/** A bond may end at the letter of its own ring atom, so that letter does not count against it. */
function allBoxes(choice: LabelChoice, withoutCore: boolean): readonly Box[] {
  return choice.bond === null && !withoutCore ? [...choice.boxes, choice.core] : choice.boxes;
}

function price(gap: number): number {
  if (gap < 0.5) return TOUCHING;
  return gap < WANTED ? (CROWDED * (WANTED - gap)) / WANTED : 0;
}

/** Nearly parallel lines that lie close to each other over some length. */
function sideBySide(a: Segment, b: Segment): number {
  const cross = (a.to.x - a.from.x) * (b.to.y - b.from.y) - (a.to.y - a.from.y) * (b.to.x - b.from.x);
  const lengths =
    Math.hypot(a.to.x - a.from.x, a.to.y - a.from.y) * Math.hypot(b.to.x - b.from.x, b.to.y - b.from.y);
  if (Math.abs(cross) > 0.3 * lengths) return 0;
  const gap = Math.min(
    pointSegmentGap(a.from, b.from, b.to),
    pointSegmentGap(a.to, b.from, b.to),
    pointSegmentGap(b.from, a.from, a.to),
    pointSegmentGap(b.to, a.from, a.to),
  );
  return gap < APART ? 1.5 * (APART - gap) : 0;
}
