import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { afterAll } from "vitest";

const made: string[] = [];
afterAll(() => {
  for (const folder of made.splice(0)) rmSync(folder, { recursive: true, force: true });
});

/** A new folder that is removed after the tests of the file. */
export function newFolder(): string {
  const folder = mkdtempSync(path.join(os.tmpdir(), "ringfolio-test-"));
  made.push(folder);
  return folder;
}

/** Writes one compound of the invented series to the content folder of a working folder. */
export function writeCompound(folder: string, file: string, lines: readonly string[], prose = ""): void {
  const place = path.join(folder, "content/series/teal");
  mkdirSync(place, { recursive: true });
  writeFileSync(path.join(place, file), `---\n${lines.join("\n")}\n---\n${prose}\n`);
}

/** A working folder whose `content` holds a series of two compounds, an invented scenario. */
export function smallProject(): string {
  const folder = newFolder();
  writeCompound(folder, "index.md", ["title: Teal", "notice: Invented scenario."]);
  writeCompound(folder, "tl-01.md", ["code: TL-01", "name: methylcyclohexane", "structure: CC1CCCCC1"]);
  writeCompound(folder, "tl-02.md", ["code: TL-02", "name: cyclohexanol", "structure: OC1CCCCC1"]);
  writeFileSync(path.join(folder, "content/index.md"), "---\ntitle: Small project\n---\n");
  return folder;
}
