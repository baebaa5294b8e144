import { readFileSync } from "node:fs";
import type { Conformer, Dossier, Equilibrium, Orientation, Ring } from "../../src/dossier/Dossier.ts";

/** A group on a ring position, for the generator below. */
export interface GroupSpec {
  /** Index in the ring, 0 to 5. */
  readonly at: number;
  readonly face: "up" | "down";
  readonly element: string;
  readonly label: string;
  readonly labelReversed?: string;
}

export interface RingSpec {
  /** Elements of the six ring atoms; carbon where left out. */
  readonly elements?: Readonly<Record<number, string>>;
  readonly charges?: Readonly<Record<number, number>>;
  readonly groups: readonly GroupSpec[];
  readonly parent?: string;
}

export interface DossierSpec {
  readonly code?: string;
  readonly name?: string;
  readonly rings: readonly RingSpec[];
  /** Population of the first conformer of two, or of all. */
  readonly populations?: readonly number[];
  readonly relation?: Dossier["relation"];
  readonly unresolved?: boolean;
}

const RADIUS = 1.4652;
const HEIGHT = 0.2305;
const LENGTHS: Readonly<Record<string, number>> = {
  H: 1.1,
  C: 1.53,
  N: 1.47,
  O: 1.43,
  F: 1.36,
  Cl: 1.79,
  Br: 1.97,
  I: 2.15,
  Si: 1.88,
};

const sample = JSON.parse(
  readFileSync(new URL("../fixtures/sample.dossier.json", import.meta.url), "utf8"),
) as Dossier;

/** The committed sample record. */
export const sampleDossier: Dossier = sample;

/**
 * A dossier with ideal chairs (every ring flipped independently), for drawing tests only: its energies and
 * populations are invented and stand for nothing.
 */
