import { mkdtempSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import Eleventy, { type EleventyConfig } from "@11ty/eleventy";
import { type RingfolioOptions, ringfolioPlugin, type SiteHooks } from "./plugin.ts";

/** Every language that Eleventy or gray-matter knows for front matter; none is understood here. */
const FRONT_MATTER = [
  ...["js", "javascript", "jsLegacy", "node", "coffee", "coffeescript", "cson"],
  ...["json", "yaml", "toml"],
];

/**
 * Eleventy for the program's own commands: its input is an empty folder, no configuration file is read, and no
 * front matter of any kind is understood, so that the plugin's pages are all there is. It prints nothing itself.
 * @returns the instance and the empty folder, to be removed afterwards.
 */
export function startEleventy(
  output: string,
  runMode: "build" | "serve",
  options: RingfolioOptions,
  hooks: SiteHooks,
  configure: (config: EleventyConfig) => void = () => {},
): { readonly eleventy: Eleventy; readonly input: string } {
  const input = mkdtempSync(path.join(os.tmpdir(), "ringfolio-input-"));
  const relative = (folder: string) => path.relative(process.cwd(), folder) || ".";
  const eleventy = new Eleventy(relative(input), relative(output), {
    configPath: "",
    loader: "esm",
    quietMode: true,
    source: "script",
    runMode,
    config: (config: EleventyConfig) => {
      config.setTemplateFormats(["11ty.js"]);
      config.setDataFileSuffixes([]);
      config.setUseGitIgnore(false);
      const refuse = () => {
        throw new Error("front matter is not read here");
      };
      config.setFrontMatterParsingOptions({
        engines: Object.fromEntries(FRONT_MATTER.map((name) => [name, refuse])),
      });
      ringfolioPlugin(config, options, hooks);
      configure(config);
    },
  });
  eleventy.disableLogger();
  return { eleventy, input };
}
