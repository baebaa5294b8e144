import type { SourceText } from "./SourceText.ts";

/** Why a file has no readable front matter, with the offset and length of what is wrong. */
export interface FenceProblem {
  readonly code:
    | "empty-file"
    | "file-too-large"
    | "nul-character"
    | "missing-front-matter"
    | "unterminated-front-matter"
    | "executable-front-matter";
  readonly offset: number;
  readonly length: number;
  readonly message: string;
  readonly suggestion?: string;
}

/** Offsets of the front matter between its fences, and of the prose after them. */
export interface FrontMatterParts {
  readonly yaml: { readonly start: number; readonly end: number } | null;
  /** Where the prose begins; the end of the text when there is none. */
  readonly proseStart: number;
  readonly problem: FenceProblem | null;
}

/** Largest content file, in UTF-16 units; larger is a mistake (a picture, a log) or an attack. */
const LARGEST_FILE = 1_000_000;
/** Largest front matter: some thousand lines. */
const LARGEST_FRONT_MATTER = 100_000;

/** Splits a file at its `---` fences. A word after the opening fence would name a language to run: refused. */
export function splitFrontMatter({ text }: SourceText): FrontMatterParts {
  const refuse = (problem: FenceProblem, proseStart = text.length): FrontMatterParts => ({
    yaml: null,
    proseStart,
    problem,
  });
  if (text.length > LARGEST_FILE) {
    return refuse({
      code: "file-too-large",
      offset: 0,
      length: 1,
      message: `The file holds ${text.length} characters; a content file may hold ${LARGEST_FILE}.`,
    });
  }
  const nul = text.indexOf("\0");
  if (nul !== -1) {
    return refuse({
      code: "nul-character",
      offset: nul,
      length: 1,
      message: "The file holds a NUL character, so it is not plain text.",
    });
  }
  if (text.trim() === "") {
    return refuse({
      code: "empty-file",
      offset: 0,
      length: 1,
      message:
        "The file is empty; it should begin with front matter between two lines of three hyphens (---).",
    });
  }
  const first = lineFrom(text, 0);
  const opening = first.text.trimEnd();
  if (!/^---(?!-)/.test(opening)) {
    return refuse(
      {
        code: "missing-front-matter",
        offset: 0,
        length: opening.length,
        message:
          "The file must begin with a line of three hyphens (---), the opening fence of the front matter.",
      },
      0,
    );
  }
  const closing = findClosing(text, first.next);
  if (opening !== "---") {
    return refuse(
      {
        code: "executable-front-matter",
        offset: 0,
        length: opening.length,
        message:
          "Text after the opening fence would name a language for the front matter. Front matter is YAML data " +
          "and nothing in it is run, so the fence must be three hyphens alone.",
        suggestion: "---",
      },
      closing?.next ?? text.length,
    );
  }
  if (closing === null) {
    return refuse({
      code: "unterminated-front-matter",
      offset: 0,
      length: 3,
      message:
        "The front matter that opens here is never closed: a line of three hyphens (---) must follow its last key.",
    });
  }
  if (closing.start - first.next > LARGEST_FRONT_MATTER) {
    return refuse(
      {
        code: "file-too-large",
        offset: first.next,
        length: 1,
        message: `The front matter holds more than ${LARGEST_FRONT_MATTER} characters.`,
      },
      closing.next,
    );
  }
  return { yaml: { start: first.next, end: closing.start }, proseStart: closing.next, problem: null };
}

function findClosing(text: string, from: number): { start: number; next: number } | null {
  for (let start = from; start < text.length; ) {
    const line = lineFrom(text, start);
    if (line.text.trimEnd() === "---") return { start, next: line.next };
    start = line.next;
  }
  return null;
}

function lineFrom(text: string, start: number): { text: string; next: number } {
  const newline = text.indexOf("\n", start);
  const end = newline === -1 ? text.length : newline;
  return { text: text.slice(start, end), next: newline === -1 ? text.length : newline + 1 };
}
