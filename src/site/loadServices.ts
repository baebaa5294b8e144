import { loadMechanics } from "../conformers/mechanics/loadMechanics.ts";
import type { Services } from "../dossier/analysis/Services.ts";
import { groupIndex } from "../structure/groupIndex.ts";
import { loadToolkit } from "../structure/loadToolkit.ts";
import { programVersion } from "./programVersion.ts";
import { readRegister } from "./readRegister.ts";

let kept: Promise<Omit<Services, "mechanics">> | undefined;

/**
 * What the pipeline needs from outside, loaded once per process.
 * @param wanted - whether conformers are to be relaxed by mechanics, which takes most of the time of an analysis.
 */
export async function loadServices(wanted: { readonly mechanics: boolean }): Promise<Services> {
  kept ??= load();
  return { ...(await kept), mechanics: wanted.mechanics ? loadMechanics() : null };
}

async function load(): Promise<Omit<Services, "mechanics">> {
  // The library compiles in the background while the register is read.
  const loading = loadToolkit();
  const register = readRegister();
  const toolkit = await loading;
  return { register, toolkit, groups: groupIndex(register, toolkit), program: programVersion() };
}
