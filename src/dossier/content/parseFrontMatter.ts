import type { Diagnostic, Place } from "../../diagnostics/Diagnostic.ts";
import type { ContentFile } from "./CompoundInput.ts";
import { documentPlaces } from "./frontMatter/documentPlaces.ts";
import { readYaml } from "./frontMatter/readYaml.ts";
import { sourceText } from "./frontMatter/SourceText.ts";
import { splitFrontMatter } from "./frontMatter/splitFrontMatter.ts";

export type ContentPath = readonly (string | number)[];

/** A content file taken apart: plain data with positions, and the prose. Nothing in it has been executed. */
export interface FrontMatter {
  /** Plain data, keys as text; null when the front matter could not be read at all. */
  readonly data: Readonly<Record<string, unknown>> | null;
  /** True where the file has no front matter, for callers to whom that is no mistake. */
  readonly absent: boolean;
  /** Place of the value at a path, or of its nearest existing ancestor; `character` counts into a text value. */
  readonly place: (path: ContentPath, character?: number) => Place;
  /** Place of the key at the end of a path. */
  readonly placeOfKey: (path: ContentPath) => Place;
  /** The Markdown with line feeds only, and the line of the file on which it begins. */
  readonly prose: { readonly markdown: string; readonly firstLine: number };
  readonly diagnostics: readonly Diagnostic[];
}

/** Reads the front matter of one file with positions, by YAML 1.2's core schema and nothing beyond it. */
export function parseFrontMatter(file: ContentFile): FrontMatter {
  const source = sourceText(file);
  const { yaml: part, proseStart, problem } = splitFrontMatter(source);
  const diagnostics: Diagnostic[] = [];
  const report = (code: string, offset: number, length: number, message: string, suggestion?: string) =>
    diagnostics.push({
      code,
      severity: "error",
      place: source.placeAt(offset, length),
      message,
      ...(suggestion === undefined ? {} : { suggestion }),
    });
  const prose = {
    markdown: source.text.slice(proseStart).replace(/\r\n/g, "\n"),
    firstLine: source.lineAt(proseStart),
  };
  const fence = source.placeAt(0, 3);
  const unread = {
    data: null,
    absent: false,
    place: () => fence,
    placeOfKey: () => fence,
    prose,
    diagnostics,
  };

  if (problem !== null) {
    report(problem.code, problem.offset, problem.length, problem.message, problem.suggestion);
    return { ...unread, absent: problem.code === "missing-front-matter" || problem.code === "empty-file" };
  }
  if (part === null) return unread;
  const yaml = readYaml(source.text.slice(part.start, part.end), (code, offset, ...rest) =>
    report(code, part.start + offset, ...rest),
  );
  if (yaml === null) return unread;
  return { ...unread, data: yaml.data, ...documentPlaces(yaml.document, source, part.start) };
}
