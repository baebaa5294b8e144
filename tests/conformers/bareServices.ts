import type { Register } from "../../src/register/Register.ts";
import { groupIndex } from "../../src/structure/groupIndex.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";

const EMPTY: Register = {
  version: "none",
  sha256: "",
  groups: [],
  groupClasses: [],
  rows: [],
  barriers: [],
  nonChair: [],
  parents: [],
  solvents: [],
  citations: [],
};

/** Services with an empty register: enough for structures and chairs, which rest on no parameter. */
export async function bareServices() {
  const toolkit = await loadToolkit();
  return { register: EMPTY, toolkit, groups: groupIndex(EMPTY, toolkit) };
}
