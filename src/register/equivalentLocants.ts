import type { Register } from "./Register.ts";

/** Carbocycles whose only mark is one trigonal atom, at position 1. */
const FLAT_CORNERED = ["cyclohexanone", "methylenecyclohexane", "isopropylidenecyclohexane"];

/**
 * Locants equivalent by the symmetry of the ring's elements, ascending, the given one among them: 2 and 6 of oxane,
 * 4 and 6 of 1,3-dioxane, all six of cyclohexane. A ring the register does not name has no equivalents.
 */
export function equivalentLocants(register: Register, parent: string, locant: number): readonly number[] {
  const elements = register.parents.find((entry) => entry.name === parent)?.elements;
  // One flat corner at position 1 leaves the mirror plane through 1 and 4.
  if (FLAT_CORNERED.includes(parent) && locant > 1)
    return [...new Set([locant, 8 - locant])].sort((a, b) => a - b);
  if (elements === undefined) return [locant];
  const found = new Set<number>();
  for (let offset = 0; offset < 6; offset++) {
    for (const step of [1, -1]) {
      const image = (position: number) => (offset + step * position + 12) % 6;
      if (elements.every((element, position) => elements[image(position)] === element))
        found.add(image(locant - 1) + 1);
    }
  }
  return [...found].sort((a, b) => a - b);
}
