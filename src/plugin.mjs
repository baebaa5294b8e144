// The Eleventy plugin for a team's own configuration:
//   import ringfolio from "ringfolio";
//   export default (config) => config.addPlugin(ringfolio, { content: "content", folder: "dossiers" });
// The plugin is TypeScript; tsx loads it, also from node_modules and on every Node from 20 on.
import { tsImport } from "tsx/esm/api";

export default async function ringfolio(config, options) {
  const { ringfolioPlugin } = await tsImport("./site/plugin.ts", import.meta.url);
  ringfolioPlugin(config, options);
}
