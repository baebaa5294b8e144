import type { Body } from "./Body.ts";
import { bridgesFit } from "./bridgesFit.ts";
import { type Molecule, withSenses } from "./Molecule.ts";
import { superimposes } from "./superimposes.ts";
import type { Toolkit } from "./Toolkit.ts";

/** An atom whose configuration matters although canonical names overlook it. */
export interface HiddenCentre {
  readonly atom: number;
  /** Turning it over gives the mirror image, as at the spiro atom of an acetal; otherwise it gives a diastereomer. */
  readonly givesMirrorImage: boolean;
}

/**
 * Atoms of the body whose sense was filled in as if it were arbitrary, and is not: turned over they give a molecule that
 * cannot be laid on the first one, although both have one canonical SMILES. A SMILES cannot mark such a centre, since
 * readers drop the mark.
 */
export function findHiddenCentres(
  written: Molecule,
  filled: Molecule,
  body: Body,
  toolkit: Toolkit,
): readonly HiddenCentre[] {
  const form = toolkit.canonicalSmiles(filled);
  return body.atoms.flatMap((atom): HiddenCentre[] => {
    const sense = filled.atoms[atom]!.stereo;
    if (sense === null || written.atoms[atom]!.stereo !== null) return [];
    const turned = withSenses(filled, new Map([[atom, sense === "cw" ? "ccw" : "cw"] as const]));
    if (!bridgesFit(turned) || toolkit.canonicalSmiles(turned) !== form) return [];
    if (superimposes(body, filled, turned, false)) return [];
    return [{ atom, givesMirrorImage: superimposes(body, filled, turned, true) }];
  });
}
