import { type AuthorNumbering, analyseRings } from "../../structure/analyseRings.ts";
import { chiralityOf } from "../../structure/chiralityOf.ts";
import { describeBody } from "../../structure/describeBody.ts";
import { findHiddenCentres } from "../../structure/findHiddenCentres.ts";
import { findOpenCentres, type OpenStereo } from "../../structure/findOpenCentres.ts";
import { findOpenDoubleBonds } from "../../structure/findOpenDoubleBonds.ts";
import { type FoundRing, findRings } from "../../structure/findRings.ts";
import { type Molecule, mirrorImage, withSenses } from "../../structure/Molecule.ts";
import { readAtomClasses } from "../../structure/readAtomClasses.ts";
import type { AnalysedRing } from "../../structure/StructureAnalysis.ts";
import type { Alert, Identity, Stereocentre, Structure } from "../Dossier.ts";
import type { Services } from "./Services.ts";
import type { Refusal, StructureResult } from "./StructureResult.ts";

/** Reads a structure, finds its rings and its open stereochemistry, and describes its identity. */
export function readStructure(
  smiles: string,
  authorNumbering: readonly number[] | null,
  services: Services,
):
  | { readonly ok: true; readonly result: StructureResult }
  | { readonly ok: false; readonly refusal: Refusal } {
  const { toolkit } = services;
  const read = toolkit.read(smiles);
  if (!read.ok) {
    return { ok: false, refusal: { code: "invalid-smiles", message: read.reason, position: read.position } };
  }
  const written = read.molecule;
  const open = findOpenCentres(written, toolkit);
  const search = findRings(written);
  const chosen = search.ok ? chooseMember(written, open, search.rings, services) : null;
  const shown = chosen ?? open.members[0]!.molecule;
  const classes = readAtomClasses(smiles);
  const author: AuthorNumbering = {
    ring: authorNumbering,
    atoms: new Map(
      read.writtenAtoms.flatMap((place, atom): [number, string][] =>
        classes.has(place) ? [[atom, `${classes.get(place)!}`]] : [],
      ),
    ),
  };
  const rings = search.ok ? analyseRings(shown, search.rings, author, services) : [];
  const alerts = stereoAlerts(open, chosen !== null || !search.ok);
  if (search.ok) {
    for (const { message } of search.unanalysed)
      alerts.push({ code: "ring-not-analysed", severity: "caution", message });
  }
  const openBonds = findOpenDoubleBonds(written, toolkit);
  if (openBonds.length > 0) {
    alerts.push({
      code: "double-bond-unspecified",
      severity: "caution",
      message: `E/Z geometry is not given for the double bond${openBonds.length > 1 ? "s" : ""} at atoms ${openBonds.map((pair) => pair.join("=")).join(", ")}.`,
    });
  }
  const body = search.ok && chosen !== null ? describeBody(chosen, rings, toolkit) : null;
  const hidden = body === null ? [] : findHiddenCentres(written, chosen!, body, toolkit);
  const lost = hidden.find((centre) => !centre.givesMirrorImage);
  if (hidden.length > 0 && lost === undefined) {
    alerts.push({
      code: "unmarked-chirality",
      severity: "note",
      message: `The substance is chiral at atom ${hidden[0]!.atom} (counted from 0 in the SMILES), for which a SMILES has no lasting mark; one of the two mirror images is shown, and their energies are equal.`,
    });
  }
  const refusal: Refusal | null = search.ok
    ? open.complete
      ? lost === undefined
        ? null
        : {
            code: "unsupported-unmarked-stereo",
            message: `Atom ${lost.atom} (counted from 0 in the SMILES) has two configurations that are different substances, for which a SMILES has no lasting mark; the conformers are not analysed.`,
            position: null,
          }
      : {
          code: "unsupported-open-stereochemistry",
          message: `${open.centres.length} centres have no configuration; at most 8 are worked through.`,
          position: null,
        }
    : { ...search.refusal, position: null };
  const identity = describeIdentity(
    smiles,
    written,
    shown,
    open,
    openBonds,
    rings,
    author,
    read,
    services,
    hidden.length > 0,
  );
  const result: StructureResult = {
    identity,
    structure: drawStructure(written, services),
    written,
    writtenAtoms: read.writtenAtoms,
    rings,
    found: search.ok ? search.rings : [],
    author,
    body: refusal === null ? body : null,
    refusal,
    molecule: refusal === null ? chosen : null,
    members: open.members,
    alerts,
  };
  return { ok: true, result };
}

/**
 * The member whose conformers may stand for the structure as written: the only one there is, either of two mirror
 * images, or any when the open centres lie outside the rings, where they change neither place nor charge.
 */