export function makeDossier(spec: DossierSpec): Dossier {
  const atoms: {
    element: string;
    charge: number;
    isotope: number;
    hydrogens: number;
    x: number;
    y: number;
  }[] = [];
  const bonds: { from: number; to: number; order: 1; aromatic: false; wedge: null }[] = [];
  const rings = spec.rings.map((ringSpec, index): Ring => {
    const start = atoms.length;
    for (let k = 0; k < 6; k++) {
      const element = ringSpec.elements?.[k] ?? "C";
      const charge = ringSpec.charges?.[k] ?? 0;
      const groups = ringSpec.groups.filter((group) => group.at === k).length;
      const valence = { C: 4, N: 3, O: 2, S: 2 }[element] ?? 4;
      const angle = Math.PI / 2 - (Math.PI / 3) * k;
      atoms.push({
        element,
        charge,
        isotope: 0,
        hydrogens: Math.max(0, valence + charge - 2 - groups),
        x: 1.5 * Math.cos(angle) + 6 * index,
        y: 1.5 * Math.sin(angle),
      });
      bonds.push({ from: start + k, to: start + ((k + 1) % 6), order: 1, aromatic: false, wedge: null });
    }
    const substituents = ringSpec.groups.map((group) => {
      const atom = atoms.length;
      const angle = Math.PI / 2 - (Math.PI / 3) * group.at;
      atoms.push({
        element: group.element,
        charge: 0,
        isotope: 0,
        hydrogens: 0,
        x: 3 * Math.cos(angle) + 6 * index,
        y: 3 * Math.sin(angle),
      });
      bonds.push({ from: start + group.at, to: atom, order: 1, aromatic: false, wedge: null });
      return {
        ringAtom: start + group.at,
        atom,
        locant: `${group.at + 1}${"′".repeat(index)}`,
        face: group.face,
        group: group.label,
        label: group.label,
        labelReversed: group.labelReversed ?? group.label,
      };
    });
    return {
      index,
      atoms: Array.from({ length: 6 }, (_, k) => start + k),
      locants: Array.from({ length: 6 }, (_, k) => `${k + 1}${"′".repeat(index)}`),
      parent: ringSpec.parent ?? "cyclohexane",
      ringKey: ringSpec.parent ?? "cyclohexane",
      system: index,
      kind: "chair",
      substituents,
      branches: [],
      configuration: [],
    };
  });
  const count = 2 ** rings.length;
  const populations = spec.populations ?? Array.from({ length: count }, () => 1 / count);
  const conformers = populations.map((population, number): Conformer => {
    const signs = rings.map((_, bit) => ((number >> bit) & 1 ? -1 : 1) as 1 | -1);
    const positions = rings.flatMap((ring, r) =>
      ring.substituents.map((substituent) => {
        const up =
          signs[r]! * ((substituent.ringAtom - ring.atoms[0]!) % 2 === 0 ? 1 : -1) > 0 ? "up" : "down";
        const orientation: Orientation = substituent.face === up ? "axial" : "equatorial";
        return {
          ring: r,
          ringAtom: substituent.ringAtom,
          substituent: substituent.atom,
          locant: substituent.locant,
          kind: "group" as const,
          group: substituent.label,
          orientation,
          pseudo: false,
          face: substituent.face!,
        };
      }),
    );
    const label = [...positions]
      .sort((a, b) => a.locant.localeCompare(b.locant, "en"))
      .map((position) => {
        const shared = positions.filter((other) => other.ringAtom === position.ringAtom).length > 1;
        return `${position.locant}${position.orientation === "axial" ? "a" : "e"}${shared ? `(${position.group})` : ""}`;
      })
      .join(",");
    return {
      id: String.fromCharCode(65 + number),
      label,
      rings: rings.map((ring) => ({ ring: ring.index, form: "chair" })),
      positions,
      deltaG_kJ_mol: -2.479 * Math.log(population / populations[0]!) + 0,
      u_kJ_mol: number === 0 ? 0 : 0.5,
      sum_kJ_mol: 0,
      population,
      population95:
        spec.relation === "identical" || spec.relation === "enantiomeric"
          ? [population, population]
          : [Math.max(0, population - 0.03), Math.min(1, population + 0.02)],
      contributions: [],
      relaxed: null,
      nitrogens: [],
      geometry: { atoms: rings.flatMap((ring, r) => ringGeometry(ring, signs[r]!, atoms)) },
    };
  });
  const [first, ...others] = conformers;
  const bySymmetry = spec.relation === "identical" || spec.relation === "enantiomeric";
  const equilibria = others.map((conformer): Equilibrium => {
    const K = conformer.population / first!.population;
    return {
      from: first!.id,
      to: conformer.id,
      deltaG_kJ_mol: -2.479 * Math.log(K) + 0,
      u_kJ_mol: bySymmetry ? 0 : 1,
      deltaG95_kJ_mol: [0, 0],
      K,
      K95: [K, K],
      unresolved: spec.unresolved ?? false,
      bySymmetry,
    };
  });
  const code = spec.code ?? "TX-01";
  return {
    ...sample,
    code,
    slug: code.toLowerCase(),
    name: spec.name ?? "invented test compound",
    structure: { atoms, bonds },
    rings,
    systems: rings.map((ring) => ({
      index: ring.system,
      rings: [ring.index],
      atoms: ring.atoms,
      bonds: ring.atoms.map((from, k) => ({
        from,
        to: ring.atoms[(k + 1) % 6]!,
        order: 1 as const,
        aromatic: false,
      })),
      fusions: [],
    })),
    conformers,
    relation: spec.relation ?? (conformers.length === 2 ? "diastereomeric" : null),
    equilibria,
    temperatures: [],
  };
}

function ringGeometry(
  ring: Ring,
  sign: 1 | -1,
  atoms: readonly { readonly element: string; readonly hydrogens: number }[],
): Conformer["geometry"]["atoms"] {
  return ring.atoms.flatMap((atom, k) => {
    const angle = (-Math.PI / 3) * k;
    const up = sign * (k % 2 === 0 ? 1 : -1);
    const centre = { x: RADIUS * Math.cos(angle), y: RADIUS * Math.sin(angle), z: up * HEIGHT };
    const hang = (element: string, index: number | null, axial: boolean) => {
      const length = LENGTHS[element] ?? 1.5;
      const out = axial ? 0 : Math.sqrt(8) / 3;
      return {
        element,
        atom: index,
        parent: atom,
        system: ring.system,
        x: centre.x + length * out * Math.cos(angle),
        y: centre.y + length * out * Math.sin(angle),
        z: centre.z + length * (axial ? up : -up / 3),
      };
    };
    const here = ring.substituents.filter((substituent) => substituent.ringAtom === atom);
    const groups = here.map((substituent) => {
      const axial = (substituent.face === "up" ? 1 : -1) === up;
      return { axial, placed: hang(atoms[substituent.atom]!.element, substituent.atom, axial) };
    });
    const free = [false, true].filter((axial) => !groups.some((group) => group.axial === axial));
    return [
      { element: atoms[atom]!.element, atom, parent: null, system: ring.system, ...centre },
      ...groups.map((group) => group.placed),
      ...free.slice(0, atoms[atom]!.hydrogens).map((axial) => hang("H", null, axial)),
    ];
  });
}
