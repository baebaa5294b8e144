/** A place in space, Å. */
export interface Place {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/** Shape of a six-membered ring: total amplitude and two angles on the sphere of its forms. */
export interface Puckering {
  /** Amplitudes in Å: total, of the boats and twist-boats, and of the chairs (signed). */
  readonly Q: number;
  readonly q2: number;
  readonly q3: number;
  /** 0° and 180° are the chairs, 90° the boats and twist-boats; degrees. */
  readonly theta: number;
  /** Where on the circle of boats, 0° to 360°; null where q2 is too small to tell. */
  readonly phi: number | null;
  /** Height of each atom above the mean plane, Å; positive on the side from which the list runs clockwise. */
  readonly heights: readonly number[];
}

/** Amplitude q2 in Å below which the phase has no meaning. */
const LEAST_Q2 = 0.05;

/**
 * Puckering of six atoms in the order given (D. Cremer, J. A. Pople, J. Am. Chem. Soc. 1975, 97, 1354; equations from
 * memory). With R_j from the geometric centre and α_j = 2π(j − 1)/6 the mean plane has the normal
 * Σ R_j sin α_j × Σ R_j cos α_j, and z_j are the heights over it:
 *
 *   q₂ cos φ = √(1/3) Σ z_j cos 2α_j,  q₂ sin φ = −√(1/3) Σ z_j sin 2α_j,  q₃ = √(1/6) Σ (−1)^(j−1) z_j,
 *   Q² = q₂² + q₃²,  tan θ = q₂/q₃
 *
 * The numbers mean nothing without the order of the atoms: one place on gives φ + 120° and 180° − θ.
 * @throws RangeError when there are not six atoms.
 */
export function puckering(ring: readonly Place[]): Puckering {
  if (ring.length !== 6) throw new RangeError(`six atoms are needed, got ${ring.length}`);
  const mean = (axis: "x" | "y" | "z") => ring.reduce((sum, place) => sum + place[axis], 0) / 6;
  const centre = [mean("x"), mean("y"), mean("z")] as const;
  const from = ring.map(({ x, y, z }) => [x - centre[0], y - centre[1], z - centre[2]] as const);
  const weighted = (weight: (angle: number) => number) =>
    [0, 1, 2].map((axis) => from.reduce((sum, r, j) => sum + r[axis]! * weight((Math.PI / 3) * j), 0));
  const s = weighted(Math.sin);
  const c = weighted(Math.cos);
  const normal = [
    s[1]! * c[2]! - s[2]! * c[1]!,
    s[2]! * c[0]! - s[0]! * c[2]!,
    s[0]! * c[1]! - s[1]! * c[0]!,
  ];
  const length = Math.hypot(...normal);
  const heights = from.map((r) => r.reduce((sum, value, axis) => sum + (value * normal[axis]!) / length, 0));
  const sum = (term: (z: number, j: number) => number) =>
    heights.reduce((total, z, j) => total + term(z, j), 0);
  const cosine = Math.sqrt(1 / 3) * sum((z, j) => z * Math.cos((2 * Math.PI * j) / 3));
  const sine = -Math.sqrt(1 / 3) * sum((z, j) => z * Math.sin((2 * Math.PI * j) / 3));
  const q2 = Math.hypot(cosine, sine);
  const q3 = Math.sqrt(1 / 6) * sum((z, j) => (j % 2 === 0 ? z : -z));
  const degrees = 180 / Math.PI;
  return {
    Q: Math.hypot(q2, q3),
    q2,
    q3,
    theta: Math.atan2(q2, q3) * degrees,
    phi: q2 < LEAST_Q2 ? null : (Math.atan2(sine, cosine) * degrees + 360) % 360,
    heights,
  };
}

/**
 * Heights of six atoms over their mean plane from puckering, Å: the way back.
 * z_j = √(1/3) q₂ cos(φ + 2α_j) + √(1/6) q₃ (−1)^(j−1)
 * @param q2 - amplitude of the boats, in Å.
 * @param phi - degrees.
 * @param q3 - amplitude of the chairs, signed, in Å.
 */
export function heightsOf(q2: number, phi: number, q3: number): readonly number[] {
  return [0, 1, 2, 3, 4, 5].map(
    (j) =>
      Math.sqrt(1 / 3) * q2 * Math.cos((phi * Math.PI) / 180 + (2 * Math.PI * j) / 3) +
      Math.sqrt(1 / 6) * q3 * (j % 2 === 0 ? 1 : -1),
  );
}
