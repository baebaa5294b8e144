/**
 * Orders locants as printed: `2` before `4`, `4` before `4a`, `10` before `1′`. What is no locant comes last, in the
 * order of its characters.
 */
export function compareLocants(a: string, b: string): number {
  const [x, y] = [rank(a), rank(b)];
  const at = x.findIndex((value, i) => value !== y[i]);
  if (at >= 0) return x[at]! - y[at]!;
  return a < b ? -1 : a > b ? 1 : 0;
}

function rank(locant: string): readonly number[] {
  const parts = /^(\d+)([a-z]?)(′*)$/.exec(locant);
  if (parts === null) return [Number.MAX_SAFE_INTEGER, 0, 0];
  const [, number, letter, primes] = parts;
  return [primes!.length, Number(number), letter === "" ? 0 : letter!.charCodeAt(0)];
}
