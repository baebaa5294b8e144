import type { Place } from "../../../diagnostics/Diagnostic.ts";
import type { ContentFile } from "../CompoundInput.ts";

/** A content file's text with the means to say where a piece of it stands. */
export interface SourceText {
  /** The text without a byte order mark. */
  readonly text: string;
  /** Place of `length` UTF-16 units from `offset`; cut at the end of the line, at least one unit long. */
  readonly placeAt: (offset: number, length?: number) => Place;
  /** Line (from 1) that holds the offset. */
  readonly lineAt: (offset: number) => number;
}

/** Longest source line repeated in a message. */
const LONGEST_SHOWN_LINE = 400;
/** Characters that could steer a terminal or turn the reading direction of a message. */
const UNPRINTABLE = /[\p{Cc}\u061c\u200e\u200f\u202a-\u202e\u2066-\u2069]/gu;

/** Indexes the lines of a file once, so that offsets become line and column. */
export function sourceText(file: ContentFile): SourceText {
  const text = file.text.startsWith("\uFEFF") ? file.text.slice(1) : file.text;
  const starts = [0];
  for (let at = text.indexOf("\n"); at !== -1; at = text.indexOf("\n", at + 1)) starts.push(at + 1);

  const lineIndex = (offset: number): number => {
    let low = 0;
    let high = starts.length - 1;
    while (low < high) {
      const middle = Math.ceil((low + high) / 2);
      if (starts[middle]! <= offset) low = middle;
      else high = middle - 1;
    }
    return low;
  };

  const placeAt = (offset: number, length = 1): Place => {
    const index = lineIndex(offset);
    const start = starts[index]!;
    const end = index + 1 < starts.length ? starts[index + 1]! - 1 : text.length;
    const line = text.slice(start, end).replace(/\r$/, "");
    const column = Math.max(1, offset - start + 1);
    return {
      file: file.shownPath,
      line: index + 1,
      column,
      length: Math.max(1, Math.min(length, line.length - column + 1)),
      ...(line.length <= LONGEST_SHOWN_LINE ? { sourceLine: printable(line) } : {}),
    };
  };
  return { text, placeAt, lineAt: (offset) => lineIndex(offset) + 1 };
}

/** Swaps unprintable characters one for one, so that columns stay true. */
function printable(line: string): string {
  return line.replace(UNPRINTABLE, (character) => (character === "\t" ? "\t" : "\uFFFD"));
}
