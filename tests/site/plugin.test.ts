import { spawnSync } from "node:child_process";
import { existsSync, mkdirSync, readFileSync, symlinkSync, writeFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { contentsOf } from "../runRingfolio.ts";
import { REPOSITORY } from "../sourceFiles.ts";
import { smallProject, writeCompound } from "./contentSample.ts";

/** A team's own Eleventy project with a page, a data file and a layout of its own, and the plugin added. */
function ownProject(options: object): string {
  const folder = smallProject();
  const put = (name: string, text: string) => {
    mkdirSync(path.dirname(path.join(folder, name)), { recursive: true });
    writeFileSync(path.join(folder, name), text);
  };
  mkdirSync(path.join(folder, "node_modules/@11ty"), { recursive: true });
  symlinkSync(REPOSITORY, path.join(folder, "node_modules/ringfolio"));
  const eleventy = "node_modules/@11ty/eleventy";
  symlinkSync(path.join(REPOSITORY, eleventy), path.join(folder, eleventy));
  put("package.json", '{"type":"module","private":true}');
  put("pages/index.md", "---\nlayout: own.njk\n---\n# {{ greeting }}, {{ collections.all | size }} page\n");
  put("pages/_data/greeting.js", 'export default "Good day";');
  put("pages/_includes/own.njk", "<main>{{ content | safe }}</main>");
  put(
    "eleventy.config.js",
    `import ringfolio from "ringfolio";
export default async function (config) {
  await config.addPlugin(ringfolio, ${JSON.stringify(options)});
  return { dir: { input: "pages", output: "out" }, templateFormats: ["md", "njk"] };
}
`,
  );
  return folder;
}

function eleventy(folder: string): { readonly status: number | null; readonly text: string } {
  const command = path.join(folder, "node_modules/@11ty/eleventy/cmd.cjs");
  const { status, stdout, stderr } = spawnSync(process.execPath, [command, "--quiet"], {
    cwd: folder,
    encoding: "utf8",
  });
  return { status, text: stdout + stderr };
}

describe("The plugin in a team's own Eleventy project", { timeout: 60_000 }, () => {
  test("adds the dossier site in its folder and leaves the project's own pages as they are", () => {
    const folder = ownProject({ content: "content", folder: "dossiers" });
    const { status, text } = eleventy(folder);
    expect(text).not.toMatch(/error/i);
    expect(status).toBe(0);
    expect(readFileSync(path.join(folder, "out/index.html"), "utf8")).toBe(
      "<main><h1>Good day, 1 page</h1>\n</main>",
    );
    const site = [...contentsOf(path.join(folder, "out/dossiers")).keys()];
    expect(site).toContain("index.html");
    expect(site.filter((name) => /tl-0[12].*index\.html$/.test(name)).length).toBeGreaterThanOrEqual(2);
    expect(site.some((name) => name.endsWith(".css"))).toBe(true);
  });

  test("fails that project's build with every error of the content at once", () => {
    const folder = ownProject({ folder: "dossiers" });
    writeCompound(folder, "tl-03.md", ["code: TL-03", "name: odd", "structure: C1CC"]);
    writeCompound(folder, "tl-04.md", ["code: TL-04", "nmae: odd", "structure: C1CCCCC1"]);
    const { status, text } = eleventy(folder);
    expect(status).not.toBe(0);
    expect(text).toMatch(/content\/series\/teal\/tl-03\.md:4:\d+: error\[/);
    expect(text).toMatch(/content\/series\/teal\/tl-04\.md:3:\d+: error\[/);
    expect(existsSync(path.join(folder, "out"))).toBe(false);
  });

  test("refuses a folder that leads out of the output", () => {
    const { status, text } = eleventy(ownProject({ folder: "../elsewhere" }));
    expect(status).not.toBe(0);
    expect(text).toContain('"../elsewhere" leads out of it');
  });
});
