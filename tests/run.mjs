/**
 * `npm test`: type check, lint and format check, then every test, and a last line `N passed, N failed`.
 * Type check and lint count as one check each. Nothing is skipped silently: a missing browser is installed
 * where that is possible and is a failure where it is not.
 */
import { spawnSync } from "node:child_process";
import { existsSync, mkdirSync, readFileSync, rmSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { countChecks } from "./countChecks.mjs";
import { findChromium } from "./findChromium.mjs";

const root = fileURLToPath(new URL("..", import.meta.url));
const cache = path.join(root, "node_modules/.cache/ringfolio-tests");
const report = path.join(cache, "results.json");

/** Runs one tool of node_modules/.bin in the repository root, with its output on ours. */
function tool(name, args, env = {}) {
  const program = path.join(root, "node_modules/.bin", name);
  const done = spawnSync(program, args, { cwd: root, stdio: "inherit", env: { ...process.env, ...env } });
  if (done.error) console.error(`${name} could not be started: ${done.error.message}`);
  return done.status === 0;
}

let passed = 0;
let failed = 0;
function check(title, ok) {
  console.log(`${ok ? "ok" : "FAILED"}: ${title}`);
  if (ok) passed += 1;
  else failed += 1;
}

if (!existsSync(path.join(root, "node_modules/.bin/vitest"))) {
  console.error("The dependencies are not installed. Run: npm ci");
  console.log("0 passed, 1 failed");
  process.exit(1);
}

check("types (tsc)", tool("tsc", ["-p", "."]));
check(
  "lint and format (biome)",
  tool("biome", ["check", "--config-path=tests/lint.json", "src", "templates", "tests"]),
);

const chromium = findChromium();
check(
  chromium === null
    ? "a Chromium for the browser tests: none found and none could be installed; " +
        "install the package `chromium` or set CHROMIUM to its path"
    : `a Chromium for the browser tests (${path.basename(chromium)})`,
  chromium !== null,
);

mkdirSync(cache, { recursive: true });
rmSync(report, { force: true });
const projects = chromium === null ? ["--project=unit", "--project=e2e"] : [];
const vitestOk = tool(
  "vitest",
  [
    "run",
    "--config=tests/vitest.config.ts",
    "--reporter=default",
    "--reporter=json",
    `--outputFile.json=${report}`,
    ...projects,
    ...process.argv.slice(2),
  ],
  chromium === null ? {} : { CHROMIUM: chromium },
);

const counts = existsSync(report) ? countChecks(JSON.parse(readFileSync(report, "utf8")), root) : null;
if (counts === null) {
  check("the tests ran to their end", false);
} else {
  passed += counts.passed;
  failed += counts.failed;
  if (!vitestOk && counts.failed === 0) check("the test run ended without errors outside tests", false);
  for (const title of counts.skipped) check(`skipped test: ${title}`, false);
  console.log("");
  console.log(
    `${counts.outside} checks are against outside sources (${counts.outsidePassed} passed); ` +
      `${counts.commonPractice} further checks are facts of the trade marked common practice.`,
  );
}
console.log(`${passed} passed, ${failed} failed`);
process.exitCode = failed === 0 ? 0 : 1;
