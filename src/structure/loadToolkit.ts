import { createRequire } from "node:module";
import type { Log, MainModule, Mol } from "@rdkit/rdkit";
import { ELEMENTS } from "./elements.ts";
import { type Atom, type Bond, type Molecule, type TetrahedralSense, withSenses } from "./Molecule.ts";
import type { Depiction, Descriptors, ReadResult, Toolkit } from "./Toolkit.ts";

/** Longest SMILES read, in characters; a longer string is a mistake or an attack. */
const MAXIMUM_LENGTH = 2000;
/** Most atoms (hydrogens not counted) analysed. */
const MAXIMUM_ATOMS = 250;

interface JsonAtom {
  z?: number;
  impHs?: number;
  chg?: number;
  nRad?: number;
  isotope?: number;
  stereo?: string;
}
interface JsonBond {
  bo?: number;
  atoms: [number, number];
  stereo?: string;
  stereoAtoms?: [number, number];
}
interface JsonMolecule {
  atoms: JsonAtom[];
  bonds?: JsonBond[];
  extensions?: { aromaticAtoms?: number[]; aromaticBonds?: number[]; atomRings?: number[][] }[];
}

let loading: Promise<Toolkit> | undefined;

/**
 * Starts the cheminformatics library (RDKit compiled to WebAssembly, shipped in its package; no network).
 * Loaded once per process; every molecule handed to the library is freed before a call returns.
 */
export function loadToolkit(): Promise<Toolkit> {
  loading ??= start();
  return loading;
}

async function start(): Promise<Toolkit> {
  const initialise = createRequire(import.meta.url)("@rdkit/rdkit") as () => Promise<MainModule>;
  const library = await initialise();
  const log = library.set_log_capture("rdApp.*");
  if (log === null) throw new Error("the cheminformatics library offers no log");

  const use = <T>(molecule: Molecule, action: (mol: Mol) => T): T => {
    // The library's own assignment drops double-bond geometry that comes as a graph.
    const assignStereo = molecule.bonds.every((bond) => bond.stereo === null);
    const mol = library.get_mol(JSON.stringify(toJson(molecule)), JSON.stringify({ assignStereo }));
    if (mol === null) throw new Error(`the library refused its own graph: ${log.get_buffer()}`);
    try {
      return action(mol);
    } finally {
      mol.delete();
    }
  };

  return {
    version: library.version(),
    read: (smiles) => read(library, log, smiles),
    readFragment: (smiles) => {
      const mol = library.get_mol(smiles);
      if (mol === null) return null;
      try {
        return fromJson((JSON.parse(mol.get_json()) as { molecules: JsonMolecule[] }).molecules[0]!);
      } finally {
        mol.delete();
      }
    },
    // A second pass through SMILES lets the library perceive aromaticity afresh.
    canonicalSmiles: (molecule) => {
      const first = use(molecule, (mol) => mol.get_smiles());
      const again = library.get_mol(first);
      if (again === null) return first;
      try {
        return again.get_smiles();
      } finally {
        again.delete();
      }
    },
    inchi: (molecule) => use(molecule, (mol) => mol.get_inchi()),
    inchikey: (inchi) => (inchi === "" ? "" : library.get_inchikey_for_inchi(inchi)),
    descriptors: (molecule) =>
      use(molecule, (mol) => {
        if (molecule.bonds.every((bond) => bond.stereo === null)) return readDescriptors(mol);
        // The library labels double bonds only in what it read from SMILES or a connection table, which has to be made
        // before its labelling drops them from the graph.
        const table = library.get_mol(mol.get_molblock());
        const own = readDescriptors(mol);
        if (table === null) return own;
        try {
          return { atoms: own.atoms, bonds: readDescriptors(table).bonds };
        } finally {
          table.delete();
        }
      }),
    depict: (molecule) => use(molecule, readDepiction),
  };
}

