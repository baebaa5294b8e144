import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import type { SitePage } from "./SitePage.ts";

/** The formula style sheet with its woff2 fonts only; the older formats would triple the site's size. */
export function formulaStyles(): SitePage {
  return {
    path: "assets/katex/katex.min.css",
    render: () => {
      const file = createRequire(import.meta.url).resolve("katex/dist/katex.min.css");
      return readFileSync(file, "utf8").replace(
        /,url\(fonts\/[^)]+\.(?:woff|ttf)\) format\("(?:woff|truetype)"\)/g,
        "",
      );
    },
  };
}
