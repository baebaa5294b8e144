import { type Document, isAlias, isMap, isScalar, isSeq, type Node } from "yaml";

/** Where a path leads in a YAML document: the deepest existing node, and whether it is the whole path. */
export interface LocatedNode {
  /** The key node in front of the value; null in lists and at the root. */
  readonly key: Node | null;
  /** The value node; null where the author wrote nothing after the key. */
  readonly value: Node | null;
  readonly complete: boolean;
}

/** Follows keys and list indices as far as they exist; aliases are followed to what they name. */
export function locateNode(document: Document.Parsed, path: readonly (string | number)[]): LocatedNode {
  let here: LocatedNode = { key: null, value: document.contents, complete: path.length === 0 };
  for (const [depth, segment] of path.entries()) {
    const container = isAlias(here.value) ? here.value.resolve(document) : here.value;
    let next: { key: Node | null; value: Node | null } | undefined;
    if (isMap(container)) {
      const pair = container.items.find(({ key }) => isScalar(key) && String(key.value) === String(segment));
      if (pair !== undefined) next = { key: pair.key as Node, value: pair.value as Node | null };
    } else if (isSeq(container)) {
      const item = container.items[Number(segment)];
      if (item !== undefined) next = { key: null, value: item as Node };
    }
    if (next === undefined) return { ...here, complete: false };
    here = { ...next, complete: depth === path.length - 1 };
  }
  return here;
}
