import { spawnSync } from "node:child_process";
import { existsSync } from "node:fs";
import path from "node:path";

const NAMES = ["chromium", "chromium-browser", "google-chrome-stable", "google-chrome"];

/**
 * The path of a Chromium: the one CHROMIUM names, else one on the PATH, else one installed now with apt
 * (as root only). Null when there is none.
 *
 * @returns {string | null}
 */
export function findChromium() {
  const named = process.env.CHROMIUM;
  if (named !== undefined && named !== "") return existsSync(named) ? named : null;
  return onPath() ?? (install() ? onPath() : null);
}

function onPath() {
  for (const folder of (process.env.PATH ?? "").split(path.delimiter)) {
    for (const name of NAMES) {
      const candidate = path.join(folder, name);
      if (folder !== "" && existsSync(candidate)) return candidate;
    }
  }
  return null;
}

function install() {
  if (process.getuid?.() !== 0 || !["/usr/bin/apt-get", "/bin/apt-get"].some(existsSync)) return false;
  const env = { ...process.env, DEBIAN_FRONTEND: "noninteractive" };
  const apt = (...args) =>
    spawnSync("apt-get", args, { stdio: ["ignore", "inherit", "inherit"], env }).status === 0;
  console.log("Installing Chromium for the browser tests");
  return apt("update", "-qq") && apt("install", "-y", "-qq", "--no-install-recommends", "chromium");
}
