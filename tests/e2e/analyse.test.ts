import { beforeAll, describe, expect, test } from "vitest";
import { runRingfolio } from "../runRingfolio.ts";

interface Conformer {
  readonly label: string;
  readonly positions: readonly {
    readonly substituent: number;
    readonly orientation: "axial" | "equatorial";
  }[];
  readonly deltaG_kJ_mol: number;
  readonly u_kJ_mol: number;
  readonly population: number;
  readonly population95: readonly [number, number];
  readonly contributions: readonly {
    readonly value_kJ_mol: number;
    readonly basis: string;
    readonly source: string;
  }[];
}
interface Line {
  readonly id: string;
  readonly ok: boolean;
  readonly error?: { readonly code: string; readonly message: string };
  readonly conformers: readonly Conformer[];
  readonly relation: string | null;
}

const KCAL = 4.184;

/** All structures of the first block go through one pipe, since a pipe is what the command is for. */
const STRUCTURES = {
  cyclohexane: "C1CCCCC1",
  methyl: "CC1CCCCC1",
  "cis-1,2": "C[C@H]1CCCC[C@H]1C",
  "trans-1,2": "C[C@@H]1CCCC[C@H]1C",
  "cis-1,3": "C[C@@H]1CCC[C@H](C)C1",
  "trans-1,3": "C[C@H]1CCC[C@H](C)C1",
  "cis-1,4": "C[C@H]1CC[C@@H](C)CC1",
  "trans-1,4": "C[C@H]1CC[C@H](C)CC1",
  "ethyl and methyl on one carbon": "CC1(CC)CCCCC1",
  "cis-1-chloro-2-methyl": "C[C@H]1CCCC[C@H]1Cl",
  "trans-1-chloro-2-methyl": "C[C@@H]1CCCC[C@H]1Cl",
  "2-methoxyoxane": "CO[C@H]1CCCCO1",
  "trans-4-tert-butylcyclohexan-1-ol": "CC(C)(C)[C@H]1CC[C@H](O)CC1",
  "cis-4-tert-butylcyclohexan-1-ol": "CC(C)(C)[C@H]1CC[C@@H](O)CC1",
  "cis-1-tert-butyl-4-chlorocyclohexane": "CC(C)(C)[C@H]1CC[C@@H](Cl)CC1",
} as const;
type Name = keyof typeof STRUCTURES;

let answers: ReadonlyMap<string, Line>;

function analyse(lines: readonly (string | object)[]): readonly Line[] {
  const input = lines.map((line) => (typeof line === "string" ? line : JSON.stringify(line))).join("\n");
  const { status, stdout, stderr } = runRingfolio(["analyse"], { input: `${input}\n` });
  if (status !== 0) throw new Error(`analyse ended with ${status}: ${stderr}`);
  return stdout
    .trimEnd()
    .split("\n")
    .map((line) => JSON.parse(line) as Line);
}

const answer = (name: Name): Line => answers.get(name)!;
const first = (name: Name): Conformer => answer(name).conformers[0]!;

/** Orientation of the group whose first atom has this index in the SMILES. */
const orientation = (conformer: Conformer, atom: number) =>
  conformer.positions.find(({ substituent }) => substituent === atom)?.orientation;
const orientations = (conformer: Conformer) =>
  conformer.positions.map((position) => position.orientation.charAt(0)).join("");

