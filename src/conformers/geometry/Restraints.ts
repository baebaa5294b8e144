/** Two points held at a distance (Å) with a stiffness. */
export interface DistanceRestraint {
  readonly i: number;
  readonly j: number;
  readonly distance: number;
  readonly weight: number;
}

/** Two points kept at least a distance apart (Å). */
export interface Separation {
  readonly i: number;
  readonly j: number;
  readonly least: number;
}

/**
 * The signed volume (Å³) of three vectors, each from one point to another: a · (b × c). It carries the sense of a
 * tetrahedral atom (vectors from the atom), the sign of a torsion (vectors along the chain), or flatness (zero).
 */
export interface VolumeRestraint {
  readonly vectors: readonly [
    readonly [number, number],
    readonly [number, number],
    readonly [number, number],
  ];
  readonly volume: number;
  readonly weight: number;
}

/** Everything that points are asked to fulfil. */
export interface Restraints {
  readonly points: number;
  readonly distances: readonly DistanceRestraint[];
  readonly separations: readonly Separation[];
  readonly volumes: readonly VolumeRestraint[];
}
