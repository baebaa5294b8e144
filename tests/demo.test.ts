import path from "node:path";
import { beforeAll, describe, expect, test } from "vitest";
import type { Collection } from "../src/dossier/Collection.ts";
import type { Dossier } from "../src/dossier/Dossier.ts";
import { loadCollection } from "../src/site/loadCollection.ts";
import { REPOSITORY } from "./sourceFiles.ts";

let collection: Collection;
let dossiers: readonly Dossier[] = [];

beforeAll(async () => {
  collection = await loadCollection(path.join(REPOSITORY, "content"));
  dossiers = collection.series.flatMap((series) => series.dossiers);
});

/** `cis` or `trans` of the pair of ring positions that a name such as `cis-2,6-dimethylmorpholine` speaks of. */
const wordOf = (text: string | null) => /^(cis|trans)\b/.exec(text ?? "")?.[1] ?? null;
/** Descriptors by locant, as a name gives them: `1R`, `2S`. */
const descriptorsOf = (name: string) => /\(((?:\d[RSrs],?)+)\)/.exec(name)?.[1]?.split(",") ?? [];

describe("The demo series", () => {
  test("is read and analysed without any problem", () => {
    expect(collection.diagnostics).toEqual([]);
    expect(dossiers.length).toBeGreaterThanOrEqual(14);
  });

  test("says on every page that its scenario is invented", () => {
    for (const series of collection.series) expect(series.notice).toMatch(/^Invented scenario/);
  });

  test("marks every measurement as invented", () => {
    const evidence = dossiers.flatMap((dossier) => dossier.evidence);
    expect(evidence.length).toBeGreaterThan(5);
    expect(evidence.filter(({ source }) => !source?.includes("invented"))).toEqual([]);
  });

  test("has names and claims whose cis and trans are those of its structures", () => {
    const said = dossiers.flatMap(({ code, name, claim, rings }) =>
      [wordOf(name), wordOf(claim?.configuration ?? null)].flatMap((word) => {
        const relations = rings.flatMap((ring) => ring.configuration.map(({ relation }) => relation));
        return word === null ? [] : [{ code, word, relations }];
      }),
    );
    expect(said.length).toBeGreaterThan(10);
    expect(said.filter(({ word, relations }) => relations.length !== 1 || relations[0] !== word)).toEqual([]);
  });

  test("has names whose CIP descriptors are those of its structures", () => {
    const named = dossiers.filter(({ name }) => descriptorsOf(name).length > 0);
    expect(named.length).toBeGreaterThan(5);
    for (const { name, identity } of named) {
      const found = identity.stereocentres.map(({ locant, descriptor }) => `${locant}${descriptor}`);
      expect(found.sort(), name).toEqual(descriptorsOf(name).sort());
    }
  });

  test.each([
    ["two superimposable chairs", (d: Dossier) => d.relation === "identical"],
    ["two mirror-image chairs", (d: Dossier) => d.relation === "enantiomeric"],
    ["an unresolved equilibrium", (d: Dossier) => d.equilibria.some(({ unresolved }) => unresolved)],
    ["two rings in one molecule", (d: Dossier) => d.rings.length === 2],
    [
      "a group with a ring in it",
      (d: Dossier) => d.rings[0]?.substituents.some(({ group }) => group === "Ph"),
    ],
    [
      "an axial anomeric group",
      (d: Dossier) => d.rings[0]?.parent === "oxane" && d.conformers[0]?.label === "2a",
    ],
    ["a piperidine", (d: Dossier) => d.rings[0]?.ringKey === "piperidine/NH"],
    ["an N-methylpiperidine", (d: Dossier) => d.rings[0]?.ringKey === "piperidine/NR"],
    ["a 1,3-dioxane", (d: Dossier) => d.rings[0]?.parent === "1,3-dioxane"],
    ["a morpholine", (d: Dossier) => d.rings[0]?.parent === "morpholine"],
    ["a locked pair", (d: Dossier) => d.name.includes("tert-butyl") && d.conformers[0]!.population > 0.99],
    ["an open configuration with its members", (d: Dossier) => d.members.length > 1],
    [
      "a gap in the register that shows",
      (d: Dossier) => d.alerts.some((a) => a.code === "value-not-available"),
    ],
    ["three groups on one ring", (d: Dossier) => d.rings[0]?.substituents.length === 3],
    [
      "an attached geometry",
      (d: Dossier) => d.evidence.some(({ kind, file }) => kind === "geometry" && file !== null),
    ],
  ] as const)("shows %s", (_, has) => {
    expect(dossiers.some((dossier) => has(dossier))).toBe(true);
  });
});
