import type { Place } from "./puckering.ts";

/** Torsion angle a–b–c–d in degrees, −180 to 180; positive when the far bond turns clockwise (Klyne and Prelog 1960). */
export function torsionAngle(a: Place, b: Place, c: Place, d: Place): number {
  const minus = (p: Place, q: Place) => [p.x - q.x, p.y - q.y, p.z - q.z] as const;
  const cross = (p: readonly number[], q: readonly number[]) => [
    p[1]! * q[2]! - p[2]! * q[1]!,
    p[2]! * q[0]! - p[0]! * q[2]!,
    p[0]! * q[1]! - p[1]! * q[0]!,
  ];
  const dot = (p: readonly number[], q: readonly number[]) => p[0]! * q[0]! + p[1]! * q[1]! + p[2]! * q[2]!;
  const [u, v, w] = [minus(b, a), minus(c, b), minus(d, c)];
  const m = cross(v, w);
  return (Math.atan2(Math.hypot(...v) * dot(u, m), dot(cross(u, v), m)) * 180) / Math.PI;
}
