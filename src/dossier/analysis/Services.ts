import type { Mechanics } from "../../conformers/mechanics/Mechanics.ts";
import type { Register } from "../../register/Register.ts";
import type { GroupIndex } from "../../structure/groupIndex.ts";
import type { Toolkit } from "../../structure/Toolkit.ts";

/** What the pipeline is given from outside: parameters, the cheminformatics library, and its own name. */
export interface Services {
  readonly register: Register;
  readonly toolkit: Toolkit;
  readonly groups: GroupIndex;
  /** Null where relaxed geometries and forms other than chairs are not wanted. */
  readonly mechanics: Mechanics | null;
  readonly program: { readonly name: "ringfolio"; readonly version: string };
}
