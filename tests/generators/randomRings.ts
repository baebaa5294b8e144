import { readSketch } from "./readSketch.ts";
import { bondsAt, hydrogensOn, otherEnd, type Sketch } from "./Sketch.ts";
import { type SeededRandom, seededRandom } from "./seededRandom.ts";
import { GROUPS, ISOTOPES, KINDS, type Kind, SKELETONS } from "./skeletons.ts";
import { writeSketch } from "./writeSketch.ts";

export interface RandomRing {
  readonly kind: Kind;
  readonly smiles: string;
}

export interface Wanted {
  readonly seed: number;
  readonly count: number;
  /** All kinds, in turn, when absent. */
  readonly kinds?: readonly Kind[];
  /** `full`: every atom that may be a centre has a mark; `none`: no atom has one. */
  readonly stereo?: "full" | "none";
  /** Fewest and most groups on one molecule; 0 to 4 when absent. */
  readonly groups?: readonly [least: number, most: number];
  /** Hangs one isotope on each molecule as well. */
  readonly isotopes?: boolean;
}

/** Molecules with six-membered rings, with invented combinations of groups and configurations; none twice. */
export function randomRings(wanted: Wanted): RandomRing[] {
  const random = seededRandom(wanted.seed);
  const kinds = wanted.kinds ?? KINDS;
  const made = new Map<string, RandomRing>();
  for (let turn = 0; made.size < wanted.count; turn++) {
    if (turn > 20 * wanted.count) throw new Error("these kinds and groups do not give so many molecules");
    const kind = kinds[turn % kinds.length]!;
    const sketch = readSketch(random.pick(SKELETONS[kind]));
    const [least, most] = wanted.groups ?? [0, 4];
    const groups = least + random.whole(most - least + 1);
    const sites = sketch.atoms.length;
    for (let n = 0; n < groups; n++) hangGroup(sketch, sites, GROUPS, random);
    if (wanted.isotopes === true) hangGroup(sketch, sites, ISOTOPES, random);
    if ((wanted.stereo ?? "full") === "full") {
      for (const [atom, entry] of sketch.atoms.entries()) {
        if (mayBeCentre(sketch, atom)) entry.sense = random.pick(["@", "@@"] as const);
      }
    }
    const smiles = writeSketch(sketch, random);
    if (!made.has(smiles)) made.set(smiles, { kind, smiles });
  }
  return [...made.values()];
}

/** Hangs a group on one of the skeleton's own atoms that still has a hydrogen; nitrogen takes carbon only. */
function hangGroup(sketch: Sketch, sites: number, groups: readonly string[], random: SeededRandom): void {
  const open = sketch.atoms.flatMap(({ symbol }, atom) =>
    atom < sites && (symbol === "C" || symbol === "N" || symbol === "Si") && hydrogensOn(sketch, atom) > 0
      ? [atom]
      : [],
  );
  if (open.length === 0) return;
  const site = random.pick(open);
  const choice =
    sketch.atoms[site]!.symbol === "N" ? groups.filter((text) => /^C(?![l#=])/.test(text)) : groups;
  if (choice.length === 0) return;
  const group = readSketch(random.pick(choice));
  const shift = sketch.atoms.length;
  sketch.atoms.push(...group.atoms);
  sketch.bonds.push({ from: site, to: shift, symbol: "" });
  for (const { from, to, symbol } of group.bonds)
    sketch.bonds.push({ from: from + shift, to: to + shift, symbol });
}

/** True for carbon with at most one hydrogen and no two equal leaves, for a sulfoxide and for an ammonium ion. */
function mayBeCentre(sketch: Sketch, atom: number): boolean {
  const bonds = bondsAt(sketch, atom);
  const { symbol } = sketch.atoms[atom]!;
  if (symbol === "S") return bonds.length === 3;
  if (symbol !== "C" && symbol !== "N+" && symbol !== "Si") return false;
  if (bonds.some((bond) => bond.symbol !== "")) return false;
  if (bonds.length < (symbol === "N+" ? 4 : 3)) return false;
  const leaves = bonds
    .map((bond) => otherEnd(bond, atom))
    .filter((other) => bondsAt(sketch, other).length === 1)
    .map((other) => sketch.atoms[other]!.symbol);
  return new Set(leaves).size === leaves.length;
}
