import type { Dossier, RingSystem } from "../dossier/Dossier.ts";
import { systemRings } from "./systemRings.ts";
import { wordList } from "./wordList.ts";

const SIZES: Readonly<Record<number, string>> = {
  3: "three",
  4: "four",
  5: "five",
  6: "six",
  7: "seven",
  8: "eight",
};

/** How the rings of each system are joined, one sentence a system; none where every ring stands alone. */
export function systemSentences(dossier: Dossier): readonly string[] {
  return dossier.systems.flatMap((system) => {
    const rings = systemRings(dossier, system);
    const names = rings.map((ring, index) =>
      index < system.rings.length ? ownName(dossier, ring) : partnerName(system, ring),
    );
    const bridged = new Set<string>();
    const joints = rings.flatMap((ring, first) =>
      rings.slice(first + 1).flatMap((other, step): string[] => {
        const second = first + 1 + step;
        const shared = ring.filter((atom) => other.includes(atom));
        if (first >= system.rings.length || shared.length === 0) return [];
        if (shared.length > 2) {
          bridged.add(names[first]!).add(names[second]!);
          return [];
        }
        return [`${names[first]} and ${names[second]} ${joint(dossier, system, shared)}`];
      }),
    );
    const bridges = bridged.size === 0 ? [] : [`${wordList([...bridged])} bridge each other`];
    const words = [...joints, ...bridges].join("; ");
    return words === "" ? [] : [`${words.charAt(0).toUpperCase()}${words.slice(1)}.`];
  });
}

/** An analysed ring as the sentence about the conformer names it. */
function ownName(dossier: Dossier, atoms: readonly number[]): string {
  if (dossier.rings.length === 1) return "the ring";
  return `ring ${dossier.rings.findIndex((ring) => ring.atoms === atoms) + 1}`;
}

/** A ring that is not analysed by its size, and by its aromatic bonds. */
function partnerName(system: RingSystem, ring: readonly number[]): string {
  const own = system.bonds.filter(({ from, to }) => ring.includes(from) && ring.includes(to));
  const aromatic = own.length > 0 && own.every((bond) => bond.aromatic);
  const size = `${SIZES[ring.length] ?? String(ring.length)}-membered ring`;
  if (aromatic) return `an aromatic ${size}`;
  return `${ring.length === 8 ? "an" : "a"} ${size}`;
}

/** The words for two rings with one atom or one bond in common. */
function joint(dossier: Dossier, system: RingSystem, shared: readonly number[]): string {
  const locants = shared.map((atom) => {
    const ring = dossier.rings.find((each) => each.system === system.index && each.atoms.includes(atom));
    return ring?.locants[ring.atoms.indexOf(atom)] ?? "";
  });
  if (shared.length === 1) return `share atom ${locants[0]} (spiro)`;
  const fusion = system.fusions.find(({ atoms }) => atoms.every((atom) => shared.includes(atom)));
  const sorted = locants.sort((a, b) => Number.parseInt(a, 10) - Number.parseInt(b, 10));
  return `are fused ${fusion === undefined ? "" : `${fusion.relation} `}at ${wordList(sorted)}`;
}
