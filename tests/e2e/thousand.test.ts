import { readFileSync } from "node:fs";
import path from "node:path";
import { beforeAll, describe, expect, test } from "vitest";
import type { z } from "zod";
import { analyseLine } from "../../src/dossier/analyseLine.ts";
import { analyseOutput } from "../../src/dossier/analyseSchema.ts";
import { services } from "../dossier/demoServices.ts";
import { runRingfolio } from "../runRingfolio.ts";
import { REPOSITORY } from "../sourceFiles.ts";

/** How the lines were made stands at the head of the file. */
const LINES = readFileSync(path.join(REPOSITORY, "tests/fixtures/smiles-1000.txt"), "utf8")
  .split("\n")
  .filter((line) => line.includes("\t"))
  .map((line) => {
    const [id, smiles] = line.split("\t");
    return { id: id!, smiles: smiles! };
  });

type Answer = z.infer<typeof analyseOutput>;
let status: number | null;
let answers: readonly unknown[];
const shaped = () => answers.map((answer) => answer as Answer);

describe("ringfolio analyse on 1,000 varied structures", () => {
  beforeAll(() => {
    const input = LINES.map((line) => `${JSON.stringify(line)}\n`).join("");
    const run = runRingfolio(["analyse"], { input });
    status = run.status;
    answers = run.stdout
      .trimEnd()
      .split("\n")
      .map((line) => JSON.parse(line) as unknown);
    // The share refused, with reasons, for whoever reads the log.
    console.log(outcomes(shaped()));
  });

  test("answers every line in order and ends well", () => {
    expect(LINES).toHaveLength(1000);
    expect(status).toBe(0);
    expect(shaped().map(({ id }) => id)).toEqual(LINES.map(({ id }) => id));
  });

  test("keeps every answer in the published shape", () => {
    const stray = answers.flatMap((answer, place) => {
      const { error } = analyseOutput.safeParse(answer);
      return error === undefined ? [] : [`${LINES[place]!.smiles}: ${error.message}`];
    });
    expect(stray).toEqual([]);
  });

  test("refuses by name, with a sentence, and never for a reason it did not foresee", () => {
    const refused = shaped().flatMap((answer, place) =>
      answer.ok ? [] : [{ ...answer.error, smiles: LINES[place]!.smiles }],
    );
    expect(refused.filter(({ code }) => code === "unsupported-unexpected")).toEqual([]);
    expect(refused.filter(({ message }) => !/^.{10,}\.$/s.test(message))).toEqual([]);
  });

  test("gives conformers whose populations sum to one, or says in an alert why there are none", () => {
    const wrong = shaped().flatMap((answer, place) => {
      if (!answer.ok) return [];
      const sum = answer.conformers.reduce((total, { population }) => total + population, 0);
      const explained = answer.alerts.some(({ severity }) => severity === "stop");
      const right = answer.conformers.length === 0 ? explained : Math.abs(sum - 1) < 1e-9;
      return right ? [] : [`${LINES[place]!.smiles}: ${sum}`];
    });
    expect(wrong).toEqual([]);
  });

  test("needs less than a second of computing for each of the longest lines and of the longest without marks", async () => {
    const program = await services();
    const longest = (lines: typeof LINES) =>
      lines.toSorted((a, b) => b.smiles.length - a.smiles.length).slice(0, 20);
    /** In s, of this process alone: what else the machine does is no fault of the program. */
    const computingTime = (line: { id: string; smiles: string }) => {
      const before = process.cpuUsage();
      analyseLine(JSON.stringify(line), program);
      const { user, system } = process.cpuUsage(before);
      return (user + system) / 1e6;
    };
    // The first analysis loads what all later ones use.
    analyseLine('{"id":"first","smiles":"C1CCC2CCCCC2C1"}', program);
    const slow = [...longest(LINES), ...longest(LINES.filter(({ id }) => id.startsWith("n")))].flatMap(
      (line) => {
        const seconds = Math.min(computingTime(line), computingTime(line));
        return seconds < 1 ? [] : [`${line.smiles}: ${seconds} s`];
      },
    );
    expect(slow).toEqual([]);
  });
});

/** A table of what became of the lines: each outcome, how many, and their share. */
function outcomes(given: readonly Answer[]): string {
  const counts = new Map<string, number>();
  for (const answer of given) {
    const stops = answer.ok ? answer.alerts.filter(({ severity }) => severity === "stop") : [];
    const analysed =
      stops.length === 0 ? "conformers" : `no conformers: ${stops.map(({ code }) => code).join(", ")}`;
    const outcome = answer.ok ? analysed : `refused: ${answer.error.code}`;
    counts.set(outcome, (counts.get(outcome) ?? 0) + 1);
  }
  const share = (count: number) => `${((100 * count) / given.length).toFixed(1)} %`.padStart(7);
  return [...counts]
    .sort(([a, m], [b, n]) => n - m || (a < b ? -1 : 1))
    .map(([outcome, count]) => `${String(count).padStart(5)} ${share(count)}  ${outcome}`)
    .join("\n");
}
