import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { contentsOf, type Run, runRingfolio, temporaryFolder, workspace } from "../runRingfolio.ts";

const folders: string[] = [];
const keep = (folder: string) => {
  folders.push(folder);
  return folder;
};
afterAll(() => {
  for (const folder of folders) rmSync(folder, { recursive: true, force: true });
});

describe("ringfolio build on the demo", () => {
  let folder = "";
  let first: ReadonlyMap<string, string>;
  let run: Run;

  beforeAll(() => {
    folder = keep(workspace("content"));
    run = runRingfolio(["build"], { cwd: folder });
    first = run.status === 0 ? contentsOf(path.join(folder, "_site")) : new Map();
  });

  test("succeeds and writes the home page and one page a compound", () => {
    expect(run.stderr + run.stdout).not.toMatch(/error\[/);
    expect(run.status).toBe(0);
    expect([...first.keys()]).toContain("index.html");
  });

  test("is quiet on a pipe: no progress, no control characters", () => {
    expect(run.stdout + run.stderr).not.toContain("\u001b");
    expect((run.stdout + run.stderr).trim().split("\n").length).toBeLessThan(10);
  });

  test("gives the same bytes a second time, from another folder", () => {
    const elsewhere = keep(workspace("content"));
    expect(runRingfolio(["build"], { cwd: elsewhere }).status).toBe(0);
    const second = contentsOf(path.join(elsewhere, "_site"));
    expect([...second.keys()]).toEqual([...first.keys()]);
    expect([...second].filter(([name, bytes]) => first.get(name) !== bytes).map(([name]) => name)).toEqual(
      [],
    );
  });

  test("leaves nothing beside the site", () => {
    expect(readdirSync(folder).sort()).toEqual(["_site", "content"]);
  });

  test("names neither the day nor the folder it was built in", () => {
    const year = String(new Date().getFullYear());
    const texts = [...first].filter(([name]) => /\.(html|svg|js|css|csv|json)$/.test(name));
    const told = texts.filter(([, bytes]) => Buffer.from(bytes, "base64").toString("utf8").includes(folder));
    expect(told.map(([name]) => name)).toEqual([]);
    expect(Buffer.from(first.get("index.html") ?? "", "base64").toString("utf8")).not.toContain(`${year}-`);
  });
});

describe("ringfolio check on the demo", () => {
  test("succeeds and writes nothing", () => {
    const folder = keep(workspace("content"));
    const { status, stderr } = runRingfolio(["check"], { cwd: folder });
    expect(stderr).not.toMatch(/error\[/);
    expect(status).toBe(0);
    expect(readdirSync(folder)).toEqual(["content"]);
  });
});

/** File, code and, where there is one, the suggestion of each of the ten mistakes. */
const MISTAKES = [
  { file: "dn-01-group.md", line: 8, suggestion: "t-Bu" },
  { file: "dn-02-smiles.md", line: 4, suggestion: null },
  { file: "dn-03-locant.md", line: 7, suggestion: null },
  { file: "dn-04-key.md", line: 5, suggestion: "conditions" },
  { file: "dn-05-code.md", line: 2, suggestion: null },
  { file: "dn-06-temperature.md", line: 7, suggestion: "298 K" },
  { file: "dn-07-yaml.md", line: 3, suggestion: null },
  { file: "dn-08-directive.md", line: 10, suggestion: "::figure[equilibrium]" },
  { file: "dn-09-evidence.md", line: 11, suggestion: "dn-09.cif" },
  { file: "dn-10-script.md", line: 1, suggestion: null },
];

describe("A folder with ten different mistakes", () => {
  let folder = "";
  let before: ReadonlyMap<string, string>;
  let run: Run;

  beforeAll(() => {
    folder = keep(workspace("tests/fixtures/ten-mistakes"));
    mkdirSync(path.join(folder, "_site"));
    writeFileSync(path.join(folder, "_site/index.html"), "<p>the last good site</p>\n");
    before = contentsOf(path.join(folder, "_site"));
    run = runRingfolio(["build"], { cwd: folder });
  });

  test("fails with the exit code of mistakes in content", () => {
    expect(run.status).toBe(1);
  });

  test.each(MISTAKES)(
    "has its mistake in $file reported with line and column",
    ({ file, line, suggestion }) => {
      const reports = run.stderr.split("\n\n").filter((report) => report.includes(`/${file}:${line}:`));
      expect(reports.join("\n")).toMatch(
        new RegExp(`${file.replace(".", "\\.")}:${line}:\\d+: error\\[[a-z-]+\\]`),
      );
      if (suggestion !== null) expect(reports.join("\n")).toContain(`Did you mean "${suggestion}`);
    },
  );

  test("has ten mistakes and no more", () => {
    expect(run.stderr.match(/: error\[/g)?.length).toBe(10);
  });

  test("leaves the previous site byte-identical and nothing beside it", () => {
    expect(contentsOf(path.join(folder, "_site"))).toEqual(before);
    expect(readdirSync(folder).sort()).toEqual(["_site", "content"]);
  });

  test("fails the check in the same words", () => {
    const { status, stderr } = runRingfolio(["check"], { cwd: folder });
    expect(status).toBe(1);
    expect(stderr.match(/: error\[/g)?.length).toBe(10);
  });
});

describe("Content that is not there", () => {
  test("is said plainly, and no site is written", () => {
    const folder = keep(temporaryFolder());
    const { status, stderr } = runRingfolio(["build"], { cwd: folder });
    expect(status).not.toBe(0);
    expect(stderr).toMatch(/content/);
    expect(stderr).not.toMatch(/\n\s+at /);
    expect(readdirSync(folder)).toEqual([]);
  });

  test("as an empty folder gives a site or a plain refusal, never a crash", () => {
    const folder = keep(temporaryFolder());
    mkdirSync(path.join(folder, "content"));
    const { status, stdout, stderr } = runRingfolio(["build"], { cwd: folder });
    expect([0, 1]).toContain(status);
    expect(stdout + stderr).not.toMatch(/\n\s+at /);
    if (status === 0)
      expect(readFileSync(path.join(folder, "_site/index.html"), "utf8")).toMatch(/<!DOCTYPE html>/i);
  });
});
