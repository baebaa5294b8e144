import { boxGap } from "./boxGap.ts";
import type { Ground } from "./Ground.ts";
import type { SceneText } from "./Scene.ts";
import { segmentBoxGap } from "./segmentBoxGap.ts";

/** Free space wanted around small letters, px. */
const WANTED = 2.5;
/** Between two small letters, which would otherwise read as one word. */
const WANTED_BETWEEN = 6;
const TOUCHING = 60;

/** The cheapest of several places for a small text: its own cost and the price of crowding what stands there. */
export function freePlace(
  places: readonly { readonly text: SceneText; readonly cost: number }[],
  ground: Ground,
): SceneText {
  const costs = places.map(({ text, cost }) => {
    let sum = cost;
    for (const box of ground.boxes) sum += price(boxGap(text.box, box), WANTED);
    for (const box of ground.small) sum += price(boxGap(text.box, box), WANTED_BETWEEN);
    for (const { from, to, width } of ground.lines) {
      sum += price(segmentBoxGap(from, to, text.box) - width / 2, WANTED);
    }
    return sum;
  });
  let best = 0;
  for (let index = 1; index < costs.length; index++) if (costs[index]! < costs[best]! - 1e-6) best = index;
  return places[best]!.text;
}

function price(gap: number, wanted: number): number {
  if (gap < 0.4) return TOUCHING - gap;
  return gap < wanted ? (15 * (wanted - gap)) / wanted : 0;
}
