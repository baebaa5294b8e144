import { analyseLine } from "../../src/dossier/analyseLine.ts";
import { analyseOutput } from "../../src/dossier/analyseSchema.ts";
import type { Services } from "../../src/dossier/analysis/Services.ts";
import { readRegister } from "../../src/site/readRegister.ts";
import { groupIndex } from "../../src/structure/groupIndex.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";

let kept: Services | undefined;

/** The program's own services, with its own register. */
export async function services(): Promise<Services> {
  if (kept === undefined) {
    const toolkit = await loadToolkit();
    const register = readRegister();
    kept = {
      toolkit,
      register,
      groups: groupIndex(register, toolkit),
      mechanics: null,
      program: { name: "ringfolio", version: "test" },
    };
  }
  return kept;
}

/** The batch command's answer to one structure; fails the test when it is a refusal. */
export async function analyse(smiles: string, more: { solvent?: string; temperature_K?: number } = {}) {
  const answer = analyseOutput.parse(
    JSON.parse(analyseLine(JSON.stringify({ id: "t", smiles, ...more }), await services())),
  );
  if (!answer.ok) throw new Error(`${smiles}: ${answer.error.code} ${answer.error.message}`);
  return answer;
}

/** kJ/mol to kcal/mol. */
export const kcal = (kJ: number) => kJ / 4.184;
