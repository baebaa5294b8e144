import type { Restraints } from "./Restraints.ts";

/** Coordinates of all points: x, y, z of the first, then of the next. */
export type Coordinates = Float64Array;

const DIMENSIONS = 4;
/** Steps of the three stages: unfolding in four dimensions, pressing the fourth flat, settling in three. */
const STAGES = [
  { steps: 350, fourth: 0, volumes: 0.2 },
  { steps: 450, fourth: 2, volumes: 1 },
  { steps: 900, fourth: 40, volumes: 1 },
];
const SEPARATION_WEIGHT = 2;

/**
 * Points that fulfil restraints as well as can be: distance geometry. They start from places that a generator with the
 * given seed draws, unfold in four dimensions, where no knot holds, and are pressed into three.
 *
 * The minimiser is FIRE (Bitzek et al., Phys. Rev. Lett. 2006, 97, 170201; constants from memory). Nothing depends on clock or chance: the same
 * restraints and seed give the same points.
 * @param seed - of the generator (dimensionless).
 * @returns coordinates in Å and what is left of the penalty (Å², dimension of a weighted square).
 */
export function placePoints(
  restraints: Restraints,
  seed: number,
): { readonly coordinates: Coordinates; readonly penalty: number } {
  const { points } = restraints;
  const random = generator(seed);
  const size = 1.2 * Math.cbrt(points) + 1;
  const x = new Float64Array(points * DIMENSIONS);
  for (let n = 0; n < x.length; n++) x[n] = (random() - 0.5) * size;
  let penalty = 0;
  for (const stage of STAGES) penalty = relax(restraints, x, stage);
  const coordinates = new Float64Array(points * 3);
  for (let i = 0; i < points; i++)
    for (let k = 0; k < 3; k++) coordinates[3 * i + k] = x[DIMENSIONS * i + k]!;
  return { coordinates, penalty };
}

function relax(
  system: Restraints,
  x: Float64Array,
  stage: { readonly steps: number; readonly fourth: number; readonly volumes: number },
): number {
  const force = new Float64Array(x.length);
  const velocity = new Float64Array(x.length);
  let step = 0.02;
  let mixing = 0.1;
  let uphill = 0;
  let penalty = 0;
  for (let n = 0; n < stage.steps; n++) {
    penalty = evaluate(system, x, force, stage);
    let power = 0;
    let speed = 0;
    let strength = 0;
    for (let k = 0; k < x.length; k++) {
      power += force[k]! * velocity[k]!;
      speed += velocity[k]! ** 2;
      strength += force[k]! ** 2;
    }
    if (strength < 1e-12) break;
    if (power > 0) {
      const ratio = (mixing * Math.sqrt(speed)) / Math.sqrt(strength);
      for (let k = 0; k < x.length; k++) velocity[k] = (1 - mixing) * velocity[k]! + ratio * force[k]!;
      if (++uphill > 5) {
        step = Math.min(step * 1.1, 0.12);
        mixing *= 0.99;
      }
    } else {
      velocity.fill(0);
      step = Math.max(step * 0.5, 0.002);
      mixing = 0.1;
      uphill = 0;
    }
    for (let k = 0; k < x.length; k++) {
      velocity[k] = velocity[k]! + step * force[k]!;
      const move = step * velocity[k]!;
      x[k] = x[k]! + Math.max(-0.2, Math.min(0.2, move));
    }
  }
  return penalty;
}

/** The penalty at x; `force` receives its negative gradient. */
function evaluate(
  system: Restraints,
  x: Float64Array,
  force: Float64Array,
  stage: { readonly fourth: number; readonly volumes: number },
): number {
  force.fill(0);
  let penalty = 0;
  const D = DIMENSIONS;
  const pull = (i: number, j: number, distance: number, weight: number, onlyCloser: boolean) => {
    const a = D * i;
    const b = D * j;
    const d0 = x[a]! - x[b]!;
    const d1 = x[a + 1]! - x[b + 1]!;
    const d2 = x[a + 2]! - x[b + 2]!;
    const d3 = x[a + 3]! - x[b + 3]!;
    const square = d0 * d0 + d1 * d1 + d2 * d2 + d3 * d3;
    if (onlyCloser && square >= distance * distance) return;
    const r = Math.sqrt(square) + 1e-9;
    const off = r - distance;
    penalty += weight * off * off;
    const f = (-2 * weight * off) / r;
    force[a]! += f * d0;
    force[a + 1]! += f * d1;
    force[a + 2]! += f * d2;
    force[a + 3]! += f * d3;
    force[b]! -= f * d0;
    force[b + 1]! -= f * d1;
    force[b + 2]! -= f * d2;
    force[b + 3]! -= f * d3;
  };
  for (const { i, j, distance, weight } of system.distances) pull(i, j, distance, weight, false);
  for (const { i, j, least } of system.separations) pull(i, j, least, SEPARATION_WEIGHT, true);
  for (const { vectors, volume, weight } of system.volumes) {
    const [[a0, a1], [b0, b1], [c0, c1]] = vectors;
    const ax = x[D * a1]! - x[D * a0]!;
    const ay = x[D * a1 + 1]! - x[D * a0 + 1]!;
    const az = x[D * a1 + 2]! - x[D * a0 + 2]!;
    const bx = x[D * b1]! - x[D * b0]!;
    const by = x[D * b1 + 1]! - x[D * b0 + 1]!;
    const bz = x[D * b1 + 2]! - x[D * b0 + 2]!;
    const cx = x[D * c1]! - x[D * c0]!;
    const cy = x[D * c1 + 1]! - x[D * c0 + 1]!;
    const cz = x[D * c1 + 2]! - x[D * c0 + 2]!;
    const ux = by * cz - bz * cy;
    const uy = bz * cx - bx * cz;
    const uz = bx * cy - by * cx;
    const off = ax * ux + ay * uy + az * uz - volume;
    const w = weight * stage.volumes;
    penalty += w * off * off;
    const f = -2 * w * off;
    push(force, a0, a1, f * ux, f * uy, f * uz);
    push(force, b0, b1, f * (cy * az - cz * ay), f * (cz * ax - cx * az), f * (cx * ay - cy * ax));
    push(force, c0, c1, f * (ay * bz - az * by), f * (az * bx - ax * bz), f * (ax * by - ay * bx));
  }
  if (stage.fourth > 0) {
    for (let k = 3; k < x.length; k += D) {
      penalty += stage.fourth * x[k]! ** 2;
      force[k]! -= 2 * stage.fourth * x[k]!;
    }
  }
  return penalty;
}

function push(force: Float64Array, from: number, to: number, fx: number, fy: number, fz: number): void {
  const [p, q] = [DIMENSIONS * to, DIMENSIONS * from];
  force[p]! += fx;
  force[p + 1]! += fy;
  force[p + 2]! += fz;
  force[q]! -= fx;
  force[q + 1]! -= fy;
  force[q + 2]! -= fz;
}

/** Numbers from 0 to 1 that look random and depend on the seed alone (mulberry32, public domain; from memory). */
function generator(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}
