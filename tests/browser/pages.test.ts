import { existsSync, readFileSync, rmSync } from "node:fs";
import { createRequire } from "node:module";
import path from "node:path";
import { pathToFileURL } from "node:url";
import { type Browser, chromium, type Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { contentsOf, runRingfolio, workspace } from "../runRingfolio.ts";

const EXECUTABLE = [process.env["CHROMIUM"], "/usr/bin/chromium"].find((file) => file && existsSync(file));
const FLAGS = [
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];
const axeSource = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");

let folder = "";
let site = "";
let pages: readonly string[] = [];
let browser: Browser;

beforeAll(async () => {
  folder = workspace("content");
  const build = runRingfolio(["build"], { cwd: folder });
  if (build.status !== 0) throw new Error(`the demo did not build:\n${build.stderr}`);
  site = path.join(folder, "_site");
  pages = [...contentsOf(site).keys()].filter((name) => name.endsWith(".html"));
  if (EXECUTABLE === undefined) throw new Error("no Chromium; install it or set CHROMIUM to its path");
  browser = await chromium.launch({ executablePath: EXECUTABLE, args: FLAGS });
});

afterAll(async () => {
  await browser?.close();
  if (folder !== "") rmSync(folder, { recursive: true, force: true });
});

const address = (name: string) => pathToFileURL(path.join(site, name)).href;

async function withPage<T>(width: number, action: (page: Page) => Promise<T>): Promise<T> {
  const context = await browser.newContext({ viewport: { width, height: 900 }, bypassCSP: true });
  try {
    return await action(await context.newPage());
  } finally {
    await context.close();
  }
}

describe("The demo site, opened from its folder", () => {
  test("has a page for every compound of the series, and the pages about them", () => {
    expect(pages).toContain("index.html");
    expect(pages.filter((name) => /wm-\d\d/.test(name)).length).toBeGreaterThanOrEqual(22);
  });

  test("shows every page without an error and without a request outside the folder", async () => {
    const found: string[] = [];
    const requests = new Set<string>();
    const inside = pathToFileURL(site).href;
    await withPage(1280, async (page) => {
      page.on("console", (message) => {
        if (["error", "warning"].includes(message.type())) found.push(`${page.url()}: ${message.text()}`);
      });
      page.on("pageerror", (error) => found.push(`${page.url()}: ${error.message}`));
      page.on("requestfailed", (request) => found.push(`${page.url()}: could not load ${request.url()}`));
      page.on("request", (request) => requests.add(request.url()));
      for (const name of pages) {
        await page.goto(address(name), { waitUntil: "load" });
        // Leaving while a face is still being read would look like a face that is missing.
        await page.evaluate("document.fonts.ready.then(() => true)");
      }
    });
    const outside = [...requests].filter((url) => !url.startsWith(inside) && !url.startsWith("data:"));
    expect(found).toEqual([]);
    expect(outside).toEqual([]);
    expect(requests.size).toBeGreaterThan(pages.length);
  });

  test("leads from every page to files that exist", async () => {
    const broken: string[] = [];
    await withPage(1280, async (page) => {
      for (const name of pages) {
        await page.goto(address(name));
        const links = await page.$$eval("a[href]", (anchors) =>
          anchors.map((anchor) => (anchor as { href?: string }).href ?? ""),
        );
        for (const link of links.filter((href) => href.startsWith("file:"))) {
          const url = new URL(link);
          const target = decodeURIComponent(url.pathname);
          const anchor = decodeURIComponent(url.hash.slice(1));
          if (!existsSync(target) || !path.extname(target)) broken.push(`${name} links to ${link}`);
          else if (anchor !== "" && target.endsWith(".html") && !hasId(target, anchor)) {
            broken.push(`${name} links to the missing place ${link}`);
          }
        }
      }
    });
    expect(broken).toEqual([]);
  });

  test("never scrolls sideways at 320 px", async () => {
    const wide: string[] = [];
    await withPage(320, async (page) => {
      for (const name of pages) {
        await page.goto(address(name));
        const widths = (await page.evaluate(
          "[document.documentElement.scrollWidth, document.documentElement.clientWidth]",
        )) as [number, number];
        if (widths[0] > widths[1]) wide.push(`${name}: ${widths[0]} px in ${widths[1]} px`);
      }
    });
    expect(wide).toEqual([]);
  });
});

const idsOf = new Map<string, string>();
function hasId(file: string, id: string): boolean {
  const text = idsOf.get(file) ?? readFileSync(file, "utf8");
  idsOf.set(file, text);
  return text.includes(`id="${id}"`);
}

/** One page of each kind: dossiers by one that shows every figure, others by their address. */
function onePageOfEachKind(): readonly string[] {
  const kinds = new Map<string, string>();
  for (const name of pages) {
    const kind = name.replace(/wm-\d\d/, "*").replace(/wrenmoor/, "*");
    if (!kinds.has(kind) || name.includes("wm-06")) kinds.set(kind, name);
  }
  return [...kinds.values()];
}

describe("One page of each kind", () => {
  test.each([
    { scheme: "light", what: "the accessibility rules", options: {} },
    { scheme: "dark", what: "the contrast rule", options: { runOnly: ["color-contrast"] } },
  ] as const)("passes $what of axe-core in the $scheme scheme", async ({ scheme, options }) => {
    const violations: string[] = [];
    await withPage(1280, async (page) => {
      await page.emulateMedia({ colorScheme: scheme });
      for (const name of onePageOfEachKind()) {
        await page.goto(address(name));
        await page.evaluate(axeSource);
        const result = (await page.evaluate(`axe.run(document, ${JSON.stringify(options)})`)) as {
          violations: { id: string; nodes: { target: string[] }[] }[];
        };
        for (const { id, nodes } of result.violations) {
          const places = nodes.slice(0, 3).map((node) => node.target.join(" "));
          violations.push(`${name}: ${id} at ${places.join(", ")}`);
        }
      }
    });
    expect(violations).toEqual([]);
  });
});
