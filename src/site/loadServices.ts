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
  const toolkit = await loadToolkit();
  const register = readRegister();
  return { register, toolkit, groups: groupIndex(register, toolkit), program: programVersion() };
}
