import { ITALIC, REGULAR, SEMIBOLD, type Widths } from "./faceWidths.ts";

export type FaceStyle = "regular" | "semibold" | "italic";

const FACES: Readonly<Record<FaceStyle, ReadonlyMap<string, number>>> = {
  regular: byCharacter(REGULAR),
  semibold: byCharacter(SEMIBOLD),
  italic: byCharacter(ITALIC),
};

/** A character outside the table is taken to be as wide as a wide capital, so that room is never short. */
const UNKNOWN = 664;

/**
 * Width of a line of text.
 *
 * @param size - type size in px; the width is in px too.
 */
export function textWidth(text: string, size: number, style: FaceStyle = "regular"): number {
  const face = FACES[style];
  let sum = 0;
  for (const character of text) sum += face.get(character) ?? UNKNOWN;
  return (sum * size) / 1000;
}

function byCharacter(widths: Widths): ReadonlyMap<string, number> {
  return new Map(
    Object.entries(widths).flatMap(([width, characters]) =>
      [...characters].map((character): [string, number] => [character, Number(width)]),
    ),
  );
}
