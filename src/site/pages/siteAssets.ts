import { readdirSync } from "node:fs";
import { createRequire } from "node:module";
import path from "node:path";
import { fileURLToPath } from "node:url";

const require = createRequire(import.meta.url);

/** Subsets of the text and figure faces that the site ships; other scripts fall back to the reader's own fonts. */
const SUBSETS = ["latin", "latin-ext", "greek", "greek-ext"];

/** Files copied as they are: style sheet and fonts, from this package and from those of the faces. */
export function siteAssets(): readonly { readonly from: string; readonly to: string }[] {
  const own = fileURLToPath(new URL("../../../templates/assets/", import.meta.url));
  const styles = readdirSync(own)
    .sort()
    .map((name) => ({ from: path.join(own, name), to: `assets/${name}` }));
  return [...styles, ...faces("stix-two-text"), ...faces("source-sans-3"), ...formulaFonts()];
}

function faces(face: string): readonly { from: string; to: string }[] {
  const folder = path.join(
    path.dirname(require.resolve(`@fontsource-variable/${face}/package.json`)),
    "files",
  );
  return readdirSync(folder)
    .filter((name) =>
      SUBSETS.some((subset) => new RegExp(`^${face}-${subset}-wght-(normal|italic)\\.woff2$`).test(name)),
    )
    .sort()
    .map((name) => ({ from: path.join(folder, name), to: `assets/fonts/${name}` }));
}

function formulaFonts(): readonly { from: string; to: string }[] {
  const folder = path.join(path.dirname(require.resolve("katex/package.json")), "dist/fonts");
  return readdirSync(folder)
    .filter((name) => name.endsWith(".woff2"))
    .sort()
    .map((name) => ({ from: path.join(folder, name), to: `assets/katex/fonts/${name}` }));
}
