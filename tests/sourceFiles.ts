import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";

export const REPOSITORY = fileURLToPath(new URL("..", import.meta.url));

export interface SourceFile {
  /** Relative to the repository, forward slashes. */
  readonly path: string;
  readonly text: string;
}

/** Text files under some folders of the repository, sorted by path; `pattern` is matched with the whole path. */
export function sourceFiles(folders: readonly string[], pattern: RegExp): readonly SourceFile[] {
  return folders
    .flatMap((folder) => walk(folder))
    .filter((file) => pattern.test(file))
    .sort()
    .map((file) => ({ path: file, text: readFileSync(path.join(REPOSITORY, file), "utf8") }));
}

function walk(folder: string): string[] {
  return readdirSync(path.join(REPOSITORY, folder), { withFileTypes: true }).flatMap((entry) => {
    const name = `${folder}/${entry.name}`;
    if (!entry.isDirectory()) return [name];
    return entry.name === "node_modules" || entry.name === "_site" ? [] : walk(name);
  });
}

/** The same text with comments, and the contents of string literals, blanked; line breaks stay where they were. */
export function codeOnly(text: string): string {
  const token =
    /\/\*[\s\S]*?\*\/|\/\/[^\n]*|"(?:\\.|[^"\\\n])*"|'(?:\\.|[^'\\\n])*'|`(?:\\.|\$\{[^}]*\}|[^`\\])*`/g;
  return text.replace(token, (found) => found.replace(/[^\n]/g, " "));
}

export interface Import {
  readonly from: string;
  /** Only types are imported, so nothing of the module is loaded when the program runs. */
  readonly typeOnly: boolean;
}

/** Every import and re-export of a module, static or dynamic. */
export function importsOf(text: string): readonly Import[] {
  const bare = text.replace(/\/\*[\s\S]*?\*\//g, "").replace(/^\s*\/\/.*$/gm, "");
  const statics = /^\s*(?:import|export)\s+(type\s+)?([^;"']*?)\s*from\s*["']([^"']+)["']/gm;
  const found: Import[] = [];
  for (const [, type, names, from] of bare.matchAll(statics)) {
    found.push({ from: from!, typeOnly: type !== undefined || onlyTypes(names!) });
  }
  for (const [, from] of bare.matchAll(/^\s*import\s*["']([^"']+)["']/gm)) {
    found.push({ from: from!, typeOnly: false });
  }
  for (const [, from] of bare.matchAll(/\b(?:import|require)\s*\(\s*["']([^"']+)["']\s*\)/g)) {
    found.push({ from: from!, typeOnly: false });
  }
  for (const [, from] of bare.matchAll(/createRequire\([^)]*\)\s*\(\s*["']([^"']+)["']/g)) {
    found.push({ from: from!, typeOnly: false });
  }
  return found;
}

function onlyTypes(names: string): boolean {
  const list = /^\{([\s\S]*)\}$/.exec(names.trim())?.[1];
  if (list === undefined) return false;
  const items = list.split(",").map((item) => item.trim());
  return items.filter((item) => item !== "").every((item) => item.startsWith("type "));
}
