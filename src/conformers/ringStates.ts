import type { AnalysedRing } from "../structure/StructureAnalysis.ts";
import type { RingForm } from "./Chair.ts";

/** Form and endocyclic torsions of a ring, without the faces of its groups. */
export interface RingState {
  readonly form: RingForm;
  readonly sign: 1 | -1;
  /** Degrees, one for each ring bond. */
  readonly torsions: readonly number[];
}

/** Torsions in degrees of the usual forms: cyclohexane chair and twist-boat, cyclohexene half-chair, boat (rounded). */
const CHAIR = 55;
const HALF_CHAIR = [0, 15, 45, 62, 45, 15];
const TWIST = [33, 33, -71];
const BOAT = 60;

/** The chairs or half-chairs of a ring, or the one boat that its bridge allows. */
export function ringStates(ring: AnalysedRing): readonly RingState[] {
  if (ring.kind === "boat") return [boat(ring)];
  const [flat] = ring.flatBonds;
  return ([1, -1] as const).map((sign) => ({
    form: ring.kind === "half-chair" ? "half-chair" : "chair",
    sign,
    torsions: [0, 1, 2, 3, 4, 5].map((k) => {
      const size = flat === undefined ? CHAIR : HALF_CHAIR[(k - flat + 6) % 6]!;
      return -sign * (k % 2 === 0 ? 1 : -1) * size + 0;
    }),
  }));
}

/** The six twist-boats of a saturated ring. */
export function twistStates(ring: AnalysedRing): readonly RingState[] {
  if (ring.kind !== "chair") return [];
  return [0, 1, 2].flatMap((shift) =>
    ([1, -1] as const).map((sense) => ({
      form: "twist-boat" as const,
      sign: 1 as const,
      torsions: [0, 1, 2, 3, 4, 5].map((k) => sense * TWIST[(k + shift) % 3]!),
    })),
  );
}

/** The boat whose bow and stern lean towards the bridge between them. */
function boat(ring: AnalysedRing): RingState {
  const bridge = ring.partners.find((partner) => partner.shared.length === 4)!;
  const bow = bridge.shared[0]!;
  const site = ring.sites[bow]!;
  const up = site.up === bridge.ends[0] ? 1 : -1;
  const torsions = [0, 0, 0, 0, 0, 0];
  for (const end of [bow, (bow + 3) % 6]) {
    torsions[(end + 5) % 6] = BOAT * up;
    torsions[end] = -BOAT * up;
  }
  return { form: "boat", sign: 1, torsions };
}
