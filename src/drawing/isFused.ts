/**
 * Whether a ring atom is one of exactly two that some two rings share: a fusion atom, unlike a spiro atom or a
 * bridgehead.
 *
 * @param rings - every ring as vertices in ring order.
 */
export function isFused(vertex: number, rings: readonly (readonly number[])[]): boolean {
  const own = rings.filter((ring) => ring.includes(vertex));
  const shared = own.flatMap((ring, index) =>
    own.slice(index + 1).map((other) => ring.filter((each) => other.includes(each)).length),
  );
  return shared.length > 0 && shared.every((count) => count <= 2) && shared.includes(2);
}
