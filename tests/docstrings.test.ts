import { describe, expect, test } from "vitest";
import { readRegister } from "../src/site/readRegister.ts";
import { sourceFiles } from "./sourceFiles.ts";

/** Rooms whose functions compute physical quantities. */
const QUANTITATIVE = ["src/conformers", "src/energetics", "src/quantity"];
const NUMBER = /^(readonly\s+)?(number|Kelvin|KilojoulePerMole)(\[\])?$/;
/** Positions in a list of atoms are not quantities; their names say what they are. */
const INDEX = /(atom|atoms|index|locant|locants)$/i;
const UNIT =
  /\bkJ\/mol\b|\bkcal\/mol\b|\bK\b|Å|\bHz\b|\bdegrees?\b|\bradians?\b|\bpixels?\b|\bdimensionless\b|\bfraction\b|\bper ?cent\b|\bindex\b|\batoms?\b|\blocants?\b|\bcount\b|\bnumber of\b|\bdecimals?\b|\bunit\b/;

interface Declared {
  readonly where: string;
  readonly doc: string;
  readonly parameters: readonly { readonly name: string; readonly type: string }[];
}

/** Exported functions with the comment above them and their parameters, types as written. */
function exportedFunctions(path: string, text: string): readonly Declared[] {
  const found =
    /(\/\*\*(?:(?!\*\/)[\s\S])*\*\/)?\s*\nexport (?:async )?function (\w+)(?:<[^(]*>)?\(([^)]*)\)/g;
  return [...`\n${text}`.matchAll(found)].map(([, doc, name, list]) => ({
    where: `${path} ${name}`,
    doc: doc ?? "",
    parameters: list!
      .split(/,(?![^<[{(]*[>\]})])/)
      .map((item) => /^\s*(\w+)\??\s*:\s*([\s\S]+?)\s*(?:=.*)?$/.exec(item))
      .flatMap((match) => (match === null ? [] : [{ name: match[1]!, type: match[2]! }])),
  }));
}

const declared = sourceFiles(QUANTITATIVE, /\.ts$/).flatMap((file) =>
  exportedFunctions(file.path, file.text),
);

describe("Docstrings of functions that compute", () => {
  test("are read at all", () => {
    expect(declared.length).toBeGreaterThan(10);
  });

  test("stand above every exported function", () => {
    expect(declared.filter(({ doc }) => doc === "").map(({ where }) => where)).toEqual([]);
  });

  test("give the unit of every number, or say that it is dimensionless", () => {
    const missing = declared
      .filter(({ where }) => !where.startsWith("src/quantity/"))
      .flatMap(({ where, doc, parameters }) =>
        parameters
          .filter(({ name, type }) => NUMBER.test(type) && !INDEX.test(name))
          .filter(({ name }) => {
            const line = new RegExp(`@param\\s+${name}\\b([\\s\\S]*?)(?=\\n\\s*\\*\\s*@|\\*/)`).exec(
              doc,
            )?.[1];
            return line === undefined || !UNIT.test(line);
          })
          .map(({ name }) => `${where}(${name})`),
      );
    expect(missing).toEqual([]);
  });
});

describe("Source keys in docstrings", () => {
  test("stand in the register's bibliography", () => {
    const known = new Set(readRegister().citations.map((citation) => citation.key));
    const unknown = sourceFiles(["src"], /\.ts$/).flatMap((file) =>
      [...file.text.matchAll(/@see\s+\{?@?(?:link\s+)?([\w-]+)/g)]
        .filter(([, key]) => !known.has(key!))
        .map(([, key]) => `${file.path}: ${key}`),
    );
    expect(known.size).toBeGreaterThan(0);
    expect(unknown).toEqual([]);
  });
});
