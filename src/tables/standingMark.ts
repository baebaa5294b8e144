import { escapeHtml } from "../quantity/escapeHtml.ts";
import type { CellStanding } from "./TableModel.ts";

/** Marks that a black-and-white copier keeps apart, each with its word. */
export const STANDINGS: Readonly<Record<CellStanding, { readonly mark: string; readonly word: string }>> = {
  measured: { mark: "\u25cf", word: "measured" },
  published: { mark: "\u25a0", word: "published" },
  computed: { mark: "\u25c7", word: "computed" },
  estimated: { mark: "\u25cc", word: "estimated" },
  symmetry: { mark: "\u2261", word: "exact by symmetry" },
};

/**
 * The mark of a standing as HTML. The word is for speech only, unless `visible` asks for it in print too
 * or the words beside the mark already say it (`none`).
 */
export function standingMark(standing: CellStanding, word: "spoken" | "visible" | "none" = "spoken"): string {
  const { mark, word: name } = STANDINGS[standing];
  const sign = `<span class="standing-mark" aria-hidden="true">${mark}</span>`;
  const words = {
    spoken: `<span class="visually-hidden">${escapeHtml(name)}</span>`,
    visible: `\u00a0${escapeHtml(name)}`,
    none: "",
  };
  return `<span class="standing standing-${standing}">${sign}${words[word]}</span>`;
}
