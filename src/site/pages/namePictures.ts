import type { MarkdownIt } from "markdown-it";
import { escapeHtml } from "../../quantity/escapeHtml.ts";

/** Line and column of a picture, from 1, in the Markdown that was rendered. */
export interface PicturePlace {
  readonly line: number;
  readonly column: number;
}

/**
 * markdown-it plugin: a picture is not shown, since its file is not part of the record and a page asks for nothing
 * outside its folder. Readers see its words; its place is reported.
 */
export function namePictures(md: MarkdownIt, onPicture: (place: PicturePlace) => void): void {
  md.renderer.rules["image"] = (tokens, index, options, env, renderer) => {
    const words = renderer.renderInlineAsText(tokens[index]!.children ?? [], options, env);
    return `<span class="missing">[picture not shown${words === "" ? "" : `: ${escapeHtml(words)}`}]</span>`;
  };
  md.core.ruler.push("name_pictures", (state) => {
    const source = state.src.split("\n");
    let line = 0;
    for (const token of state.tokens) {
      // Cells of a table have no lines of their own; their row, which comes before, has.
      if (token.map !== null) line = token.map[0];
      let here = line;
      let from = 0;
      for (const child of token.children ?? []) {
        if (child.type === "softbreak" || child.type === "hardbreak") {
          here += 1;
          from = 0;
        }
        if (child.type !== "image") continue;
        const column = Math.max(0, (source[here] ?? "").indexOf("![", from));
        from = column + 2;
        onPicture({ line: here + 1, column: column + 1 });
      }
    }
  });
}
