/** Numbers that look random and are the same in every run. */
export interface SeededRandom {
  /** A whole number from 0 up to, not including, `below`. */
  whole(below: number): number;
  pick<T>(list: readonly T[]): T;
  chance(probability: number): boolean;
  /** A new list with the same members in another order. */
  shuffle<T>(list: readonly T[]): T[];
}

/** The generator mulberry32: 32 bits of state, enough to draw test cases. */
export function seededRandom(seed: number): SeededRandom {
  let state = seed >>> 0;
  const fraction = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const whole = (below: number) => Math.floor(fraction() * below);
  return {
    whole,
    pick: (list) => {
      if (list.length === 0) throw new Error("nothing to pick from");
      return list[whole(list.length)]!;
    },
    chance: (probability) => fraction() < probability,
    shuffle: (list) => {
      const rest = [...list];
      for (let last = rest.length - 1; last > 0; last--) {
        const other = whole(last + 1);
        [rest[last], rest[other]] = [rest[other]!, rest[last]!];
      }
      return rest;
    },
  };
}
