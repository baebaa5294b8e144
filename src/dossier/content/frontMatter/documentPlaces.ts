import { type Document, isScalar, type Node } from "yaml";
import type { Place } from "../../../diagnostics/Diagnostic.ts";
import type { ContentPath } from "../parseFrontMatter.ts";
import { locateNode } from "./locateNode.ts";
import type { SourceText } from "./SourceText.ts";

/**
 * Where values and keys of a YAML document stand in the file.
 * @param start - offset of the YAML text in the file, in UTF-16 units (dimensionless).
 */
export function documentPlaces(
  document: Document.Parsed,
  source: SourceText,
  start: number,
): {
  readonly place: (path: ContentPath, character?: number) => Place;
  readonly placeOfKey: (path: ContentPath) => Place;
} {
  const placeOf = (node: Node): Place => {
    const [from, valueEnd] = node.range!;
    return source.placeAt(start + from, valueEnd - from);
  };
  const place = (path: ContentPath, character = 0): Place => {
    const { key, value, complete } = locateNode(document, path);
    const isEmpty = value?.range == null || value.range[0] === value.range[1];
    const node = isEmpty ? key : value;
    // The root as a whole is shown at its opening fence, not at whichever key comes first.
    if (node === null || node === document.contents) return source.placeAt(0, 3);
    if (!complete || isEmpty || character <= 0 || !isScalar(value)) return placeOf(node);
    const opening = value.type === "QUOTE_SINGLE" || value.type === "QUOTE_DOUBLE" ? 1 : 0;
    return source.placeAt(Math.min(start + value.range![0] + opening + character, start + value.range![1]));
  };
  const placeOfKey = (path: ContentPath): Place => {
    const { key, complete } = locateNode(document, path);
    return complete && key?.range != null ? placeOf(key) : place(path);
  };
  return { place, placeOfKey };
}
