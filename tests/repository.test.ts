import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { REPOSITORY, sourceFiles } from "./sourceFiles.ts";

const AGREED = [
  "content",
  "src",
  "templates",
  "tests",
  "README.md",
  "DEVELOPERS.md",
  "package.json",
  "package-lock.json",
  "tsconfig.json",
];
const PRODUCED = ["node_modules", "_site"];

const texts = [
  ...sourceFiles(
    ["content", "src", "templates", "tests"],
    /\.(ts|mjs|js|json|jsonl|ya?ml|md|css|html|txt|xyz|cif)$/,
  ),
  ...["README.md", "DEVELOPERS.md", "package.json"]
    .filter((name) => existsSync(path.join(REPOSITORY, name)))
    .map((name) => ({ path: name, text: readFileSync(path.join(REPOSITORY, name), "utf8") })),
];

/** Joined from pieces, so that this list does not find itself. */
const words = (...pieces: (readonly [string, string])[]) =>
  new RegExp(`\\b(${pieces.map(([a, b]) => a + b).join("|")})\\b`, "i");

function withMatch(pattern: RegExp, files = texts): string[] {
  return files.flatMap((file) =>
    file.text
      .split("\n")
      .flatMap((line, index) =>
        pattern.test(line) ? [`${file.path}:${index + 1}: ${line.trim().slice(0, 120)}`] : [],
      ),
  );
}

describe("The repository", () => {
  test("has the agreed entries at its root and no others", () => {
    const entries = readdirSync(REPOSITORY).filter(
      (name) => !name.startsWith(".") && !PRODUCED.includes(name),
    );
    expect(entries.filter((name) => !AGREED.includes(name))).toEqual([]);
  });

  test("runs its checks with an executable .ci/run", () => {
    expect(statSync(path.join(REPOSITORY, ".ci/run")).mode & 0o111).toBe(0o111);
  });

  test("shows both set-up commands in the README", () => {
    const readme = texts.find((file) => file.path === "README.md")?.text ?? "";
    expect(readme).toContain("npm ci && npm run build");
    expect(readme).toContain("npm ci && npm test");
  });

  test("has no unfinished marks", () => {
    expect(
      withMatch(
        words(["TO", "DO"], ["FIX", "ME"], ["X", "XX"], ["not implemented", " yet"], ["place", "holder"]),
      ),
    ).toEqual([]);
  });

  test("keeps to its subject", () => {
    const told = words(
      ["lec", "ture"],
      ["trans", "cript"],
      ["seed", " document"],
      ["you", "tube"],
      ["the spea", "ker"],
    );
    expect(withMatch(told)).toEqual([]);
  });

  test("names no path of a particular machine", () => {
    expect(withMatch(/(^|[^\w.])\/(work|farm|home|Users)\/[a-z]/)).toEqual([]);
  });

  test("has no skipped, focused or empty test", () => {
    const tests = texts.filter((file) => /\.test\.ts$/.test(file.path));
    expect(withMatch(/\b(it|test|describe)\.(only|skip|to[d]o)\b/, tests)).toEqual([]);
  });

  test("has no file or folder called a helper, manager or utility", () => {
    expect(texts.map((file) => file.path).filter((name) => /util|helper|manager/i.test(name))).toEqual([]);
  });
});

describe("Checks against published values", () => {
  const published = existsSync(path.join(REPOSITORY, "tests/published"))
    ? sourceFiles(["tests/published"], /\.test\.ts$/)
    : [];

  test("exist", () => {
    expect(published.length).toBeGreaterThan(0);
  });

  test("name their source beside them, or say that they are common practice", () => {
    const silent = published.filter(
      (file) => !/\bsources?\b\s*:|\(source: |common practice/i.test(file.text),
    );
    expect(silent.map((file) => file.path)).toEqual([]);
  });
});
