import { type Chair, hasOrientations, isPseudo, orientationOf } from "../../conformers/Chair.ts";
import type { ChairSet } from "../../conformers/enumerateConformers.ts";
import { labelText } from "../../quantity/labelText.ts";
import type { Substituent } from "../../structure/StructureAnalysis.ts";

/**
 * A label for each conformer: locants with a or e, `ψ` before the letter next to a flat bond. The group stands in brackets
 * where two share a ring atom; in a system of several rings the letter is
 * set off, and a group that two rings share has a letter for each, `4a-a/e`. Bonds between
 * rings are named where groups alone do not tell the conformers apart, and where there are no groups.
 */
export function conformerLabels(sets: readonly ChairSet[]): readonly string[] {
  const short = sets.map((chairs) => groupEntries(chairs).join(","));
  const join = (...parts: string[]) => parts.filter((part) => part !== "").join("; ") || "unsubstituted";
  const plain = sets.map((chairs, i) => join(short[i]!, formEntries(chairs)));
  const isClear = (labels: readonly string[]) =>
    new Set(labels).size === labels.length && !labels.includes("unsubstituted");
  if (isClear(plain)) return plain;
  // Each bond between rings once; where even that leaves two alike, from both of its sides.
  const labels = [false, true].map((all) =>
    sets.map((chairs, i) => join(short[i]!, branchEntries(chairs, all).join(","), formEntries(chairs))),
  );
  return isClear(labels[0]!) ? labels[0]! : labels[1]!;
}

interface Entry {
  readonly locant: string;
  readonly group: string;
  /** In a system of several rings the letter is set off, since locants may end in letters there. */
  readonly apart: boolean;
  readonly letters: string[];
}

function groupEntries(chairs: ChairSet): readonly string[] {
  const entries = new Map<number, Entry>();
  for (const chair of chairs.filter(hasOrientations)) {
    const { ring } = chair;
    for (const group of ring.substituents) {
      const several = ring.substituents.filter((s) => s.ringAtom === group.ringAtom).length > 1;
      const entry = entries.get(group.atom) ?? {
        locant: ring.names[ring.atoms.indexOf(group.ringAtom)]!,
        group: several ? `(${labelText(group.label)})` : "",
        apart: ring.partners.length > 0,
        letters: [],
      };
      entry.letters.push(letterOf(chair, group));
      entries.set(group.atom, entry);
    }
  }
  return [...entries.values()]
    .sort(
      (a, b) =>
        compareLocants(a.locant, b.locant) || (a.letters[0]! + a.group < b.letters[0]! + b.group ? -1 : 1),
    )
    .map(({ locant, group, apart, letters }) => {
      const short = new Set(letters).size === 1 ? letters[0]! : letters.join("/");
      return `${locant}${apart ? "-" : ""}${short}${group}`;
    });
}

/** Bonds between rings, each seen from the ring that comes first, or `all` of them from every ring. */
function branchEntries(chairs: ChairSet, all: boolean): readonly string[] {
  return chairs.filter(hasOrientations).flatMap((chair, index) => {
    const earlier = new Set(chairs.slice(0, index).flatMap(({ ring }) => ring.atoms));
    return chair.ring.branches
      .filter((branch) => all || !earlier.has(branch.atom))
      .map((branch) => {
        const from = chair.ring.names[chair.ring.atoms.indexOf(branch.ringAtom)]!;
        return `${from}–${branch.label.replace(/^ring [A-Z][a-z]?/, "")} ${letterOf(chair, branch)}`;
      });
  });
}

/** Forms other than chairs and half-chairs, which have no letters. */
function formEntries(chairs: ChairSet): string {
  return chairs
    .filter((chair) => !hasOrientations(chair))
    .map((chair) => {
      const name = chair.form === "twist-boat" ? `twist-boat ${twistBonds(chair)}` : chair.form;
      return chairs.length > 1 ? `ring ${chair.ring.index + 1} ${name}` : name;
    })
    .join(", ");
}

/** Which of the six twist-boats: the two bonds with the largest torsions, and their sign. */
function twistBonds({ ring, torsions }: Chair): string {
  const largest = Math.max(...torsions.map(Math.abs));
  const bonds = torsions.flatMap((torsion, k) =>
    Math.abs(torsion) === largest ? [`${ring.names[k]}–${ring.names[(k + 1) % 6]}`] : [],
  );
  const sign = torsions.find((torsion) => Math.abs(torsion) === largest)! > 0 ? "+" : "−";
  return `(${bonds.join(", ")}, ${sign})`;
}

function letterOf(chair: Chair, group: Substituent): string {
  const letter = orientationOf(chair, group) === "axial" ? "a" : "e";
  return isPseudo(chair, group.ringAtom) ? `ψ${letter}` : letter;
}

/** By number, then by letter, primes last: 1, 2, 4a, 5, 1′. */
function compareLocants(a: string, b: string): number {
  const key = (locant: string) => [
    (locant.match(/′/g) ?? []).length,
    Number.parseInt(locant, 10),
    (/[a-z]/.exec(locant)?.[0] ?? "").charCodeAt(0) || 0,
  ];
  const [x, y] = [key(a), key(b)];
  const at = x.findIndex((value, i) => value !== y[i]);
  return at < 0 ? 0 : x[at]! - y[at]!;
}
