import katex, { type KatexOptions, ParseError } from "katex";
import { TexError } from "./TexError.ts";

/**
 * Strictest settings of the library. `trust` must throw: a plain `false` prints the forbidden command in red
 * and reports nothing. The code `htmlExtension` is left to `trust`, which names the command.
 */
const OPTIONS: KatexOptions = {
  output: "htmlAndMathml",
  throwOnError: true,
  strict: (code) => (code === "htmlExtension" ? "ignore" : "error"),
  trust: (context) => {
    throw new ParseError(`${context.command} is not allowed`);
  },
  maxSize: 20,
  maxExpand: 500,
};

/**
 * A formula as HTML with MathML for assistive technology. Macros last for one call only, so that no formula
 * can change another.
 *
 * @throws TexError when the formula cannot be set, never another error for bad TeX.
 */
export function renderTex(tex: string, options: { readonly display: boolean }): string {
  try {
    return katex.renderToString(tex, { ...OPTIONS, macros: {}, displayMode: options.display });
  } catch (error) {
    if (!(error instanceof ParseError)) throw error;
    const position = typeof error.position === "number" ? error.position : null;
    throw new TexError(error.rawMessage, position);
  }
}
