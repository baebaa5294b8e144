import { createHash } from "node:crypto";
import { createReadStream } from "node:fs";
import { lstat, readdir, readFile, realpath } from "node:fs/promises";
import { join, relative, sep } from "node:path";
import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { compareDiagnostics } from "../diagnostics/printDiagnostic.ts";
import type { AttachedFile, ContentFile } from "../dossier/content/CompoundInput.ts";

/** Folders of a content folder that hold no content of their own. */
const NOT_CONTENT = ["archive", "register"];

/** Largest Markdown file that is read at all, in bytes; the reader itself refuses far smaller ones with a place. */
const LARGEST_MARKDOWN = 8_000_000;

/** What lies in a content folder: Markdown as text, other files of the series by digest, and what could not be read. */
export interface ContentFolder {
  readonly files: readonly ContentFile[];
  readonly attached: readonly AttachedFile[];
  readonly problems: readonly Diagnostic[];
}

/**
 * Reads a content folder, sorted by path. Names that begin with a dot are skipped; links that lead out of the
 * folder are refused, so that a repository cannot pull foreign files into a site. Bytes are read, never run.
 */
export async function readContentFolder(folder: string): Promise<ContentFolder> {
  const root = await realpath(folder).catch(() => null);
  if (root === null) return { files: [], attached: [], problems: [missingFolder(folder)] };
  const files: ContentFile[] = [];
  const attached: AttachedFile[] = [];
  const problems: Diagnostic[] = [];
  const shown = (path: string) =>
    join(relative(process.cwd(), folder) || ".", path)
      .split(sep)
      .join("/");
  const report = (code: string, path: string, message: string, line = 1, column = 1) =>
    problems.push({ code, severity: "error", place: { file: shown(path), line, column }, message });

  const visit = async (path: string): Promise<void> => {
    const names = (await readdir(join(root, path))).sort((a, b) => (a < b ? -1 : a > b ? 1 : 0));
    for (const name of names) {
      if (name.startsWith(".") || (path === "" && NOT_CONTENT.includes(name))) continue;
      const inner = path === "" ? name : `${path}/${name}`;
      await visitEntry(name, inner);
    }
  };

  const visitEntry = async (name: string, path: string): Promise<void> => {
    const full = join(root, path);
    let entry = await lstat(full);
    if (entry.isSymbolicLink()) {
      const target = await realpath(full).catch(() => null);
      if (target === null) return void report("broken-link", path, "This link leads to nothing.");
      if (target !== root && !target.startsWith(root + sep)) {
        return void report(
          "link-outside",
          path,
          "This link leads out of the content folder and is not followed.",
        );
      }
      entry = await lstat(target);
      // A link to a folder inside could go round in circles, and the folder is read where it lies.
      if (entry.isDirectory()) return;
    }
    if (entry.isDirectory()) return visit(path);
    if (!entry.isFile()) return;
    const isMarkdown = name.endsWith(".md");
    if (!isMarkdown && !path.startsWith("series/")) return;
    if (isMarkdown && entry.size > LARGEST_MARKDOWN) {
      return void report(
        "file-too-large",
        path,
        `A Markdown file of ${entry.size} bytes is a mistake; it is not read.`,
      );
    }
    let bytes: Buffer | null;
    let sha256: string;
    try {
      bytes = isMarkdown ? await readFile(full) : null;
      sha256 = await digest(bytes ?? createReadStream(full));
    } catch {
      return void report("unreadable-file", path, "This file cannot be read; look at its permissions.");
    }
    if (bytes === null) return void attached.push({ path, sha256 });
    const text = decode(bytes);
    if (typeof text === "string") files.push({ path, shownPath: shown(path), text, sha256 });
    else {
      report(
        "not-utf8",
        path,
        "The file is not UTF-8 text. Save it with the encoding UTF-8 in your editor.",
        text.line,
        text.column,
      );
    }
  };

  await visit("");
  return {
    files: files.sort(byPath),
    attached: attached.sort(byPath),
    problems: problems.sort(compareDiagnostics),
  };
}

const byPath = (a: { path: string }, b: { path: string }) => (a.path < b.path ? -1 : a.path > b.path ? 1 : 0);

/** SHA-256 in lower-case hex. Attached files may be large and are hashed as they are read. */
async function digest(bytes: Buffer | AsyncIterable<Buffer>): Promise<string> {
  const hash = createHash("sha256");
  if (bytes instanceof Uint8Array) return hash.update(bytes).digest("hex");
  for await (const part of bytes) hash.update(part);
  return hash.digest("hex");
}

function missingFolder(folder: string): Diagnostic {
  return {
    code: "missing-content-folder",
    severity: "error",
    place: { file: relative(process.cwd(), folder) || ".", line: 1, column: 1 },
    message:
      "There is no such folder. Make it and put one Markdown file per compound under series/<series>/ in it, or name another folder with --content.",
  };
}

/** The text, or the place of the first byte that is not UTF-8. */
function decode(bytes: Buffer): string | { line: number; column: number } {
  try {
    return new TextDecoder("utf-8", { fatal: true }).decode(bytes);
  } catch {
    // Lenient decoding puts U+FFFD at the first bad byte; an earlier true U+FFFD is unlikely and does no harm.
    const lenient = new TextDecoder("utf-8").decode(bytes);
    const before = lenient.slice(0, Math.max(0, lenient.indexOf("\uFFFD"))).split("\n");
    return { line: before.length, column: before.at(-1)!.length + 1 };
  }
}
