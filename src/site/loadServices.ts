import type { Services } from "../dossier/analysis/Services.ts";
import { groupIndex } from "../structure/groupIndex.ts";
import { loadToolkit } from "../structure/loadToolkit.ts";
import { programVersion } from "./programVersion.ts";
import { readRegister } from "./readRegister.ts";

let kept: Promise<Services> | undefined;

/** What the pipeline needs from outside, loaded once per process. */
export function loadServices(): Promise<Services> {
  kept ??= load();
  return kept;
}

async function load(): Promise<Services> {
  // The library compiles in the background while the register is read.
  const loading = loadToolkit();
  const register = readRegister();
  const toolkit = await loading;
  return { register, toolkit, groups: groupIndex(register, toolkit), program: programVersion() };
}