function chooseMember(
  written: Molecule,
  open: OpenStereo,
  rings: readonly FoundRing[],
  services: Services,
): Molecule | null {
  if (!open.complete) return null;
  const [first, second, ...more] = open.members;
  if (second === undefined) return first!.molecule;
  if (more.length === 0 && first!.mirrorSmiles === second.canonicalSmiles) return first!.molecule;
  const inRing = new Set(
    rings.flatMap((ring) => [ring.atoms, ...ring.partners.map(({ atoms }) => atoms)]).flat(),
  );
  const outside = new Map(
    written.atoms.filter((atom) => !inRing.has(atom.index)).map((atom) => [atom.index, null]),
  );
  const ringsOnly = new Set<string>();
  for (const member of open.members) {
    const bare = withSenses(member.molecule, outside);
    const form = services.toolkit.canonicalSmiles(bare);
    const mirrored = services.toolkit.canonicalSmiles(mirrorImage(bare));
    ringsOnly.add([form, mirrored].sort()[0]!);
  }
  return ringsOnly.size === 1 ? first!.molecule : null;
}

function stereoAlerts(open: OpenStereo, analysed: boolean): Alert[] {
  if (open.centres.length === 0) return [];
  const which = `No configuration is given for atom${open.centres.length > 1 ? "s" : ""} ${open.centres.join(", ")} (counted from 0 in the SMILES).`;
  if (!open.complete) return [{ code: "stereo-unspecified", severity: "stop", message: which }];
  if (!analysed) {
    return [
      {
        code: "stereo-unspecified",
        severity: "stop",
        message: `${which} It stands for ${open.members.length} stereoisomers with different conformers; give the configuration, or allow the members to be listed.`,
      },
    ];
  }
  const mirror =
    open.members.length === 2 && open.members[0]!.mirrorSmiles === open.members[1]!.canonicalSmiles;
  const consequence = mirror
    ? "The two members are mirror images, with equal energies and populations; one of them is shown."
    : "The centres lie outside the analysed rings or do not change their conformers; one member is shown.";
  return [{ code: "stereo-unspecified", severity: "note", message: `${which} ${consequence}` }];
}

function describeIdentity(
  smiles: string,
  written: Molecule,
  shown: Molecule,
  open: OpenStereo,
  openBonds: readonly (readonly [number, number])[],
  rings: readonly AnalysedRing[],
  author: AuthorNumbering,
  read: { readonly formula: string; readonly molarMass: number },
  services: Services,
  chiralByShape: boolean,
): Identity {
  const { toolkit } = services;
  const labels = toolkit.descriptors(written);
  const locantOf = (atom: number): string | null => {
    for (const ring of rings) {
      const position = ring.atoms.indexOf(atom);
      if (position >= 0) return ring.names[position]!;
    }
    return author.atoms.get(atom) ?? null;
  };
  const given: Stereocentre[] = [...labels.atoms].flatMap(([atom, label]) =>
    label === "R" || label === "S" || label === "r" || label === "s"
      ? [{ atom, descriptor: label, locant: locantOf(atom) }]
      : [],
  );
  const missing: Stereocentre[] = open.centres
    .filter((atom) => !given.some((centre) => centre.atom === atom))
    .map((atom) => ({ atom, descriptor: "unspecified", locant: locantOf(atom) }));
  const inchi = toolkit.inchi(written);
  return {
    smiles,
    canonicalSmiles: toolkit.canonicalSmiles(written),
    inchi,
    inchikey: toolkit.inchikey(inchi),
    formula: read.formula,
    molarMass: Math.round(read.molarMass * 1000) / 1000,
    stereocentres: [...given, ...missing].sort((a, b) => a.atom - b.atom),
    stereobonds: [
      ...labels.bonds.flatMap(({ atoms, descriptor }) =>
        descriptor === "E" || descriptor === "Z" ? [{ atoms, descriptor } as const] : [],
      ),
      ...openBonds.map((atoms) => ({
        atoms: [atoms[0], atoms[1]] as const,
        descriptor: "unspecified" as const,
      })),
    ].sort((a, b) => a.atoms[0] - b.atoms[0] || a.atoms[1] - b.atoms[1]),
    chirality: chiralByShape
      ? "chiral"
      : chiralityOf(shown, toolkit, new Set([...labels.atoms.keys(), ...open.centres])),
  };
}

/** The graph with flat coordinates, rounded, and wedges with the narrow end first. */
function drawStructure(molecule: Molecule, services: Services): Structure {
  const depiction = services.toolkit.depict(molecule);
  const round = (value: number) => Math.round(value * 1e3) / 1e3 + 0;
  return {
    atoms: molecule.atoms.map((atom) => ({
      element: atom.element,
      charge: atom.charge,
      isotope: atom.isotope,
      hydrogens: atom.hydrogens,
      x: round(depiction.coordinates[atom.index]!.x),
      y: round(depiction.coordinates[atom.index]!.y),
    })),
    bonds: molecule.bonds.map((bond) => {
      const wedge = depiction.wedges.find(
        (entry) =>
          (entry.from === bond.from && entry.to === bond.to) ||
          (entry.from === bond.to && entry.to === bond.from),
      );
      return {
        from: wedge?.from ?? bond.from,
        to: wedge?.to ?? bond.to,
        order: bond.order,
        aromatic: bond.aromatic,
        wedge: wedge?.wedge ?? null,
      };
    }),
  };
}
