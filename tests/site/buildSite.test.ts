import { spawn } from "node:child_process";
import {
  cpSync,
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  symlinkSync,
  writeFileSync,
} from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { buildSite } from "../../src/site/buildSite.ts";
import { contentsOf } from "../runRingfolio.ts";
import { REPOSITORY } from "../sourceFiles.ts";
import { newFolder, smallProject, writeCompound } from "./contentSample.ts";

const TIME = 60_000;
const build = (folder: string, output = "_site") =>
  buildSite({ content: path.join(folder, "content"), output: path.join(folder, output) });

describe("Building a site", { timeout: TIME }, () => {
  test("writes a site that is open to other users, marked as its own, with nothing left beside it", async () => {
    const folder = smallProject();
    const result = await build(folder);
    expect(result).toMatchObject({ ok: true, dossiers: 2 });
    expect(readdirSync(folder).sort()).toEqual(["_site", "content"]);
    expect(readdirSync(path.join(folder, "_site"))).toEqual(
      expect.arrayContaining([".ringfolio-site", "index.html"]),
    );
    expect(statSync(path.join(folder, "_site")).mode & 0o777).toBe(0o777 & ~process.umask());
  });

  test("replaces its own site whole: pages of a compound that is gone are gone", async () => {
    const folder = smallProject();
    await build(folder);
    const before = contentsOf(path.join(folder, "_site"));
    writeCompound(folder, "tl-03.md", ["code: TL-03", "name: cyclohexane", "structure: C1CCCCC1"]);
    expect(await build(folder)).toMatchObject({ ok: true, dossiers: 3 });
    expect([...contentsOf(path.join(folder, "_site")).keys()].some((name) => name.includes("tl-03"))).toBe(
      true,
    );
    rmSync(path.join(folder, "content/series/teal/tl-03.md"));
    await build(folder);
    expect(contentsOf(path.join(folder, "_site"))).toEqual(before);
  });

  test("reports ten mistakes in one run and leaves the old site byte for byte", async () => {
    const folder = newFolder();
    cpSync(path.join(REPOSITORY, "tests/fixtures/ten-mistakes"), path.join(folder, "content"), {
      recursive: true,
    });
    mkdirSync(path.join(folder, "_site"));
    writeFileSync(path.join(folder, "_site/.ringfolio-site"), "");
    writeFileSync(path.join(folder, "_site/index.html"), "<p>old</p>");
    const before = contentsOf(path.join(folder, "_site"));
    const { ok, diagnostics } = await build(folder);
    expect(ok).toBe(false);
    const errors = diagnostics.filter(({ severity }) => severity === "error");
    expect(new Set(errors.map(({ place }) => path.basename(place.file))).size).toBe(10);
    expect(errors.length).toBe(10);
    for (const { place } of errors) expect([place.line >= 1, place.column >= 1]).toEqual([true, true]);
    expect(contentsOf(path.join(folder, "_site"))).toEqual(before);
    expect(readdirSync(folder).sort()).toEqual(["_site", "content"]);
  });

  test("says what to do when the folder is missing or holds no compound", async () => {
    const folder = newFolder();
    const missing = await build(folder);
    expect(missing.ok).toBe(false);
    expect(missing.diagnostics.map(({ code }) => code)).toEqual(["missing-content-folder"]);
    mkdirSync(path.join(folder, "content"));
    const empty = await build(folder);
    expect(empty.diagnostics.map(({ code }) => code)).toContain("no-compounds");
    expect(empty.diagnostics.map(({ message }) => message).join()).toContain("/series/");
    expect(readdirSync(folder)).toEqual(["content"]);
  });

  test("stops at SIGINT with nothing left behind and the old site in place", async () => {
    const folder = smallProject();
    await build(folder);
    const before = contentsOf(path.join(folder, "_site"));
    const child = spawn(process.execPath, [path.join(REPOSITORY, "src/cli/ringfolio.mjs"), "build"], {
      cwd: folder,
    });
    const ended = new Promise<number | null>((resolve) => child.on("exit", resolve));
    while (child.exitCode === null && !readdirSync(folder).some((name) => name.startsWith(".build-"))) {
      await new Promise((resolve) => setTimeout(resolve, 2));
    }
    child.kill("SIGINT");
    expect(await ended).toBe(130);
    expect(readdirSync(folder).sort()).toEqual(["_site", "content"]);
    expect(contentsOf(path.join(folder, "_site"))).toEqual(before);
  });
});

describe("The output folder", { timeout: TIME }, () => {
  test("is never one that somebody else filled", async () => {
    const folder = smallProject();
    mkdirSync(path.join(folder, "papers"));
    writeFileSync(path.join(folder, "papers/thesis.txt"), "years of work");
    await expect(build(folder, "papers")).rejects.toThrow(/was not written by ringfolio/);
    expect(readFileSync(path.join(folder, "papers/thesis.txt"), "utf8")).toBe("years of work");
    expect(readdirSync(folder).sort()).toEqual(["content", "papers"]);
  });

  test.each([
    { output: ".", says: /holds the content folder/ },
    { output: "content", says: /holds the content folder/ },
    { output: "content/site", says: /inside the content folder/ },
    { output: "link/site", says: /inside the content folder/ },
    { output: "file", says: /is a file/ },
    { output: "file/site", says: /cannot be written/ },
  ])("may not be $output", async ({ output, says }) => {
    const folder = smallProject();
    symlinkSync(path.join(folder, "content"), path.join(folder, "link"));
    writeFileSync(path.join(folder, "file"), "");
    const before = contentsOf(path.join(folder, "content"));
    await expect(build(folder, output)).rejects.toThrow(says);
    expect(contentsOf(path.join(folder, "content"))).toEqual(before);
  });

  test("may be empty, deep, or a link, which stays a link", async () => {
    const folder = smallProject();
    mkdirSync(path.join(folder, "real"));
    symlinkSync("real", path.join(folder, "_site"));
    expect((await build(folder)).ok).toBe(true);
    expect(existsSync(path.join(folder, "real/index.html"))).toBe(true);
    expect((await build(folder, "a/b/c")).ok).toBe(true);
    expect(contentsOf(path.join(folder, "a/b/c"))).toEqual(contentsOf(path.join(folder, "real")));
  });
});
