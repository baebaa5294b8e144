import { copyFile, mkdir } from "node:fs/promises";
import path from "node:path";
import { siteAssets } from "./pages/siteAssets.ts";

/** Copies style sheets and fonts into an output folder. */
export async function copyAssets(output: string): Promise<void> {
  for (const { from, to } of siteAssets()) {
    const target = path.join(output, to);
    await mkdir(path.dirname(target), { recursive: true });
    await copyFile(from, target);
  }
}