describe("ringfolio analyse, on facts of the trade (common practice)", () => {
  beforeAll(() => {
    const solvent = (name: string) => (name === "2-methoxyoxane" ? { solvent: "CCl4" } : {});
    const lines = Object.entries(STRUCTURES).map(([id, smiles]) => ({ id, smiles, ...solvent(id) }));
    answers = new Map(analyse(lines).map((line) => [line.id, line]));
  });

  test("puts equatorial methyl first, at 95 % within 1 %, with its source and an interval around it", () => {
    const { conformers } = answer("methyl");
    expect(conformers.map(orientations)).toEqual(["e", "a"]);
    expect(Math.abs(conformers[0]!.population - 0.95)).toBeLessThanOrEqual(0.01);
    const [low, high] = conformers[0]!.population95;
    expect(low).toBeLessThan(conformers[0]!.population);
    expect(high).toBeGreaterThan(conformers[0]!.population);
    const charged = conformers.flatMap(({ contributions }) => contributions);
    expect(charged.filter(({ value_kJ_mol }) => value_kJ_mol !== 0).length).toBeGreaterThan(0);
    expect(charged.filter(({ source }) => source === "")).toEqual([]);
  });

  test("gives the unsubstituted ring half its time in either chair", () => {
    expect(answer("cyclohexane").conformers.map(({ population }) => population)).toEqual([0.5, 0.5]);
    expect(answer("cyclohexane").relation).toBe("identical");
  });

  test.each([
    { name: "cis-1,2", relation: "enantiomeric" },
    { name: "trans-1,3", relation: "identical" },
    { name: "cis-1,4", relation: "identical" },
  ] as const)("gives $name-dimethylcyclohexane two equally stable chairs that are $relation", (expected) => {
    const { conformers, relation } = answer(expected.name);
    expect(conformers.map(({ population }) => population)).toEqual([0.5, 0.5]);
    expect(conformers.map(({ u_kJ_mol }) => u_kJ_mol)).toEqual([0, 0]);
    expect(relation).toBe(expected.relation);
  });

  test.each([
    { name: "trans-1,2", least: 2.3, most: 2.9 },
    { name: "cis-1,3", least: 5.1, most: 5.7 },
    { name: "trans-1,4", least: 3, most: 4 },
  ] as const)(
    "gives $name-dimethylcyclohexane both methyls equatorial, by $least to $most kcal/mol",
    (expected) => {
      const { conformers, relation } = answer(expected.name);
      expect(conformers.map(orientations)).toEqual(["ee", "aa"]);
      expect(relation).toBe("diastereomeric");
      expect(conformers[1]!.deltaG_kJ_mol / KCAL).toBeGreaterThanOrEqual(expected.least);
      expect(conformers[1]!.deltaG_kJ_mol / KCAL).toBeLessThanOrEqual(expected.most);
    },
  );

  test("turns methyl axial rather than the bulkier ethyl on one carbon, by little", () => {
    const [major, minor] = answer("ethyl and methyl on one carbon").conformers;
    expect(orientation(major!, 0)).toBe("axial");
    expect(minor!.deltaG_kJ_mol / KCAL).toBeLessThan(0.5);
  });

  test("puts methyl equatorial in cis-1-chloro-2-methylcyclohexane and both groups in the trans isomer", () => {
    expect(orientation(first("cis-1-chloro-2-methyl"), 0)).toBe("equatorial");
    expect(orientation(first("cis-1-chloro-2-methyl"), 7)).toBe("axial");
    expect(orientations(first("trans-1-chloro-2-methyl"))).toBe("ee");
  });

  test("turns the methoxy group of 2-methoxyoxane axial in a solvent without polarity", () => {
    expect(orientations(first("2-methoxyoxane"))).toBe("a");
  });

  test.each([
    { name: "trans-4-tert-butylcyclohexan-1-ol", other: "equatorial" },
    { name: "cis-4-tert-butylcyclohexan-1-ol", other: "axial" },
    { name: "cis-1-tert-butyl-4-chlorocyclohexane", other: "axial" },
  ] as const)("keeps tert-butyl equatorial and the other group $other in $name", ({ name, other }) => {
    expect(orientation(first(name), 1)).toBe("equatorial");
    expect(orientation(first(name), 8)).toBe(other);
    expect(first(name).population).toBeGreaterThan(0.99);
  });
});

describe("ringfolio analyse, as a pipe", () => {
  test("answers every line in order and never stops at a bad one", () => {
    const lines = analyse([
      { id: "a", smiles: "CC1CCCCC1" },
      "{ this is not JSON",
      { id: "c", smiles: "C1CC" },
      { id: "d", smiles: "O=C1CCCCO1" },
      { id: "e", smiles: "FC1CCCCC1", temperature_K: -5 },
      { id: "f", smiles: "FC1CCCCC1", solvent: "treacle" },
      { id: "g", smiles: "FC1CCCCC1", temperature_K: 200, solvent: "CD2Cl2" },
    ]);
    expect(lines.map(({ ok }) => ok)).toEqual([true, false, false, false, false, false, true]);
    expect(lines.map(({ error }) => error?.code.split("-")[0])).toEqual([
      undefined,
      "invalid",
      "invalid",
      "unsupported",
      "invalid",
      "invalid",
      undefined,
    ]);
    expect(lines.flatMap(({ id }) => (typeof id === "string" && id !== "" ? [id] : []))).toEqual([
      "a",
      "c",
      "d",
      "e",
      "f",
      "g",
    ]);
  });

  test("gives nothing for nothing", () => {
    const { status, stdout } = runRingfolio(["analyse"], { input: "" });
    expect([status, stdout]).toEqual([0, ""]);
  });

  test("gives the same bytes for the same lines", () => {
    const input = '{"id":"m","smiles":"CO[C@@H]1CCCC[C@H]1O","solvent":"CDCl3"}\n';
    expect(runRingfolio(["analyse"], { input }).stdout).toBe(runRingfolio(["analyse"], { input }).stdout);
  });
});
