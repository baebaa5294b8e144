/**
 * How a ring is looked at, the same for all conformers of a dossier.
 *
 * One ring atom stands at the right end. From the position exactly sideways, in which axial bonds would hide each
 * other, the camera steps aside by a small angle: to one side when that atom points up and to the other when it
 * points down. The two chairs of a flip are then each other's mirror shape, as the trade draws them, and every
 * ring atom stays at its end of the drawing. Degrees.
 */
export interface RingCamera {
  /** Index, in the ring's list, of the atom at the right end. */
  readonly rightEnd: number;
  readonly azimuth: number;
  /** Height of the camera above the ring's mean plane. */
  readonly elevation: number;
}
