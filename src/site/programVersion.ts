import { readFileSync } from "node:fs";

/** The program's name and version, from its own package file. */
export function programVersion(): { readonly name: "ringfolio"; readonly version: string } {
  const text = readFileSync(new URL("../../package.json", import.meta.url), "utf8");
  return { name: "ringfolio", version: (JSON.parse(text) as { version: string }).version };
}
