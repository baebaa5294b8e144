import { classifyFragment } from "./classifyFragment.ts";
import { extractFragment, type Fragment } from "./extractFragment.ts";
import type { GroupIndex } from "./groupIndex.ts";
import { type Molecule, mirrorImage } from "./Molecule.ts";
import type { Substituent } from "./StructureAnalysis.ts";
import type { Toolkit } from "./Toolkit.ts";

/** Cuts out a group, matches it with the register, and gives it the labels a reader will see. */
export function describeSubstituent(
  molecule: Molecule,
  ringAtom: number,
  first: number,
  index: GroupIndex,
  toolkit: Toolkit,
): Substituent {
  const fragment = extractFragment(molecule, ringAtom, first);
  const group = index.find(fragment) ?? null;
  const formula = condensedFormula(fragment);
  return {
    ringAtom,
    atom: first,
    group,
    groupClass: group?.groupClass ?? classifyFragment(fragment),
    label: group?.label ?? formula,
    labelReversed: group?.labelReversed ?? formula,
    prefix: group?.prefix ?? formula,
    form: toolkit.canonicalSmiles(fragment.molecule),
    mirrorForm: toolkit.canonicalSmiles(mirrorImage(fragment.molecule)),
  };
}

/** A label for a group the register does not list: its formula, attached element first (`C_7H_6F`, `OC_3H_7`). */
function condensedFormula(fragment: Fragment): string {
  const atoms = fragment.molecule.atoms;
  const first = atoms[fragment.attachment]!.neighbours[0]!;
  const counts = new Map<string, number>();
  const add = (element: string, n: number) => n > 0 && counts.set(element, (counts.get(element) ?? 0) + n);
  let charge = 0;
  atoms.forEach((atom, index) => {
    if (index === fragment.attachment) return;
    if (index !== first) add(atom.isotope === 2 && atom.element === "H" ? "D" : atom.element, 1);
    add("H", atom.hydrogens);
    charge += atom.charge;
  });
  const head = atoms[first]!;
  const leading = head.isotope === 2 && head.element === "H" ? "D" : head.element;
  if (leading === "C") add("C", 1);
  const rest = [...counts.keys()].filter((element) => element !== "C" && element !== "H").sort();
  const order = ["C", "H", ...rest].filter((element) => counts.has(element));
  const digits = (n: number) => (n === 1 ? "" : String(n).replace(/\d/g, "_$&"));
  const body = order.map((element) => element + digits(counts.get(element)!)).join("");
  const sign = charge === 0 ? "" : charge > 0 ? "^+" : "^−";
  return (leading === "C" ? body : leading + body) + sign;
}
