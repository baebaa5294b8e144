/** Steps that readers count in, times any power of ten. */
const STEPS = [1, 2, 2.5, 5];

/**
 * Round values within a range, evenly spaced, as many as fit but never more than asked.
 *
 * @param low - lower end, any unit.
 * @param high - upper end, the same unit.
 */
export function tickValues(low: number, high: number, most: number): readonly number[] {
  if (!(high > low)) return [low];
  const decade = 10 ** Math.floor(Math.log10((high - low) / most));
  for (const step of [...STEPS, ...STEPS.map((each) => each * 10)].map((each) => each * decade)) {
    const first = Math.ceil(low / step - 1e-9);
    const last = Math.floor(high / step + 1e-9);
    if (last - first + 1 <= most) {
      return Array.from({ length: Math.max(0, last - first + 1) }, (_, index) =>
        Number(((first + index) * step).toPrecision(12)),
      );
    }
  }
  return [low, high];
}
