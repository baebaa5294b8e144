import type { MarkdownIt, StateCore, Token } from "markdown-it";
import type { Directive } from "../../dossier/content/Directive.ts";
import { DIRECTIVE_MARK, type MarkedProse } from "./markDirectives.ts";

/** A mark as it stands in an address. */
const ENCODED_MARK = /%EE%80%80(\d+)(?:%EE%80%82)*%EE%80%81/g;

/**
 * markdown-it plugin that puts finished HTML in the place of marked directives, only where text can stand. In a
 * title, an address, a formula or the words of a picture the directive stays as its author wrote it.
 * @param place - finished HTML of a directive.
 */
export function placeDirectives(
  md: MarkdownIt,
  { directives, sources }: MarkedProse,
  place: (directive: Directive) => string,
): void {
  // Before characters written as entities are joined to the text around them: those are no marks.
  md.core.ruler.after("inline", "place_directives", (state) => {
    state.tokens = joinBlocks(state).map((token) => {
      restoreAttributes(token);
      if (token.type !== "inline") token.content = restore(token.content);
      if (token.children !== null) token.children = token.children.flatMap((child) => placeIn(state, child));
      return token;
    });
  });

  /** A paragraph that is nothing but a block directive becomes what the directive shows. */
  function joinBlocks(state: StateCore): Token[] {
    const tokens: Token[] = [];
    for (const token of state.tokens) {
      const directive = token.type === "inline" ? blockAlone(token) : undefined;
      if (directive !== undefined && tokens.at(-1)?.type === "paragraph_open") {
        const block = new state.Token("html_block", "", 0);
        block.content = `${place(directive)}\n`;
        block.map = token.map;
        tokens[tokens.length - 1] = block;
      } else if (!(token.type === "paragraph_close" && tokens.at(-1)?.type === "html_block")) {
        tokens.push(token);
      }
    }
    return tokens;
  }

  function blockAlone(token: Token): Directive | undefined {
    const [only, ...more] = token.children ?? [];
    const match = only?.type === "text" ? [...only.content.matchAll(DIRECTIVE_MARK)] : [];
    if (more.length > 0 || match.length !== 1 || match[0]![0] !== only!.content) return undefined;
    const directive = directives[Number(match[0]![1])];
    return directive?.form === "block" ? directive : undefined;
  }

  function placeIn(state: StateCore, child: Token): Token[] {
    restoreAttributes(child);
    if (child.type !== "text") {
      if (child.type !== "text_special") child.content = restore(child.content);
      for (const inner of child.children ?? []) inner.content = restore(inner.content);
      return [child];
    }
    // Split by a pattern with one group gives text and index by turns.
    return child.content.split(DIRECTIVE_MARK).flatMap((piece, n) => {
      if (piece === "") return [];
      const token = new state.Token(n % 2 === 0 ? "text" : "html_inline", "", 0);
      token.level = child.level;
      token.content = n % 2 === 0 ? piece : place(directives[Number(piece)]!);
      return [token];
    });
  }

  function restore(text: string): string {
    return text.replace(DIRECTIVE_MARK, (whole, index: string) => sources[Number(index)] ?? whole);
  }

  function restoreAttributes(token: Token): void {
    for (const [name, value] of token.attrs ?? []) {
      if (typeof value !== "string") continue;
      const address = value.replace(ENCODED_MARK, (whole, index: string) => {
        const source = sources[Number(index)];
        return source === undefined ? whole : encodeURI(source);
      });
      token.attrSet(name, restore(address));
    }
  }
}
