/**
 * How a ring system is looked at, the same for all conformers of a dossier.
 *
 * One ring leads: its axis stands upright and one of its atoms at the right end. From the position exactly sideways,
 * in which axial bonds would hide each other, the camera steps aside by a small angle: to one side when that atom
 * points up and to the other when it points down. The two chairs of a flip are then each other's mirror shape, as the
 * trade draws them, and every atom of that ring stays at its end of the drawing. With a leading ring that is no chair
 * the camera always steps to the same side. Degrees.
 */
export interface RingCamera {
  /** Index of the leading ring among the dossier's rings. */
  readonly lead: number;
  /** The face of the leading ring that is above. */
  readonly above: "up" | "down";
  /** Index, in the leading ring's list, of the atom at the right end. */
  readonly rightEnd: number;
  /** Negative for a step to the other side, which some systems of several rings need. */
  readonly azimuth: number;
  /** Height of the camera above the leading ring's mean plane. */
  readonly elevation: number;
}
