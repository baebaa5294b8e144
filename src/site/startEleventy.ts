import { mkdtempSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import Eleventy, { type EleventyConfig } from "@11ty/eleventy";
import { type RingfolioOptions, ringfolioPlugin } from "./plugin.ts";

/**
 * Eleventy for the program's own commands: its input is an empty folder, no configuration file is read, and no
 * front matter of any kind is understood, so that the plugin's pages are all there is.
 * @returns the instance and the empty folder, to be removed afterwards.
 */
export function startEleventy(
  output: string,
  runMode: "build" | "serve",
  options: RingfolioOptions,
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
        engines: Object.fromEntries(
          ["js", "javascript", "jsLegacy", "json", "yaml", "toml", "coffee", "coffeescript", "node"].map(
            (name) => [name, refuse],
          ),
        ),
      });
      ringfolioPlugin(config, options);
      configure(config);
    },
  });
  if (runMode === "build") eleventy.disableLogger();
  return { eleventy, input };
}
