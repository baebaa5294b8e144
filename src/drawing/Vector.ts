/** A point or a direction in space, Å or without unit. */
export interface Vector {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/** The sum of vectors, each times its factor. */
export function combine(...terms: readonly (readonly [number, Vector])[]): Vector {
  const sum = (axis: keyof Vector) => terms.reduce((total, [factor, each]) => total + factor * each[axis], 0);
  return { x: sum("x"), y: sum("y"), z: sum("z") };
}

export function dot(a: Vector, b: Vector): number {
  return a.x * b.x + a.y * b.y + a.z * b.z;
}

export function cross(a: Vector, b: Vector): Vector {
  return { x: a.y * b.z - a.z * b.y, y: a.z * b.x - a.x * b.z, z: a.x * b.y - a.y * b.x };
}

/** The direction of a vector; a vector without length stays as it is. */
export function unit(a: Vector): Vector {
  return combine([1 / (Math.sqrt(dot(a, a)) || 1), a]);
}

export function middleOf(points: readonly Vector[]): Vector {
  return combine(...points.map((point): [number, Vector] => [1 / points.length, point]));
}
