import { spawnSync } from "node:child_process";
import { cpSync, mkdtempSync, readdirSync, readFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { REPOSITORY } from "./sourceFiles.ts";

export interface Run {
  readonly status: number | null;
  readonly stdout: string;
  readonly stderr: string;
}

/** Runs the command as a user would, in a folder of its own unless told, with standard input as given. */
export function runRingfolio(
  args: readonly string[],
  options: { readonly cwd?: string; readonly input?: string } = {},
): Run {
  const command = path.join(REPOSITORY, "src/cli/ringfolio.mjs");
  const { status, stdout, stderr } = spawnSync(process.execPath, [command, ...args], {
    cwd: options.cwd ?? REPOSITORY,
    input: options.input ?? "",
    encoding: "utf8",
    maxBuffer: 64 * 1024 * 1024,
    env: { ...process.env, NO_COLOR: "1" },
  });
  return { status, stdout, stderr };
}

/** A new folder under the system's temporary folder. */
export function temporaryFolder(): string {
  return mkdtempSync(path.join(os.tmpdir(), "ringfolio-"));
}

/** A working folder that holds a copy of some content, as a team's own repository would. */
export function workspace(content: string): string {
  const folder = temporaryFolder();
  cpSync(path.join(REPOSITORY, content), path.join(folder, "content"), { recursive: true });
  return folder;
}

/** Every file below a folder, by relative path with forward slashes, as bytes in base 64. */
export function contentsOf(folder: string): ReadonlyMap<string, string> {
  const names = readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.join(entry.parentPath, entry.name))
    .sort();
  return new Map(
    names.map((name) => [
      path.relative(folder, name).split(path.sep).join("/"),
      readFileSync(name, "base64"),
    ]),
  );
}
