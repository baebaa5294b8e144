import type { Register } from "./Register.ts";

/**
 * Locants equivalent by the symmetry of the ring's elements, ascending, the given one among them: 2 and 6 of oxane,
 * 4 and 6 of 1,3-dioxane, all six of cyclohexane. A ring the register does not name has no equivalents.
 */
export function equivalentLocants(register: Register, parent: string, locant: number): readonly number[] {
  const elements = register.parents.find((entry) => entry.name === parent)?.elements;
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