function read(library: MainModule, log: Log, smiles: string): ReadResult {
  if (smiles.trim() === "") return { ok: false, reason: "The SMILES is empty.", position: 0 };
  if (smiles.length > MAXIMUM_LENGTH) {
    return {
      ok: false,
      reason: `The SMILES is longer than ${MAXIMUM_LENGTH} characters.`,
      position: MAXIMUM_LENGTH,
    };
  }
  // Anything else the library would take (mol blocks, JSON, a name after a space) is not a SMILES.
  const stray = /[^\x21-\x7e]|[{}"'`,;|<>_^~!?&]/.exec(smiles);
  if (stray !== null) {
    return { ok: false, reason: `A SMILES holds no ${JSON.stringify(stray[0])}.`, position: stray.index };
  }
  log.clear_buffer();
  const mol = library.get_mol(smiles);
  if (mol === null) return { ok: false, ...explain(log.get_buffer(), smiles) };
  try {
    const json = JSON.parse(mol.get_json()) as { molecules: JsonMolecule[] };
    const molecule = withFirstPyramidsAsWritten(fromJson(json.molecules[0]!));
    if (molecule.atoms.length > MAXIMUM_ATOMS) {
      return { ok: false, reason: `More than ${MAXIMUM_ATOMS} atoms.`, position: null };
    }
    const wildcard = molecule.atoms.find((atom) => atom.atomicNumber === 0);
    if (wildcard !== undefined) {
      return {
        ok: false,
        reason: "A whole molecule is needed; the SMILES has an open attachment point (*).",
        position: smiles.indexOf("*"),
      };
    }
    const values = JSON.parse(mol.get_descriptors()) as { amw: number };
    return {
      ok: true,
      molecule,
      writtenAtoms: writtenAtoms(library, smiles, molecule),
      formula: hillFormula(molecule),
      molarMass: values.amw,
    };
  } finally {
    mol.delete();
  }
}

/**
 * The sense of a three-coordinate atom that begins a SMILES or a part of it is given from its lone pair, as from a
 * hydrogen (OpenSMILES, from memory); the library takes it from the first neighbour, which is the other sense.
 */
function withFirstPyramidsAsWritten(molecule: Molecule): Molecule {
  const senses = new Map<number, TetrahedralSense>();
  const seen = new Set<number>();
  for (const { index } of molecule.atoms) {
    if (seen.has(index)) continue;
    const queue = [index];
    for (let atom = queue.pop(); atom !== undefined; atom = queue.pop()) {
      if (seen.has(atom)) continue;
      seen.add(atom);
      queue.push(...molecule.atoms[atom]!.neighbours);
    }
    const first = molecule.atoms[index]!;
    if (first.stereo === null || first.hydrogens > 0 || first.neighbours.length !== 3) continue;
    senses.set(index, first.stereo === "cw" ? "ccw" : "cw");
  }
  return senses.size === 0 ? molecule : withSenses(molecule, senses);
}

/**
 * The library folds hydrogens written as atoms into their neighbours. Read again with them kept, the atoms that are
 * no such hydrogen stand in the same order.
 */
function writtenAtoms(library: MainModule, smiles: string, molecule: Molecule): readonly number[] {
  const all = molecule.atoms.map((atom) => atom.index);
  if (!smiles.includes("[H]")) return all;
  const mol = library.get_mol(smiles, JSON.stringify({ removeHs: false }));
  if (mol === null) return all;
  try {
    const whole = fromJson((JSON.parse(mol.get_json()) as { molecules: JsonMolecule[] }).molecules[0]!);
    const kept = whole.atoms.filter(
      (atom) => !(atom.element === "H" && atom.isotope === 0 && atom.neighbours.length === 1),
    );
    const fits =
      kept.length === all.length && kept.every((atom, i) => atom.element === molecule.atoms[i]!.element);
    return fits ? kept.map((atom) => atom.index) : all;
  } finally {
    mol.delete();
  }
}

/** Turns the library's log into one sentence and a position. */
function explain(log: string, smiles: string): { reason: string; position: number | null } {
  const at = /around position (\d+)/.exec(log);
  const position = at === null ? null : Math.min(smiles.length - 1, Number(at[1]) - 1);
  const valence = /valence for atom # (\d+) (\w+), (\d+)/.exec(log);
  if (valence !== null) {
    return {
      reason: `${valence[2]} (atom ${valence[1]}, counted from 0) would have ${valence[3]} bonds, which is too many.`,
      position: null,
    };
  }
  if (/unclosed ring/.test(log)) return { reason: "A ring is opened and never closed.", position };
  if (/extra close parentheses/.test(log))
    return { reason: "A closing parenthesis has no opening one.", position };
  if (/extra open parentheses/.test(log))
    return { reason: "An opening parenthesis is never closed.", position };
  if (/kekulize/i.test(log))
    return { reason: "The aromatic atoms cannot be given alternating double bonds.", position };
  if (/syntax error/.test(log)) return { reason: "This is not a valid SMILES.", position };
  return { reason: "This is not a valid SMILES.", position };
}

function fromJson(json: JsonMolecule): Molecule {
  const extension =
    json.extensions?.find((entry) => entry.aromaticAtoms !== undefined || entry.atomRings !== undefined) ??
    {};
  const aromaticAtoms = new Set(extension.aromaticAtoms ?? []);
  const aromaticBonds = new Set(extension.aromaticBonds ?? []);
  const neighbours: number[][] = json.atoms.map(() => []);
  const bonds: Bond[] = (json.bonds ?? []).map((bond, index) => {
    const [from, to] = bond.atoms;
    neighbours[from]!.push(to);
    neighbours[to]!.push(from);
    const order = bond.bo ?? 1;
    const sense = bond.stereo === "cis" || bond.stereo === "trans" ? bond.stereo : null;
    return {
      index,
      from,
      to,
      order: order === 2 || order === 3 ? order : 1,
      aromatic: aromaticBonds.has(index),
      stereo:
        sense !== null && bond.stereoAtoms !== undefined ? { sense, references: bond.stereoAtoms } : null,
    };
  });
  const atoms: Atom[] = json.atoms.map((atom, index) => ({
    index,
    element: ELEMENTS[atom.z ?? 6] ?? "*",
    atomicNumber: atom.z ?? 6,
    charge: atom.chg ?? 0,
    isotope: atom.isotope ?? 0,
    hydrogens: atom.impHs ?? 0,
    radicals: atom.nRad ?? 0,
    aromatic: aromaticAtoms.has(index),
    stereo: atom.stereo === "cw" || atom.stereo === "ccw" ? atom.stereo : null,
    neighbours: neighbours[index]!,
  }));
  return { atoms, bonds, rings: extension.atomRings ?? [] };
}

function toJson(molecule: Molecule): unknown {
  return {
    rdkitjson: { version: 12 },
    defaults: {
      atom: { z: 6, impHs: 0, chg: 0, nRad: 0, isotope: 0, stereo: "unspecified" },
      bond: { bo: 1, stereo: "unspecified" },
    },
    molecules: [
      {
        atoms: molecule.atoms.map((atom) => ({
          z: atom.atomicNumber,
          impHs: atom.hydrogens,
          chg: atom.charge,
          nRad: atom.radicals,
          isotope: atom.isotope,
          ...(atom.stereo === null ? {} : { stereo: atom.stereo }),
        })),
        bonds: molecule.bonds.map((bond) => ({
          bo: bond.order,
          atoms: [bond.from, bond.to],
          ...(bond.stereo === null ? {} : { stereo: bond.stereo.sense, stereoAtoms: bond.stereo.references }),
        })),
      },
    ],
  };
}

function readDescriptors(mol: Mol): Descriptors {
  const tags = JSON.parse(mol.get_stereo_tags()) as {
    CIP_atoms: [number, string][];
    CIP_bonds: [number, number, string][];
  };
  const bare = (tag: string) => tag.replace(/[()]/g, "");
  return {
    atoms: new Map(tags.CIP_atoms.map(([atom, tag]) => [atom, bare(tag)])),
    bonds: tags.CIP_bonds.map(([a, b, tag]) => ({ atoms: [a, b], descriptor: bare(tag) })),
  };
}

/** Reads coordinates and wedges from the library's V2000 connection table (fixed columns). */
function readDepiction(mol: Mol): Depiction {
  mol.set_new_coords();
  const lines = mol.get_molblock().split("\n");
  const counts = lines[3]!;
  const atoms = Number(counts.slice(0, 3));
  const bonds = Number(counts.slice(3, 6));
  const coordinates = lines
    .slice(4, 4 + atoms)
    .map((line) => ({ x: Number(line.slice(0, 10)), y: Number(line.slice(10, 20)) }));
  const wedges = lines.slice(4 + atoms, 4 + atoms + bonds).flatMap((line) => {
    const mark = Number(line.slice(9, 12));
    if (mark !== 1 && mark !== 6) return [];
    const wedge: "solid" | "hashed" = mark === 1 ? "solid" : "hashed";
    return [{ from: Number(line.slice(0, 3)) - 1, to: Number(line.slice(3, 6)) - 1, wedge }];
  });
  return { coordinates, wedges };
}

/** Molecular formula in Hill order, with the net charge. */
function hillFormula(molecule: Molecule): string {
  const counts = new Map<string, number>();
  const add = (element: string, n: number) => n > 0 && counts.set(element, (counts.get(element) ?? 0) + n);
  let charge = 0;
  for (const atom of molecule.atoms) {
    add(atom.element === "H" && atom.isotope === 2 ? "D" : atom.element, 1);
    add("H", atom.hydrogens);
    charge += atom.charge;
  }
  const rest = [...counts.keys()].filter((e) => e !== "C" && e !== "H" && e !== "D").sort();
  const order = counts.has("C") ? ["C", "H", "D", ...rest] : [...counts.keys()].sort();
  const body = order
    .filter((element) => counts.has(element))
    .map((element) => element + (counts.get(element)! > 1 ? counts.get(element) : ""))
    .join("");
  if (charge === 0) return body;
  const size = Math.abs(charge) > 1 ? String(Math.abs(charge)) : "";
  return `${body}${size}${charge > 0 ? "+" : "−"}`;
}
