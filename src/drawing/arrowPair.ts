import { BOND_STROKE } from "./measures.ts";
import type { Part, Point, SceneItem } from "./Scene.ts";

/** Length of the longer arrow, px, and the least share of it that the shorter one keeps. */
export const ARROW_LENGTH = 50;
const SHORTEST = 0.4;
/** |log10 K| from which the shorter arrow shrinks no more. */
const CLAMP = 2;
/** Distance of either shaft from the line between them; length and spread of the barb. */
const OFFSET = 3;
const BARB = { length: 8.5, spread: 4.2, notch: 6.2 };

/**
 * Two half-headed arrows of an equilibrium, forward above (or to the right) and reverse below. The lengths say
 * where it lies: equal for K = 1, the disfavoured direction shorter in proportion to |log10 K| up to two decades.
 *
 * @param K - [to]/[from], dimensionless.
 * @param centre - middle of the pair.
 * @param vertical - forward is downwards instead of to the right.
 */
export function arrowPair(
  K: number,
  centre: Point,
  vertical: boolean,
  length = ARROW_LENGTH,
): readonly SceneItem[] {
  const decades = Math.min(CLAMP, Math.abs(Math.log10(K)));
  const short = length * (1 - ((1 - SHORTEST) * decades) / CLAMP);
  const place = (x: number, y: number): Point =>
    vertical ? { x: centre.x - y, y: centre.y + x } : { x: centre.x + x, y: centre.y + y };
  const arrow = (part: Part, direction: 1 | -1, size: number): readonly SceneItem[] => {
    const side = -direction * OFFSET;
    const tip = (direction * size) / 2;
    const common = { part, atoms: [], group: "", ink: "ink" } as const;
    return [
      {
        ...common,
        kind: "line",
        from: place(-tip, side),
        to: place(tip - direction, side),
        width: BOND_STROKE,
        endWidth: BOND_STROKE,
        dash: [],
        depth: null,
      },
      {
        ...common,
        kind: "polygon",
        points: [
          place(tip, side + (direction * BOND_STROKE) / 2),
          place(tip - direction * BARB.length, side - direction * BARB.spread),
          place(tip - direction * BARB.notch, side + (direction * BOND_STROKE) / 2),
        ],
        closed: true,
        opacity: 1,
        width: 0,
        dash: [],
      },
    ];
  };
  const forward = K >= 1 ? length : short;
  const reverse = K >= 1 ? short : length;
  return [...arrow("forward arrow", 1, forward), ...arrow("reverse arrow", -1, reverse)];
}
