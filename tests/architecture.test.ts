import path from "node:path";
import { describe, expect, test } from "vitest";
import { codeOnly, importsOf, type SourceFile, sourceFiles } from "./sourceFiles.ts";

/** The rooms of `src/`, lowest first: a room imports from itself and from those before it. */
const ROOMS = [
  "quantity",
  "diagnostics",
  "register",
  "structure",
  "conformers",
  "energetics",
  "spectra",
  "evidence",
  "dossier",
  "drawing",
  "derivation",
  "tables",
  "export",
  "archive",
  "site",
  "browser",
  "cli",
];
/** Rooms that compute chemistry. Everything that prints a dossier reads the record instead. */
const CHEMISTRY = ["structure", "conformers", "energetics", "spectra", "evidence"];
const READERS = ["drawing", "derivation", "tables", "export", "archive", "browser"];
/** Rooms that may touch the world. */
const SHELL = ["site", "browser", "cli"];
/** A package that one room alone may import, so that it can be replaced there. */
const OWNED: readonly (readonly [RegExp, string])[] = [
  [/^(@svgdotjs\/|svgdom)/, "drawing"],
  [/^katex/, "derivation"],
  [/^@rdkit\/rdkit/, "structure"],
  [/^openchemlib/, "conformers"],
  [/^@11ty\//, "site"],
];
/** What a pure core must not reach for, with the reason. */
const IMPURE: readonly (readonly [RegExp, string])[] = [
  [/\bprocess\b/, "the environment"],
  [/\bconsole\b/, "the terminal"],
  [/\bDate\b|\bperformance\b/, "the clock"],
  [/\bMath\.random\b|\brandomUUID\b|\brandomBytes\b/, "randomness"],
  [/\btoLocale\w*|\blocaleCompare\b|\bIntl\b/, "the locale"],
  [/\bfetch\s*\(/, "the network"],
  [/^let\b/m, "module state that changes"],
];
/** A large library is started once per process and kept. */
const KEEPS_STATE = ["src/structure/loadToolkit.ts", "src/conformers/mechanics/loadMechanics.ts"];
/** Modules of Node that only calculate. */
const PURE_NODE = ["node:crypto"];

const source = sourceFiles(["src"], /\.(ts|mjs)$/).filter((file) => !file.path.endsWith(".d.ts"));
const templates = sourceFiles(["templates"], /\.(ts|mjs)$/);

/** Room of a path under `src/`; the plugin's entry file belongs to the site. */
function roomOf(file: string): string {
  const [top, room, ...rest] = file.split("/");
  if (top !== "src") return top ?? "";
  return rest.length === 0 ? "site" : (room ?? "");
}

/** Imports of other files of this repository, as paths. */
function inward(file: SourceFile) {
  return importsOf(file.text)
    .filter(({ from }) => from.startsWith("."))
    .map((found) => ({ ...found, to: path.posix.join(path.posix.dirname(file.path), found.from) }));
}

const from = (rooms: readonly string[]) => source.filter((file) => rooms.includes(roomOf(file.path)));

describe("The rooms of the source", () => {
  test("are those of the plan", () => {
    expect(
      [...new Set(source.map((file) => roomOf(file.path)))].filter((room) => !ROOMS.includes(room)),
    ).toEqual([]);
  });

  test("import only downwards", () => {
    const upward = source.flatMap((file) =>
      inward(file)
        .filter(({ to }) => !(roomOf(file.path) === "site" && to.startsWith("templates/")))
        .filter(({ to }) => {
          const target = ROOMS.indexOf(roomOf(to));
          return target === -1 || target > ROOMS.indexOf(roomOf(file.path));
        })
        .map(({ to }) => `${file.path} imports ${to}`),
    );
    expect(upward).toEqual([]);
  });

  test("that print a dossier take no chemistry from anywhere but the record", () => {
    const found = from(READERS).flatMap((file) =>
      inward(file)
        .filter(({ to }) => CHEMISTRY.includes(roomOf(to)))
        .map(({ to }) => `${file.path} imports ${to}`),
    );
    expect(found).toEqual([]);
  });

  test("name imported files with their extension, so that every Node from 20 on reads the same sources", () => {
    const bare = [...source, ...templates].flatMap((file) =>
      inward(file)
        .filter(({ to }) => !/\.(ts|mjs|json)$/.test(to))
        .map(({ to }) => `${file.path} imports ${to}`),
    );
    expect(bare).toEqual([]);
  });

  test("leave each large library to one room", () => {
    const found = [...source, ...templates].flatMap((file) =>
      importsOf(file.text).flatMap(({ from: name }) =>
        OWNED.filter(([library, owner]) => library.test(name) && roomOf(file.path) !== owner).map(
          () => `${file.path} imports ${name}`,
        ),
      ),
    );
    expect(found).toEqual([]);
  });
});

describe("The core", () => {
  const core = from(ROOMS.filter((room) => !SHELL.includes(room)));

  test("has no way to reach the world", () => {
    const found = core.flatMap((file) =>
      IMPURE.filter(([pattern]) => pattern.test(codeOnly(file.text)))
        .filter(([, what]) => !(KEEPS_STATE.includes(file.path) && what.startsWith("module state")))
        .map(([, what]) => `${file.path} uses ${what}`),
    );
    expect(found).toEqual([]);
  });

  test("imports no module of Node that reads or writes", () => {
    const found = core.flatMap((file) =>
      importsOf(file.text)
        .filter((found) => found.from.startsWith("node:") && !PURE_NODE.includes(found.from))
        .filter((found) => !(KEEPS_STATE.includes(file.path) && found.from === "node:module"))
        .map((found) => `${file.path} imports ${found.from}`),
    );
    expect(found).toEqual([]);
  });
});

describe("Templates", () => {
  test("import types, number formatting and each other, and compute nothing", () => {
    const found = templates.flatMap((file) =>
      importsOf(file.text)
        .map((found) => ({
          ...found,
          to: found.from.startsWith(".")
            ? path.posix.join(path.posix.dirname(file.path), found.from)
            : found.from,
        }))
        .filter(({ to, typeOnly }) => !(typeOnly && to.startsWith("src/")))
        .filter(({ to }) => !to.startsWith("src/quantity/") && !to.startsWith("templates/"))
        .map(({ to }) => `${file.path} imports ${to}`),
    );
    expect(found).toEqual([]);
  });

  test("reach for no clock, file, randomness, environment or locale", () => {
    const found = templates.flatMap((file) =>
      IMPURE.filter(([pattern]) => pattern.test(codeOnly(file.text))).map(
        ([, what]) => `${file.path} uses ${what}`,
      ),
    );
    expect(found).toEqual([]);
  });
});

describe("The reading of import lines", () => {
  test("sees every form in which a module can be named", () => {
    const text = [
      'import a, { type B } from "./a.ts";',
      'import type { C } from "./c.ts";',
      'import { type D, type E } from "./d.ts";',
      'export * from "./e.ts";',
      'import "./f.ts";',
      'const g = await import("./g.ts");',
      'createRequire(import.meta.url)("h")',
      '// import x from "./no.ts"',
    ].join("\n");
    expect(importsOf(text).map(({ from: name, typeOnly }) => [name, typeOnly])).toEqual([
      ["./a.ts", false],
      ["./c.ts", true],
      ["./d.ts", true],
      ["./e.ts", false],
      ["./f.ts", false],
      ["./g.ts", false],
      ["h", false],
    ]);
  });
});
