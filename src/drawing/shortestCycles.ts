/**
 * For every bond of a ring system the shortest ring through it, each ring once: the rings a drawing is seen by.
 * @param count - number of atoms.
 * @param bonds - pairs of atoms, as indices from 0.
 * @returns each ring as indices in ring order.
 */
export function shortestCycles(
  count: number,
  bonds: readonly (readonly [number, number])[],
): readonly (readonly number[])[] {
  const linked: number[][] = Array.from({ length: count }, () => []);
  for (const [a, b] of bonds) {
    linked[a]!.push(b);
    linked[b]!.push(a);
  }
  const found = new Map<string, readonly number[]>();
  for (const [start, goal] of bonds) {
    const previous = new Map<number, number>([[start, -1]]);
    const queue = [start];
    for (let here = queue.shift(); here !== undefined && !previous.has(goal); here = queue.shift()) {
      for (const next of linked[here]!) {
        if (previous.has(next) || (here === start && next === goal)) continue;
        previous.set(next, here);
        queue.push(next);
      }
    }
    const ring: number[] = [];
    for (let atom = previous.has(goal) ? goal : -1; atom >= 0; atom = previous.get(atom)!) ring.push(atom);
    const key = [...ring].sort((a, b) => a - b).join();
    if (ring.length > 2 && !found.has(key)) found.set(key, ring);
  }
  return [...found.values()];
}
