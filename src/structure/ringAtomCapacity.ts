/** Elements that carry two groups, or a group and a hydrogen, in a saturated ring. */
const TETRAVALENT = ["C", "Si", "Ge", "Sn"];
/** Elements that carry one group; a second one makes a cation. */
const TRIVALENT = ["N", "P", "As"];
/** Elements that carry nothing by single bonds, and an oxo group (`=O`) only where they can expand their valence. */
const EXPANDABLE = ["S", "Se", "Te"];

/** How many groups the ring atom of this element can carry, by single bonds and as oxo groups. */
export function ringAtomCapacity(element: string): { readonly single: number; readonly oxo: number } {
  if (TETRAVALENT.includes(element)) return { single: 2, oxo: 0 };
  if (TRIVALENT.includes(element)) return { single: 2, oxo: 0 };
  if (EXPANDABLE.includes(element)) return { single: 0, oxo: 2 };
  return { single: element === "B" ? 1 : 0, oxo: 0 };
}
