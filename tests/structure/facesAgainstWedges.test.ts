import { describe, expect, test } from "vitest";
import { findRings } from "../../src/structure/findRings.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";
import { ringFaces } from "../../src/structure/ringFaces.ts";

/** Minimal linear congruential generator (Numerical Recipes constants), so that every run draws the same molecules. */
function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

const GROUPS = [
  "C",
  "CC",
  "O",
  "OC",
  "Cl",
  "F",
  "N",
  "C(C)C",
  "C(=O)OC",
  "c1ccccc1",
  "C#N",
  "C(C)(C)C",
  "SC",
  "Br",
];

/** A random ring SMILES with explicit senses, begun at a random atom. */
function randomRing(random: () => number): string {
  const pick = <T>(list: readonly T[]) => list[Math.floor(random() * list.length)]!;
  const hetero = pick(["", "", "O", "N", "S"]);
  const atoms = Array.from({ length: 6 }, (_, i) => {
    if (i === 0 && hetero !== "") return { open: hetero, rest: "" };
    const r = random();
    const sense = pick(["@", "@@"]);
    if (r < 0.4) return { open: "C", rest: "" };
    const group = pick(GROUPS).replace("c1ccccc1", "c9ccccc9");
    if (r < 0.9) return { open: `[C${sense}H]`, rest: `(${group})` };
    return { open: `[C${sense}]`, rest: `(${group})(${pick(GROUPS).replace("c1ccccc1", "c8ccccc8")})` };
  });
  // The sense of the opening atom counts its ring-closure digit first; the generator leaves that to the reader.
  return atoms.map((atom, i) => `${atom.open}${i === 0 || i === 5 ? "1" : ""}${atom.rest}`).join("");
}

describe("Faces of ring groups against an independent reading (source: RDKit, its own wedge assignment)", () => {
  // source: the depiction code of the RDKit library assigns solid and hashed wedges by itself (new stereo
  // perception, wedging after IUPAC 2006 recommendations); a wedge's side is read here from the drawing's
  // coordinates alone.
  test("up and down agree with the wedges of the flat drawing on 400 random rings", async () => {
    const toolkit = await loadToolkit();
    const random = seeded(20261201);
    let compared = 0;
    let rings = 0;
    for (let n = 0; n < 400; n++) {
      const smiles = randomRing(random);
      const read = toolkit.read(smiles);
      if (!read.ok) throw new Error(`${smiles}: ${read.reason}`);
      const search = findRings(read.molecule);
      if (!search.ok) continue;
      rings++;
      const ring = search.rings[0]!.atoms;
      const faces = ringFaces(read.molecule, ring);
      const { coordinates, wedges } = toolkit.depict(read.molecule);
      let area = 0;
      ring.forEach((atom, i) => {
        const a = coordinates[atom]!;
        const b = coordinates[ring[(i + 1) % 6]!]!;
        area += a.x * b.y - b.x * a.y;
      });
      const clockwise = area < 0;
      for (const site of faces) {
        if (site.faces !== "fixed") continue;
        const marks = wedges.filter((w) => w.from === site.ringAtom && !ring.includes(w.to));
        for (const mark of marks) {
          const towardsViewer = mark.wedge === "solid";
          const up = site.up === mark.to;
          expect(up, `${smiles} atom ${site.ringAtom}`).toBe(towardsViewer === clockwise);
          compared++;
        }
      }
    }
    expect(rings).toBeGreaterThan(300);
    expect(compared).toBeGreaterThan(600);
  });
});
