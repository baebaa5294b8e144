/**
 * True when the permutation that takes `from` to `to` is even.
 * @param from - distinct values (dimensionless).
 * @param to - the same values in another order.
 * @throws RangeError when the two do not hold the same values.
 */
export function isPermutationEven(from: readonly number[], to: readonly number[]): boolean {
  const order = from.map((value) => to.indexOf(value));
  if (from.length !== to.length || order.includes(-1)) throw new RangeError("not the same values");
  let inversions = 0;
  for (let i = 0; i < order.length; i++) {
    for (let j = i + 1; j < order.length; j++) if (order[i]! > order[j]!) inversions++;
  }
  return inversions % 2 === 0;
}
