interface Coordinates {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/** Coordinates that depart further than this from the textbook direction, degrees, are drawn as they are. */
const TOLERANCE = 8;

/**
 * Where the far end of an equatorial bond is drawn: at its true length, exactly parallel to the two ring bonds one
 * removed, as the definition has it (IUPAC Basic Terminology of Stereochemistry 1996, axial, equatorial). Real
 * rings are a little flatter than tetrahedral angles would make them, so that coordinates miss this by two or
 * three degrees, which the eye of a chemist notices.
 *
 * @param ring - the six ring atoms in order; coordinates in any unit of length.
 * @param index - the ring atom that carries the bond.
 */
export function drawnEnd(ring: readonly Coordinates[], index: number, end: Coordinates): Coordinates {
  const at = (step: number) => ring[(index + step + ring.length) % ring.length]!;
  const own = at(0);
  const textbook = unit(add(subtract(at(1), at(2)), subtract(at(-1), at(-2))));
  const given = subtract(end, own);
  const length = Math.hypot(given.x, given.y, given.z);
  const cosine = (given.x * textbook.x + given.y * textbook.y + given.z * textbook.z) / length;
  if (cosine < Math.cos((TOLERANCE * Math.PI) / 180)) return end;
  return {
    x: own.x + length * textbook.x,
    y: own.y + length * textbook.y,
    z: own.z + length * textbook.z,
  };
}

function add(a: Coordinates, b: Coordinates): Coordinates {
  return { x: a.x + b.x, y: a.y + b.y, z: a.z + b.z };
}

function subtract(a: Coordinates, b: Coordinates): Coordinates {
  return { x: a.x - b.x, y: a.y - b.y, z: a.z - b.z };
}

function unit(a: Coordinates): Coordinates {
  const length = Math.hypot(a.x, a.y, a.z) || 1;
  return { x: a.x / length, y: a.y / length, z: a.z / length };
}
