import { expect, test } from "vitest";
import { findRings } from "../../src/structure/findRings.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";
import { type RandomRing, randomRings } from "./randomRings.ts";
import { KINDS } from "./skeletons.ts";

const full = randomRings({ seed: 11, count: 600 });
const smiles = (list: readonly RandomRing[]) => list.map((entry) => entry.smiles);

test("drawn molecules are the same for a seed and others for another seed", () => {
  expect(randomRings({ seed: 11, count: 600 })).toEqual(full);
  expect(smiles(randomRings({ seed: 12, count: 50 }))).not.toEqual(smiles(full.slice(0, 50)));
});

test("every drawn molecule is readable and holds a six-membered ring that no reader refuses", async () => {
  const toolkit = await loadToolkit();
  const plain = randomRings({ seed: 13, count: 300, stereo: "none", isotopes: true });
  for (const entry of [...full, ...plain]) {
    const read = toolkit.read(entry.smiles);
    expect(read.ok, entry.smiles).toBe(true);
    if (read.ok) expect(findRings(read.molecule).ok, entry.smiles).toBe(true);
  }
});

test("kinds are selectable, and the variant without configurations has no mark", () => {
  const some = randomRings({ seed: 14, count: 80, kinds: ["spiro", "decalin"], stereo: "none" });
  expect(new Set(some.map(({ kind }) => kind))).toEqual(new Set(["spiro", "decalin"]));
  expect(smiles(some).filter((text) => text.includes("@"))).toEqual([]);
  expect(new Set(full.map(({ kind }) => kind))).toEqual(new Set(KINDS));
  expect(smiles(full).filter((text) => text.includes("@")).length).toBeGreaterThan(500);
});
