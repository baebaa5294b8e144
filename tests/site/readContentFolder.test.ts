import { createHash } from "node:crypto";
import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { afterEach, describe, expect, it } from "vitest";
import { readContentFolder } from "../../src/site/readContentFolder.ts";

const made: string[] = [];
afterEach(() => {
  for (const folder of made.splice(0)) rmSync(folder, { recursive: true });
});

function folderOf(entries: Record<string, string | Uint8Array>): string {
  const folder = mkdtempSync(join(tmpdir(), "ringfolio-content-"));
  made.push(folder);
  for (const [path, bytes] of Object.entries(entries)) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), bytes);
  }
  return folder;
}
const sha256 = (text: string) => createHash("sha256").update(text).digest("hex");

describe("a content folder", () => {
  it("gives Markdown as text and the other files of its series by digest, in the order of their paths", async () => {
    const { files, attached, problems } = await readContentFolder(
      folderOf({
        "series/tern/b.md": "B",
        "series/tern/a.md": "\uFEFFÄ",
        "series/tern/data/x.cif": "data_x",
        "index.md": "home",
        "picture.png": "not of a series",
      }),
    );
    expect(files.map(({ path, text, sha256: digest }) => [path, text, digest])).toEqual([
      ["index.md", "home", sha256("home")],
      ["series/tern/a.md", "Ä", sha256("\uFEFFÄ")],
      ["series/tern/b.md", "B", sha256("B")],
    ]);
    expect(attached).toEqual([{ path: "series/tern/data/x.cif", sha256: sha256("data_x") }]);
    expect(problems).toEqual([]);
  });

  it("leaves out names with a leading dot, the archive and the register", async () => {
    const { files, attached } = await readContentFolder(
      folderOf({
        ".git/x.md": "x",
        "series/.draft/x.md": "x",
        "series/tern/.x.md": "x",
        "archive/2026/x.md": "x",
        "register/x.md": "x",
        "series/tern/archive/x.cif": "kept",
      }),
    );
    expect(files).toEqual([]);
    expect(attached.map(({ path }) => path)).toEqual(["series/tern/archive/x.cif"]);
  });

  it("reports a file that is not UTF-8 at its first bad byte", async () => {
    const { files, problems } = await readContentFolder(
      folderOf({ "series/tern/a.md": Buffer.from([0x61, 0x0a, 0x62, 0xe4, 0x63]) }),
    );
    expect(files).toEqual([]);
    expect(problems).toMatchObject([{ code: "not-utf8", severity: "error", place: { line: 2, column: 2 } }]);
    expect(problems[0]?.place.file).toMatch(/\/series\/tern\/a\.md$/);
  });

  it("follows links within itself to files only, and refuses links that lead out or nowhere", async () => {
    const outside = folderOf({ "secret.md": "secret" });
    const folder = folderOf({ "series/tern/a.md": "A" });
    symlinkSync(join(outside, "secret.md"), join(folder, "series/tern/out.md"));
    symlinkSync(outside, join(folder, "series/out"));
    symlinkSync(join(folder, "series/tern/a.md"), join(folder, "series/tern/same.md"));
    symlinkSync(folder, join(folder, "series/tern/round"));
    symlinkSync(join(folder, "nothing"), join(folder, "series/tern/void.md"));
    const { files, problems } = await readContentFolder(folder);
    expect(files.map(({ path, text }) => [path, text])).toEqual([
      ["series/tern/a.md", "A"],
      ["series/tern/same.md", "A"],
    ]);
    expect(problems.map(({ code, place }) => [code, place.file.split("/").at(-1)])).toEqual([
      ["link-outside", "out"],
      ["link-outside", "out.md"],
      ["broken-link", "void.md"],
    ]);
  });

  it("may be missing altogether", async () => {
    const { problems } = await readContentFolder(join(folderOf({}), "none"));
    expect(problems.map(({ code }) => code)).toEqual(["missing-content-folder"]);
  });
});
