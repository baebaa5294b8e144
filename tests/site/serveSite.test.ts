import { type ChildProcess, spawn } from "node:child_process";
import { existsSync, readdirSync, rmSync } from "node:fs";
import { createServer } from "node:net";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { REPOSITORY } from "../sourceFiles.ts";
import { newFolder, smallProject, writeCompound } from "./contentSample.ts";

/** A port that was free a moment ago. */
async function freePort(): Promise<number> {
  const server = createServer();
  await new Promise<void>((resolve) => server.listen(0, resolve));
  const address = server.address();
  await new Promise((resolve) => server.close(resolve));
  return typeof address === "object" && address !== null ? address.port : 0;
}

async function until(what: string, holds: () => Promise<boolean> | boolean): Promise<void> {
  for (const end = performance.now() + 40_000; performance.now() < end; ) {
    if (await holds()) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Error(`waited in vain until ${what}`);
}

describe("ringfolio serve", { timeout: 120_000 }, () => {
  let folder = "";
  let server: ChildProcess;
  let printed = "";
  let url = "";
  let temporary = "";

  const text = async (page: string) => {
    const response = await fetch(url + page);
    return response.ok ? response.text() : `status ${response.status}`;
  };
  const shows = (page: string, words: string) =>
    until(`${page} shows ${words}`, async () => (await text(page)).includes(words));
  const page = (compound: string) => `series/teal/${compound}/index.html`;
  const compound = (file: string, name: string, structure: string) =>
    writeCompound(folder, `${file}.md`, [
      `code: ${file.toUpperCase()}`,
      `name: ${name}`,
      `structure: "${structure}"`,
    ]);

  beforeAll(async () => {
    temporary = newFolder();
    folder = smallProject();
    const command = path.join(REPOSITORY, "src/cli/ringfolio.mjs");
    server = spawn(process.execPath, [command, "serve", "--port", String(await freePort())], {
      cwd: folder,
      env: { ...process.env, TMPDIR: temporary },
    });
    for (const stream of [server.stdout, server.stderr])
      stream?.setEncoding("utf8").on("data", (part: string) => {
        printed += part;
      });
    await until("the server says where it is", () => {
      url = /Serving (http:\S+)/.exec(printed)?.[1] ?? "";
      return url !== "" || server.exitCode !== null;
    });
    // The watcher misses what happens in its first second.
    await new Promise((resolve) => setTimeout(resolve, 1500));
  }, 90_000);

  afterAll(() => {
    server.kill("SIGKILL");
  });

  test("shows the site, follows edits, tells of errors on the pages, and recovers", async () => {
    expect(await text("index.html")).toContain("Small project");
    // The reload client talks to the server; the policy of the published pages would forbid it.
    expect(await text("index.html")).toMatch(/Content-Security-Policy" content="[^"]*connect-src 'self'/);
    expect(await text(page("tl-01"))).toContain("methylcyclohexane");

    compound("tl-01", "1-methylcyclohexane", "CC1CCCCC1");
    await shows(page("tl-01"), "1-methylcyclohexane");

    compound("tl-03", "thiane", "C1CCSCC1");
    await shows(page("tl-03"), "thiane");

    compound("tl-03", "thiane", "C1CCSC");
    await shows("index.html", 'role="alert"');
    const home = await text("index.html");
    expect(home).toContain("1 error in the content");
    expect(home).toContain("content/series/teal/tl-03.md:4:");
    expect(printed).toMatch(/content\/series\/teal\/tl-03\.md:4:\d+: error\[/);
    // The page being written is still there, below the error.
    expect(await text(page("tl-03"))).toContain("tl-03.md:4:");
    expect(await text(page("tl-03"))).toContain("thiane");

    // What can be read is shown as it is now, in spite of the error elsewhere.
    compound("tl-01", "toluene, hydrogenated", "CC1CCCCC1");
    await shows(page("tl-01"), "toluene, hydrogenated");
    expect(await text(page("tl-01"))).toContain('role="alert"');

    compound("tl-03", "thiane", "C1CCSCC1");
    await until("the error is gone", async () => !(await text("index.html")).includes('role="alert"'));
    expect(await text(page("tl-03"))).not.toContain('role="alert"');

    rmSync(path.join(folder, "content/series/teal/tl-03.md"));
    await until("the page is gone", async () => (await text(page("tl-03"))).startsWith("status 404"));
    expect(await text(page("tl-02"))).toContain("cyclohexanol");
  });

  test("stops at SIGINT with exit code 0 and leaves nothing behind, nor ever a _site", async () => {
    server.kill("SIGINT");
    await until("it stops", () => server.exitCode !== null);
    expect(server.exitCode).toBe(0);
    expect(existsSync(path.join(folder, "_site"))).toBe(false);
    expect(readdirSync(temporary).filter((name) => name.startsWith("ringfolio-"))).toEqual([]);
    expect(printed).not.toMatch(/\n\s+at /);
  });
});
